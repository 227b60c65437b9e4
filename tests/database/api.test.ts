import { demoBoats } from 'db/demo/boats'
import { loadDemo } from 'db/demo/load'
import { demoSetups } from 'db/demo/setups'
import fc from 'fast-check'
import { withValue } from 'sim/plan/keys'
import type { Setup } from 'sim/plan/types'
import { holdRate } from 'sim/trial/hold-rate'
import { runTrial } from 'sim/trial/run'
import type { TrialRequest } from 'sim/trial/types'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { simulateAnswerSchema } from '~/features/simulate/answer'
import { problemSchema } from '~/server/problem'
import { openedScratchDatabase, type ScratchDatabase } from './scratch-database'

type Handler = (args: never) => Response | Promise<Response>
type Route = { loader: Handler; action: Handler }

let scratch: ScratchDatabase
const routes = {} as Record<'boats' | 'boat' | 'setups' | 'setup' | 'simulate' | 'health', Route>

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

const call = (handler: Handler, request: Request, params = {}) =>
  handler({ request, params, context: {} } as never)

const read = (route: keyof typeof routes, params = {}, method = 'GET') =>
  call(routes[route].loader, new Request('http://localhost/', { method }), params)

const simulate = (body: unknown, signal?: AbortSignal) =>
  call(
    routes.simulate.action,
    new Request('http://localhost/api/simulate', {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: typeof body === 'string' ? body : JSON.stringify(body),
      signal,
    }),
  )

async function answered(body: unknown) {
  const response = await simulate(body)
  const answer = await response.json()
  expect(answer).toMatchObject({ modelVersion: expect.any(String) })
  return simulateAnswerSchema.parse(answer)
}

async function refused(body: unknown, status = 400) {
  const response = await simulate(body)
  expect(response.status).toBe(status)
  expect(response.headers.get('content-type')).toBe('application/problem+json')
  return problemSchema.parse(await response.json())
}

const sound = demoSetups.find((setup) => !setup.flaw) as Setup
const boatOf = (setup: Setup) => demoBoats.find((boat) => boat.id === setup.boatId)
const short = { setup: sound.id, durationS: 20 }

function requestOf(setup: Setup, more: Partial<TrialRequest> = {}): TrialRequest {
  const boat = boatOf(setup)
  if (!boat) throw new Error(`the boat of ${setup.id} is not among the demo boats`)
  return {
    plan: { boat, setup },
    conditions: setup.conditions,
    events: [],
    helm: 'sheet-to-tiller',
    solver: 'fixed-step',
    durationS: 600,
    outputIntervalS: 1,
    ...more,
  }
}

describe('reading', () => {
  test('the lists name every demo boat and setup, with flaws where they are', async () => {
    const boats = await (await read('boats')).json()
    expect(boats.map((boat: { id: string }) => boat.id).sort()).toEqual(
      demoBoats.map((boat) => boat.id).sort(),
    )
    const setups = await (await read('setups')).json()
    for (const stated of demoSetups) {
      const entry = setups.find((candidate: { id: string }) => candidate.id === stated.id)
      expect(entry).toMatchObject({
        name: stated.name,
        boat: { id: stated.boatId, name: boatOf(stated)?.name },
        conditions: stated.conditions,
        source: stated.source,
      })
      expect(entry.flaw).toEqual(stated.flaw)
    }
  })

  test('whole documents are read by id', async () => {
    expect(await (await read('setup', { id: sound.id })).json()).toEqual(sound)
    expect(await (await read('boat', { id: sound.boatId })).json()).toEqual(boatOf(sound))
  })

  test.each(['boat', 'setup'] as const)('an unknown %s is a 404', async (route) => {
    for (const id of ['nobody', '\u0000', '']) {
      const response = await read(route, { id })
      expect(response.status).toBe(404)
      problemSchema.parse(await response.json())
    }
  })

  test('health tells that the database is reachable', async () => {
    const response = await read('health')
    expect(response.status).toBe(200)
    expect(await response.json()).toMatchObject({ status: 'ready', database: 'reachable' })
  })

  test.each([
    ['boats', 'action', 'POST', 'GET, HEAD'],
    ['setups', 'action', 'DELETE', 'GET, HEAD'],
    ['setups', 'loader', 'OPTIONS', 'GET, HEAD'],
    ['health', 'action', 'PUT', 'GET, HEAD'],
    ['simulate', 'loader', 'GET', 'POST'],
    ['simulate', 'action', 'PUT', 'POST'],
  ] as const)('%s %s %s is a 405 that allows %s', async (route, handler, method, allow) => {
    const response = await call(
      routes[route][handler],
      new Request('http://localhost/', { method }),
    )
    expect(response.status).toBe(405)
    expect(response.headers.get('allow')).toBe(allow)
    problemSchema.parse(await response.json())
  })
})

