import { demoSetups } from 'db/demo/setups'
import { withValue } from 'sim/plan/keys'
import type { Setup } from 'sim/plan/types'
import { holdRate } from 'sim/trial/hold-rate'
import { runTrial } from 'sim/trial/run'
import type { TrialRequest } from 'sim/trial/types'
import { expect, test } from 'vitest'
import { answered, boatOf, short, sound } from './interface'

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
