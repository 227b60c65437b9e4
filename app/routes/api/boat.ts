import { getBoat } from '~/features/boats/queries.server'
import { answer, methodNotAllowed, Problem } from '~/server/problem'
import type { Route } from './+types/boat'

export const loader = ({ params }: Route.LoaderArgs) =>
  answer(async () => {
    const boat = await getBoat(params.id)
    if (!boat) throw new Problem(404, 'There is no such boat; /api/boats lists them.')
    return Response.json(boat)
  })

export const action = methodNotAllowed('GET, HEAD')
