import type { ReactNode } from 'react'
import { Link, NavLink } from 'react-router'
import { PreferencesForm } from '../preferences/preferences-form'

interface Props {
  /** Query that carries the setup in hand, with what was changed, to the other pages. */
  query?: string
  /** Which boat and setup is in hand, and what a page lets one do with it as a whole. */
  children?: ReactNode
}

/** The thin line at the head of every page: where one is, and which setup is in hand. */
export function Masthead({ query = '', children }: Props) {
  return (
    <header className="relative border-b border-hair text-note">
      <div className="flex flex-wrap items-center gap-x-3 px-4 md:gap-x-6 md:px-margin">
        <Link to="/" className="flex h-touch items-center font-strong">
          Counterhelm
        </Link>
        <nav aria-label="Pages">
          <NavLink
            to={`/${query}`}
            className="flex h-touch items-center underline underline-offset-4 aria-[current=page]:no-underline"
          >
            Sea trial
          </NavLink>
        </nav>
        {children && (
          <div className="flex min-w-0 flex-1 flex-wrap items-center gap-x-6 max-xl:order-last max-xl:basis-full max-md:contents">
            {children}
          </div>
        )}
        <a
          href="#cautions"
          className="flex min-h-touch items-center underline underline-offset-4 max-md:order-last"
        >
          Steers no boat: keep a look-out
        </a>
        <Folded title="Light and units">
          <PreferencesForm />
        </Folded>
      </div>
    </header>
  )
}

function Folded({ title, children }: { title: string; children: ReactNode }) {
  return (
    <details className="ml-auto">
      <summary className="flex h-touch cursor-pointer list-none items-center underline underline-offset-4 [&::-webkit-details-marker]:hidden">
        {title}
      </summary>
      <div className="absolute inset-x-0 top-full z-30 border-b border-ink bg-paper px-4 py-3 md:px-margin">
        {children}
      </div>
    </details>
  )
}
