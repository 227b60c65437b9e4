import { data, type ShouldRevalidateFunctionArgs } from 'react-router'
import { openTrial } from '~/features/sea-trial/queries.server'
import { SeaTrial } from '~/features/sea-trial/sea-trial'
import type { Route } from './+types/sea-trial'

export function meta() {
  return [
    {
      name: 'description',
      content:
        'Sail a tiller-steered boat under sheet-to-tiller self-steering and see whether she holds her course to the wind.',
    },
  ]
}

export async function loader({ request }: Route.LoaderArgs) {
  const opening = await openTrial(new URL(request.url).searchParams, request.signal)
  const date = new Date().toISOString().slice(0, 10)
  return data({ ...opening, date }, { status: opening.found ? 200 : 404 })
}

/** On the page itself the address follows the state, and this browser computes the runs. */
export function shouldRevalidate({ currentUrl, nextUrl }: ShouldRevalidateFunctionArgs) {
  return currentUrl.pathname !== nextUrl.pathname
}

export default function SeaTrialPage({ loaderData }: Route.ComponentProps) {
  return <SeaTrial {...loaderData} />
}
