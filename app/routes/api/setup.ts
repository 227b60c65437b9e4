import { getSetup } from '~/features/setups/queries.server'
import { Problem } from '~/server/problem'
import { notWritable, readable } from '~/server/resource'
import type { Route } from './+types/setup'

export const loader = readable(async ({ params }: Route.LoaderArgs) => {
  const setup = await getSetup(params.id)
  if (!setup) throw new Problem(404, 'There is no such setup; /api/setups lists them.')
  return Response.json(setup)
})

export const action = notWritable
