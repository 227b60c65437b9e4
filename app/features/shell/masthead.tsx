import type { ReactNode } from 'react'
import { Link, NavLink } from 'react-router'
import { PreferencesForm } from '../preferences/preferences-form'

export interface InHand {
  boat: string
  setup: string
  weather: string
  /** Query that carries the setup in hand, with what was changed, to the other pages. */
  query: string
}

/** The thin line at the head of every page: where one is, and which setup is in hand. */
export function Masthead({ inHand }: { inHand?: InHand }) {
  const query = inHand?.query ?? ''
  return (
    <header className="border-b border-hair text-note">
      <div className="flex flex-wrap items-center gap-x-6 px-4 md:px-margin">
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
        {inHand && (
          <p className="order-last min-w-0 basis-full truncate pb-2 text-ink-soft md:order-none md:flex-1 md:basis-0 md:pb-0">
            <span className="sr-only">In hand: </span>
            <span className="text-ink">{inHand.boat}</span>, {inHand.setup}, {inHand.weather}
          </p>
        )}
        <a
          href="#cautions"
          className="flex min-h-6 items-center underline underline-offset-4 max-lg:order-last max-lg:basis-full max-lg:pb-2 lg:min-h-touch"
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
    <details className="ml-auto open:basis-full open:pb-3">
      <summary className="flex h-touch cursor-pointer list-none items-center underline underline-offset-4 [&::-webkit-details-marker]:hidden">
        {title}
      </summary>
      {children}
    </details>
  )
}