describe('simulating', () => {
  test('a setup by its id alone is sailed as it states, with the numbers of the model itself', async () => {
    const answer = await answered({ setup: sound.id })
    const expected = runTrial(requestOf(sound))
    expect(answer.setup.conditions).toEqual({ ...sound.conditions, events: [] })
    expect(answer).toMatchObject({ helm: 'sheet-to-tiller', solver: 'fixed-step', seeds: 1 })
    expect(answer.verdict).toEqual(expected.verdict)
    expect(answer.metrics.holds).toBe(expected.metrics.holds)
    expect(answer.metrics.holdRate).toBeUndefined()
    expect(answer.series.timeS).toHaveLength(expected.series.timeS.length)
    for (const [name, column] of Object.entries(answer.series)) {
      const exact = expected.series[name as keyof typeof expected.series]
      for (const [row, value] of column.entries()) {
        expect(Math.abs((value ?? Number.NaN) - (exact[row] ?? Number.NaN))).toBeLessThan(1e-6)
      }
    }
  })

  test('a setup written out gives the same run as its id', async () => {
    const whole = { ...sound, boat: boatOf(sound) }
    const byId = await answered(short)
    expect(await answered({ ...short, setup: whole })).toEqual(byId)
    expect(await answered({ ...short, setup: sound })).toEqual(byId)
    const { id, name, summary, ...unnamed } = sound
    expect((await answered({ ...short, setup: unnamed })).series).toEqual(byId.series)
  })

  test('conditions that are given replace the stated ones, and the rest stay', async () => {
    const { conditions } = (
      await answered({ ...short, conditions: { trueWindSpeedKn: 9.5, seed: 42 } })
    ).setup
    expect(conditions).toEqual({
      ...sound.conditions,
      trueWindSpeedKn: 9.5,
      seed: 42,
      events: [],
    })
  })

  test('changes by key are those of the model', async () => {
    const changes = { 'line.takeUp': 0.05, 'hull.displacement': 5000 }
    const answer = await answered({ ...short, changes })
    let { plan } = requestOf(sound)
    for (const [key, value] of Object.entries(changes)) plan = withValue(plan, key, value)
    const expected = runTrial(requestOf(sound, { plan, durationS: 20 }))
    expect(answer.setup.changes).toEqual(changes)
    expect(answer.series.tillerDeg.at(-1)).toBeCloseTo(expected.series.tillerDeg.at(-1) ?? 0, 5)
    expect(answer.series).not.toEqual((await answered(short)).series)
  })

  test('the hold rate is over the seed and those that follow it', async () => {
    const seeds = 4
    const conditions = { seed: 11 }
    const answer = await answered({ setup: sound.id, seeds, conditions, outputIntervalS: 10 })
    const request = requestOf(sound, {
      conditions: { ...sound.conditions, ...conditions },
      outputIntervalS: 10,
    })
    expect(answer.metrics.holdRate).toEqual(holdRate(request, seeds))
    expect(answer.series.tillerDeg.at(-1)).toBeCloseTo(
      runTrial(request).series.tillerDeg.at(-1) ?? 0,
      5,
    )
  })

  test('events happen, the helm and the solver are those asked for, and output is as often as asked', async () => {
    const answer = await answered({
      ...short,
      helm: 'lashed',
      solver: 'adaptive',
      outputIntervalS: 0.5,
      conditions: { events: [{ atS: 5, kind: 'gust', strengthKn: 5, durationS: 6 }] },
    })
    expect(answer).toMatchObject({ helm: 'lashed', solver: 'adaptive', outputIntervalS: 0.5 })
    expect(answer.events.map((event) => event.code)).toContain('gust')
    expect(answer.series.timeS.slice(0, 3)).toEqual([0, 0.5, 1])
    expect(answer.series.timeS).toHaveLength(41)
  })

  test.each(demoSetups.map((setup) => [setup.id, setup] as const))(
    '%s, on either tack and with each helm, gives numbers only',
    async (_, setup) => {
      const trueWindAngleDeg = -setup.conditions.trueWindAngleDeg
      for (const helm of ['sheet-to-tiller', 'lashed', 'free']) {
        const conditions = { trueWindAngleDeg }
        const answer = await answered({ setup: setup.id, helm, conditions, durationS: 60 })
        expect(JSON.stringify(answer)).not.toMatch(/null|NaN|Infinity/)
      }
    },
  )
})

