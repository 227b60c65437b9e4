import { environmentOf } from 'sim/boat/environment'
import { BOOM, EAST, HEADING, SURGE } from 'sim/boat/state'
import { createSystem } from 'sim/boat/system'
import { vesselOf } from 'sim/boat/vessel'
import { rungeKutta } from 'sim/integrate/runge-kutta'
import { describe, expect, test } from 'vitest'
import { demoPlans } from '../demo-plans'

/** Nothing moves: no wind, no sea, no events. */
const stillness = {
  trueWindSpeedKn: 0,
  turbulenceIntensity: 0.12,
  significantWaveHeightM: 0,
} as const

describe('without wind and sea a boat at rest stays at rest', () => {
  test.each(demoPlans)('$setup.id, tiller lashed or free', ({ boat, setup }) => {
    const plan = { boat, setup }
    const vessel = vesselOf(plan)
    const environment = environmentOf({ ...setup.conditions, ...stillness }, [], 60, vessel.tack)
    for (const helm of ['lashed', 'free'] as const) {
      const system = createSystem(vessel, environment, helm)
      const y = new Float64Array(system.size)
      vessel.sails.forEach((sail, i) => {
        y[BOOM + i] = sail.heldAt
      })
      const start = Float64Array.from(y)
      const step = rungeKutta(system.size, system.derivative)
      for (let i = 0; i < 1200; i++) step(i * 0.05, y, 0.05)
      // Booms may go where their sheets let them; everything else stays.
      for (let i = 0; i < BOOM; i++) {
        expect(Math.abs((y[i] as number) - (start[i] as number))).toBeLessThan(1e-12)
      }
    }
  })
})

test('a boat with way on and nothing to drive her slows to a stop on a straight course', () => {
  for (const plan of demoPlans.slice(0, 4)) {
    const vessel = { ...vesselOf(plan), sails: [], source: -1 }
    const conditions = { ...plan.setup.conditions, ...stillness }
    const system = createSystem(vessel, environmentOf(conditions, [], 60, vessel.tack), 'lashed')
    const y = new Float64Array(system.size)
    y[SURGE] = 2.5
    const step = rungeKutta(system.size, system.derivative)
    let before = 2.5
    for (let i = 0; i < 6000; i++) {
      step(i * 0.05, y, 0.05)
      expect(y[SURGE]).toBeLessThanOrEqual(before)
      before = y[SURGE] as number
    }
    expect(before).toBeLessThan(0.35)
    expect(before).toBeGreaterThanOrEqual(0)
    expect(y[EAST]).toBe(0)
    expect(y[HEADING]).toBe(0)
  }
})
