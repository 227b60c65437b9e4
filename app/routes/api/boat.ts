import { getBoat } from '~/features/boats/queries.server'
import { Problem } from '~/server/problem'
import { notWritable, readable } from '~/server/resource'
import type { Route } from './+types/boat'

export const loader = readable(async ({ params }: Route.LoaderArgs) => {
  const boat = await getBoat(params.id)
  if (!boat) throw new Problem(404, 'There is no such boat; /api/boats lists them.')
  return Response.json(boat)
})

export const action = notWritable