describe('refusing', () => {
  test('an unknown setup is a 404', async () => {
    for (const setup of ['nobody', '', '\u0000', 'x'.repeat(10_000)]) {
      await refused({ setup }, 404)
    }
  })

  const lineOf = (line: object) => ({ ...sound, line: { ...sound.line, ...line } })
  test.each<[string, unknown, string]>([
    ['nothing', {}, 'setup'],
    ['a list', [], 'body'],
    ['a number', 5, 'body'],
    ['a setup that is neither', { setup: 7 }, 'setup'],
    ['a field of no meaning', { ...short, wind: 3 }, 'wind'],
    ['too short a run', { ...short, durationS: 9 }, 'durationS'],
    ['too long a run', { ...short, durationS: 3601 }, 'durationS'],
    ['an endless run', `{"setup":"${sound.id}","durationS":1e999}`, 'durationS'],
    ['output too often', { ...short, outputIntervalS: 0.05 }, 'outputIntervalS'],
    ['output never', { ...short, outputIntervalS: 30 }, 'outputIntervalS'],
    ['too much output', { ...short, durationS: 3600, outputIntervalS: 0.1 }, 'outputIntervalS'],
    ['no seeds', { ...short, seeds: 0 }, 'seeds'],
    ['half a seed', { ...short, seeds: 1.5 }, 'seeds'],
    ['too many seeds', { ...short, seeds: 51 }, 'seeds'],
    ['seeds past the last', { ...short, seeds: 2, conditions: { seed: 2147483647 } }, 'seeds'],
    [
      'more adaptive runs than there is time for',
      { ...short, solver: 'adaptive', durationS: 3600, outputIntervalS: 1, seeds: 3 },
      'seeds',
    ],
    ['an unknown solver', { ...short, solver: 'exact' }, 'solver'],
    ['an unknown helm', { ...short, helm: 'hand' }, 'helm'],
    ['a storm', { ...short, conditions: { trueWindSpeedKn: 90 } }, 'conditions.trueWindSpeedKn'],
    ['an unknown condition', { ...short, conditions: { tide: 1 } }, 'conditions.tide'],
    [
      'an unknown event',
      { ...short, conditions: { events: [{ atS: 1, kind: 'whale' }] } },
      'conditions.events.0.kind',
    ],
    [
      'a reef in a sail she does not have',
      { ...short, conditions: { events: [{ atS: 1, kind: 'reef', sail: 'kite', percent: 9 }] } },
      'conditions.events.0.sail',
    ],
    ['an unknown key', { ...short, changes: { 'line.colour': 1 } }, 'changes.line.colour'],
    ['a change out of range', { ...short, changes: { 'line.takeUp': 9 } }, 'changes.line.takeUp'],
    ['a change of wrong type', { ...short, changes: { 'line.pull': 1 } }, 'changes.line.pull'],
    ['a change to an object', { ...short, changes: { 'line.takeUp': {} } }, 'changes.line.takeUp'],
    ['a lead she does not have', { ...short, changes: { 'leads.9.x': 1 } }, 'changes.leads.9.x'],
    ['a whole setup out of range', { ...short, setup: lineOf({ takeUp: 9 }) }, 'setup.line.takeUp'],
    ['a whole setup with more', { ...short, setup: lineOf({ hue: 9 }) }, 'setup.line.hue'],
    [
      'a whole setup of an unknown boat',
      { ...short, setup: { ...sound, boatId: 'ark' } },
      'setup.boatId',
    ],
    [
      'a whole setup with another boat than it names',
      { ...short, setup: { ...sound, boatId: 'ark', boat: boatOf(sound) } },
      'setup.boatId',
    ],
    [
      'a pull from a sail she does not have',
      { ...short, setup: { ...sound, source: 'kite' } },
      'setup.source',
    ],
    ['a whole setup without trims', { ...short, setup: { ...sound, trim: {} } }, 'setup.trim'],
  ])('%s is refused by name', async (_, body, field) => {
    const { errors = [] } = await refused(body)
    const error = errors.find((candidate) => candidate.field.startsWith(field))
    expect(error, JSON.stringify(errors)).toBeDefined()
  })

  test('an error names what was given, the allowed range and the unit', async () => {
    const { errors } = await refused({ ...short, changes: { 'line.takeUp': 9 } })
    expect(errors).toEqual([
      {
        field: 'changes.line.takeUp',
        given: 9,
        message: 'line.takeUp must be from -0.5 to 1.8 m',
        min: -0.5,
        max: 1.8,
      },
    ])
  })

  test('a request given up by its sender is not computed to the end', async () => {
    const sender = new AbortController()
    const asked = simulate({ setup: sound.id, seeds: 50, durationS: 3600 }, sender.signal)
    const began = performance.now()
    setTimeout(() => sender.abort(), 100)
    expect((await asked).status).toBe(503)
    expect(performance.now() - began).toBeLessThan(2000)
  })

  test('whatever is put into a field, the answer is a run or a refusal', async () => {
    const whole = { ...short, durationS: 10, setup: { ...sound, boat: boatOf(sound) } }
    const paths = [...pathsIn(whole), ['conditions'], ['changes'], ['seeds'], ['helm']]
    const value = fc.oneof(
      fc.jsonValue(),
      fc.double(),
      fc.constantFrom(0, -1, 1e-300, 1e300, '', 'main', null, [], {}),
    )
    await fc.assert(
      fc.asyncProperty(fc.constantFrom(...paths), value, async (path, replaced) => {
        const response = await simulate(replacedAt(whole, path, replaced))
        const text = await response.text()
        expect([200, 400, 404], text).toContain(response.status)
        expect(text).not.toMatch(/NaN|Infinity(?!")|\.ts:\d/)
        if (response.status !== 200) problemSchema.parse(JSON.parse(text))
      }),
      { numRuns: 150 },
    )
  })

  test('whatever the body is, the answer is a refusal', async () => {
    await fc.assert(
      fc.asyncProperty(fc.oneof(fc.string(), fc.json()), async (body) => {
        const response = await simulate(body)
        expect([400, 404]).toContain(response.status)
        problemSchema.parse(await response.json())
      }),
      { numRuns: 200 },
    )
  })
})

/** Every place in a document, from its top down. */
function pathsIn(node: unknown, above: string[] = []): string[][] {
  if (typeof node !== 'object' || node === null) return []
  return Object.entries(node).flatMap(([key, value]) => [
    [...above, key],
    ...pathsIn(value, [...above, key]),
  ])
}

function replacedAt(node: unknown, path: string[], value: unknown): unknown {
  const [step, ...rest] = path
  if (step === undefined) return value
  const copy = (Array.isArray(node) ? [...node] : { ...(node as object) }) as Record<
    string,
    unknown
  >
  copy[step] = replacedAt(copy[step], rest, value)
  return copy
}
