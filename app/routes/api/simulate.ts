import { bounds } from '~/features/simulate/bounds'
import { simulate } from '~/features/simulate/simulate.server'
import { readJsonBody } from '~/server/json-body'
import { answer, methodNotAllowed } from '~/server/resource'
import type { Route } from './+types/simulate'

const refuse = methodNotAllowed('POST')

export const loader = refuse

export function action({ request }: Route.ActionArgs) {
  if (request.method !== 'POST') return refuse({ request })
  return answer(async () => {
    const body = await readJsonBody(request, bounds.bodyBytes)
    return Response.json(await simulate(body, request.signal))
  })
}
