import { listSetups } from '~/features/setups/queries.server'
import { answer, methodNotAllowed } from '~/server/problem'

export const loader = () => answer(async () => Response.json(await listSetups()))

export const action = methodNotAllowed('GET, HEAD')
