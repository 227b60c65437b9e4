import { listBoats } from '~/features/boats/queries.server'
import { answer, methodNotAllowed } from '~/server/problem'

export const loader = () => answer(async () => Response.json(await listBoats()))

export const action = methodNotAllowed('GET, HEAD')
