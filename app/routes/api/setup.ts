import { getSetup } from '~/features/setups/queries.server'
import { answer, methodNotAllowed, Problem } from '~/server/problem'
import type { Route } from './+types/setup'

export const loader = ({ params }: Route.LoaderArgs) =>
  answer(async () => {
    const setup = await getSetup(params.id)
    if (!setup) throw new Problem(404, 'There is no such setup; /api/setups lists them.')
    return Response.json(setup)
  })

export const action = methodNotAllowed('GET, HEAD')
