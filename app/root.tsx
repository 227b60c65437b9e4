import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { type ReactNode, useState } from 'react'
import {
  isRouteErrorResponse,
  Links,
  Meta,
  Outlet,
  Scripts,
  ScrollRestoration,
  type ShouldRevalidateFunctionArgs,
} from 'react-router'
import type { Route } from './+types/root'
import './app.css'
import { readPreferences } from './features/preferences/cookie.server'
import { PREFERENCES_PATH, usePreferences } from './features/preferences/use-preferences'
import { Cautions } from './features/shell/cautions'
import { Masthead } from './features/shell/masthead'

export const links: Route.LinksFunction = () => [
  { rel: 'icon', href: '/icon.svg', type: 'image/svg+xml' },
]

export async function loader({ request }: Route.LoaderArgs) {
  return { preferences: await readPreferences(request) }
}

/** Preferences change by their own form and by nothing else. */
export function shouldRevalidate({ formAction }: ShouldRevalidateFunctionArgs) {
  return formAction === PREFERENCES_PATH
}

export function Layout({ children }: { children: ReactNode }) {
  const { theme } = usePreferences()
  return (
    <html lang="en" data-theme={theme === 'system' ? undefined : theme}>
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <Meta />
        <Links />
      </head>
      <body>
        {children}
        <ScrollRestoration />
        <Scripts />
      </body>
    </html>
  )
}

export default function Root() {
  const [queries] = useState(
    () => new QueryClient({ defaultOptions: { queries: { staleTime: Number.POSITIVE_INFINITY } } }),
  )
  return (
    <QueryClientProvider client={queries}>
      <Outlet />
      <Cautions />
    </QueryClientProvider>
  )
}

export function ErrorBoundary({ error }: Route.ErrorBoundaryProps) {
  const { title, text } = described(error)
  return (
    <>
      <title>{`${title} · Counterhelm`}</title>
      <Masthead />
      <main className="max-w-measure px-4 py-12 md:px-margin">
        <h1 className="text-title font-strong">{title}</h1>
        <p className="mt-3">{text}</p>
        <p className="mt-3">
          <a href="/" className="underline underline-offset-4">
            Go to the sea trial
          </a>
        </p>
      </main>
      <Cautions />
    </>
  )
}

function described(error: unknown): { title: string; text: string } {
  if (!isRouteErrorResponse(error)) {
    return {
      title: 'Something gave way',
      text: 'The page could not be shown. What you set is in the address; load it again to go on from there.',
    }
  }
  if (error.status === 404) {
    return { title: 'No such page', text: 'Nothing is kept at this address.' }
  }
  if (error.status === 405) {
    return { title: 'Not done that way', text: 'This address does not take what was sent to it.' }
  }
  return {
    title: `The server answered ${error.status}`,
    text:
      typeof error.data === 'string' && error.data !== ''
        ? error.data
        : 'The page could not be shown. Load it again in a moment.',
  }
}
