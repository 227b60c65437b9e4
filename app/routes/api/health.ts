import { healthOf } from '~/features/health/health.server'
import { methodNotAllowed } from '~/server/problem'

export const loader = async () => {
  const health = await healthOf()
  return Response.json(health, {
    status: health.database === 'reachable' ? 200 : 503,
    headers: { 'cache-control': 'no-store' },
  })
}

export const action = methodNotAllowed('GET, HEAD')
