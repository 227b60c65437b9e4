import { demoBoats } from 'db/demo/boats'
import { loadDemo } from 'db/demo/load'
import { demoSetups } from 'db/demo/setups'
import type { Setup } from 'sim/plan/types'
import { afterAll, beforeAll, expect } from 'vitest'
import { simulateAnswerSchema } from '~/features/simulate/answer'
import { problemSchema } from '~/server/problem'
import { openedScratchDatabase, type ScratchDatabase } from '../scratch-database'

type Handler = (args: never) => Response | Promise<Response>
type Name = 'boats' | 'boat' | 'setups' | 'setup' | 'simulate' | 'health'

/** The routes, filled in before the tests of the file that imports this. */
export const routes = {} as Record<Name, { loader: Handler; action: Handler }>

let scratch: ScratchDatabase
beforeAll(async () => {
  scratch = await openedScratchDatabase()
  await loadDemo(scratch.url)
  Object.assign(routes, {
    boats: await import('~/routes/api/boats'),
    boat: await import('~/routes/api/boat'),
    setups: await import('~/routes/api/setups'),
    setup: await import('~/routes/api/setup'),
    simulate: await import('~/routes/api/simulate'),
    health: await import('~/routes/api/health'),
  })
})
afterAll(async () => {
  const { database } = await import('~/server/database')
  await database.$client.end()
  await scratch.drop()
})

export const call = (handler: Handler, request: Request, params = {}) =>
  handler({ request, params, context: {} } as never)

export const read = (route: keyof typeof routes, params = {}, method = 'GET') =>
  call(routes[route].loader, new Request('http://localhost/', { method }), params)

export const simulate = (body: unknown, signal?: AbortSignal) =>
  call(
    routes.simulate.action,
    new Request('http://localhost/api/simulate', {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: typeof body === 'string' ? body : JSON.stringify(body),
      signal,
    }),
  )

export async function answered(body: unknown) {
  const response = await simulate(body)
  const answer = await response.json()
  expect(answer).toMatchObject({ modelVersion: expect.any(String) })
  return simulateAnswerSchema.parse(answer)
}

export async function refused(body: unknown, status = 400) {
  const response = await simulate(body)
  expect(response.status).toBe(status)
  expect(response.headers.get('content-type')).toBe('application/problem+json')
  return problemSchema.parse(await response.json())
}

export const sound = demoSetups.find((setup) => !setup.flaw) as Setup
export const boatOf = (setup: Setup) => demoBoats.find((boat) => boat.id === setup.boatId)
export const short = { setup: sound.id, durationS: 20 }
