import { balanceOf } from 'sim/analysis/balance'
import { environmentOf } from 'sim/boat/environment'
import { HEADING, RUDDER_RATE } from 'sim/boat/state'
import { stepFor } from 'sim/boat/step'
import { createSystem } from 'sim/boat/system'
import { vesselOf } from 'sim/boat/vessel'
import { adaptive } from 'sim/integrate/adaptive'
import { rungeKutta } from 'sim/integrate/runge-kutta'
import type { Plan } from 'sim/plan/types'
import type { Channel } from 'sim/trial/channels'
import { runTrial } from 'sim/trial/run'
import { describe, expect, test } from 'vitest'
import { boatCalled, calm, planWith, soundPlans } from '../demo-plans'

/** Steady wind, no sea, line and elastic taut. */
const smooth: [string, Plan][] = [
  [
    'long keel, mainsheet',
    planWith(boatCalled('long-keel-28'), {
      trim: { main: { sheetAngleDeg: 30 }, genoa: { sheetAngleDeg: 35 } },
      source: 'main',
      line: { hitchDistance: 0.6, takeUp: 0.35 },
      elastic: { stretch: 0.12, naturalLength: 0.6 },
      conditions: { ...calm, trueWindSpeedKn: 12, trueWindAngleDeg: 100 },
    }),
  ],
  [
    'fin and skeg, genoa sheet',
    planWith(boatCalled('fin-skeg-31'), {
      trim: { main: { sheetAngleDeg: 45 }, genoa: { sheetAngleDeg: 40 } },
      source: 'genoa',
      line: { hitchDistance: 0.8, takeUp: 0.4 },
      elastic: { stretch: 0.15, naturalLength: 0.6 },
      conditions: { ...calm, trueWindSpeedKn: 10, trueWindAngleDeg: 110 },
    }),
  ],
]

/** How far a run may be from the reference, degrees, knots and newtons. */
const agreement: Partial<Record<Channel, number>> = {
  courseToWindDeg: 0.02,
  headingDeg: 0.02,
  heelDeg: 0.02,
  tillerDeg: 0.02,
  speedKn: 0.002,
  controlLineN: 0.2,
  elasticN: 0.2,
}

describe.each(smooth)('%s', (_, plan) => {
  test('every halving of the step makes the assembled boat sixteen times more exact', () => {
    const rigged = vesselOf(plan)
    // What has a corner is taken away: dry friction, and the straight pieces of the resistance table.
    const vessel = {
      ...rigged,
      resistance: rigged.resistance.map((_, i) => 12 * i),
      rudder: { ...rigged.rudder, friction: 0 },
      line: { ...rigged.line, exponent: 0, elastic: { ...rigged.line.elastic, hysteresis: 0 } },
    }
    const environment = environmentOf(plan.setup.conditions, [], 60, vessel.tack)
    const system = createSystem(vessel, environment, 'sheet-to-tiller')
    const start = Float64Array.from(balanceOf(plan).state)
    start[HEADING] = (start[HEADING] as number) + 0.06
    const seconds = 2
    const exact = Float64Array.from(start)
    adaptive(system.size, system.derivative, 1e-12)(0, seconds, exact)

    const miss = (steps: number) => {
      const y = Float64Array.from(start)
      const step = rungeKutta(system.size, system.derivative)
      const h = seconds / steps
      for (let i = 0; i < steps; i++) {
        step(i * h, y, h)
        // Corners of slackness stay away from this case.
        expect(system.observed.lineTension).toBeGreaterThan(1)
        expect(system.observed.elasticTension).toBeGreaterThan(1)
      }
      let most = 0
      for (let i = HEADING; i <= RUDDER_RATE; i++) {
        most = Math.max(most, Math.abs((y[i] as number) - (exact[i] as number)))
      }
      return most
    }
    const errors = [40, 80, 160].map(miss)
    for (const [i, error] of errors.slice(1).entries()) {
      const order = Math.log2((errors[i] as number) / error)
      expect(order).toBeGreaterThan(3.5)
      expect(order).toBeLessThan(4.6)
    }
    // At the step in use the error is far below what an instrument could tell.
    expect(errors[0]).toBeLessThan(1e-5)
  })
})

test.each(soundPlans)(
  '$setup.id: in steady wind with one gust the fixed step agrees with the adaptive solver',
  (plan) => {
    const run = (solver: 'fixed-step' | 'adaptive') =>
      runTrial({
        plan,
        conditions: { ...plan.setup.conditions, ...calm },
        events: [{ atS: 30, kind: 'gust', strengthKn: 3, durationS: 20 }],
        helm: 'sheet-to-tiller',
        solver,
        durationS: 120,
        outputIntervalS: 1,
      })
    const quick = run('fixed-step')
    const reference = run('adaptive')
    for (const [channel, limit] of Object.entries(agreement)) {
      const there = quick.series[channel as Channel]
      const here = reference.series[channel as Channel]
      expect(there.length).toBe(here.length)
      there.forEach((value, i) => {
        expect(Math.abs(value - (here[i] as number))).toBeLessThan(limit)
      })
    }
    expect(quick.verdict.code).toBe(reference.verdict.code)
  },
)

test('the step in use resolves the fastest part of any demo boat', () => {
  for (const [, plan] of smooth) {
    const vessel = vesselOf(plan)
    const soft = stepFor(vessel, 100)
    const stiff = stepFor(
      { ...vessel, rudder: { ...vessel.rudder, inertia: vessel.rudder.inertia / 50 } },
      100,
    )
    expect(soft).toBeLessThanOrEqual(0.05)
    expect(stiff).toBeLessThan(soft)
  }
})
