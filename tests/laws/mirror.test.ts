import fc from 'fast-check'
import type { Conditions, Helm, Plan, TrialEvent } from 'sim/plan/types'
import type { Channel } from 'sim/trial/channels'
import { runTrial } from 'sim/trial/run'
import type { TrialResult } from 'sim/trial/types'
import { describe, expect, test } from 'vitest'
import { demoPlans } from '../demo-plans'

/** What turns over with the tack; all other channels stay as they are. */
const turning: Channel[] = [
  'courseToWindDeg',
  'headingDeg',
  'heelDeg',
  'leewayDeg',
  'rollRateDegS',
  'yawRateDegS',
  'tillerDeg',
  'eastM',
  'windDirectionDeg',
  'apparentWindAngleDeg',
]

function sail(plan: Plan, conditions: Conditions, events: TrialEvent[], helm: Helm, side: 1 | -1) {
  return runTrial({
    plan,
    conditions: {
      ...conditions,
      trueWindAngleDeg: side * conditions.trueWindAngleDeg,
      waveAngleDeg: side * conditions.waveAngleDeg,
    },
    events: events.map((event) =>
      event.kind === 'wind-shift' ? { ...event, angleDeg: side * event.angleDeg } : event,
    ),
    helm,
    solver: 'fixed-step',
    durationS: 60,
    outputIntervalS: 1,
  })
}

/** Largest difference between a run and the mirror image of another, over the size of what is compared. */
function difference(there: TrialResult, here: TrialResult): number {
  let most = 0
  const compare = (a: Float64Array, b: Float64Array, side: number, turn: boolean) => {
    expect(a.length).toBe(b.length)
    for (let i = 0; i < a.length; i++) {
      const away = (a[i] as number) - side * (b[i] as number)
      // Half a turn is the same direction from either side.
      const apart = turn ? Math.abs(((away + 540) % 360) - 180) : Math.abs(away)
      most = Math.max(most, apart / Math.max(1, Math.abs(a[i] as number)))
    }
  }
  for (const channel of Object.keys(there.series) as Channel[]) {
    const side = turning.includes(channel) ? -1 : 1
    compare(there.series[channel], here.series[channel], side, side < 0 && channel.endsWith('Deg'))
  }
  for (const id of Object.keys(there.boomDeg)) {
    compare(there.boomDeg[id] as Float64Array, here.boomDeg[id] as Float64Array, -1, false)
    compare(there.drawing[id] as Float64Array, here.drawing[id] as Float64Array, 1, false)
  }
  return most
}

const conditions = fc.record({
  trueWindSpeedKn: fc.double({ min: 4, max: 25, noNaN: true }),
  trueWindAngleDeg: fc.integer({ min: 30, max: 175 }),
  turbulenceIntensity: fc.constantFrom(0, 0.1, 0.2),
  significantWaveHeightM: fc.constantFrom(0, 0.3, 1),
  peakWavePeriodS: fc.double({ min: 2, max: 6, noNaN: true }),
  waveAngleDeg: fc.integer({ min: -90, max: 90 }),
  seed: fc.integer({ min: 0, max: 2147483647 }),
})

describe('port and starboard tack are mirror images', () => {
  test('to the last bit over the first minute, for any boat, trim, helm, wind, sea and shift', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...demoPlans.map((plan) => plan.setup.id)),
        conditions,
        fc.constantFrom<Helm>('sheet-to-tiller', 'lashed', 'free'),
        fc.double({ min: 0, max: 60, noNaN: true }),
        fc.integer({ min: -25, max: 25 }),
        (id, wind, helm, boom, shift) => {
          const plan = demoPlans.find((candidate) => candidate.setup.id === id)
          if (!plan) throw new Error(`no demo setup called ${id}`)
          const trim = plan.setup.trim[plan.setup.source]
          if (!trim) throw new Error('a demo setup without its source')
          const trimmed: Plan = {
            ...plan,
            setup: {
              ...plan.setup,
              trim: {
                ...plan.setup.trim,
                [plan.setup.source]: { ...trim, sheetAngleDeg: boom },
              },
            },
          }
          const events: TrialEvent[] = [
            { atS: 20, kind: 'wind-shift', angleDeg: shift, durationS: 10 },
            { atS: 30, kind: 'gust', strengthKn: 5, durationS: 10 },
          ]
          const starboard = sail(trimmed, wind, events, helm, 1)
          const port = sail(trimmed, wind, events, helm, -1)
          expect(difference(starboard, port)).toBe(0)
          expect(port.happenings).toEqual(
            starboard.happenings.map((told) => ({ ...told, text: expect.any(String) })),
          )
        },
      ),
      { numRuns: 50, seed: 20 },
    )
  })

  test.each(demoPlans)('$setup.id, as it stands', ({ boat, setup }) => {
    const plan = { boat, setup }
    for (const helm of ['sheet-to-tiller', 'lashed', 'free'] as const) {
      const starboard = sail(plan, setup.conditions, [], helm, 1)
      const port = sail(plan, setup.conditions, [], helm, -1)
      expect(difference(starboard, port)).toBe(0)
      expect(port.metrics.meanCourseToWindDeg).toBeCloseTo(
        -starboard.metrics.meanCourseToWindDeg,
        6,
      )
      expect(port.metrics.holds).toBe(starboard.metrics.holds)
    }
  })
})
