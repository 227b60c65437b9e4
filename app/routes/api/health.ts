import { healthOf } from '~/features/health/health.server'
import { notWritable, readable } from '~/server/resource'

export const loader = readable(async () => {
  const health = await healthOf()
  return Response.json(health, {
    status: health.database === 'reachable' ? 200 : 503,
    headers: { 'cache-control': 'no-store' },
  })
})

export const action = notWritable
