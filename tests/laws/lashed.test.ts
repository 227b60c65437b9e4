// Common practice, no source.
import { balanceOf } from 'sim/analysis/balance'
import type { Boat } from 'sim/plan/types'
import { runHolds } from 'sim/trial/run'
import { describe, expect, test } from 'vitest'
import { boatCalled, planWith, soundPlans } from '../demo-plans'
import { heldOf } from './hold-count'

/** How many of sixteen trims about the usual one let a boat hold a course lashed, under two seeds each. */
function trimsThatHold(boat: Boat, course: number): number {
  const usual = course / 2 - 8
  let holding = 0
  for (const main of [-7, 0, 7, 14]) {
    for (const genoa of [-14, -7, 0, 7]) {
      const plan = planWith(boat, {
        trim: {
          main: { sheetAngleDeg: Math.max(usual + main, 8) },
          genoa: { sheetAngleDeg: Math.max(usual + genoa, 8) },
        },
        conditions: {
          trueWindSpeedKn: 10,
          trueWindAngleDeg: course,
          turbulenceIntensity: 0.12,
          significantWaveHeightM: 0.3,
          peakWavePeriodS: 2.8,
        },
      })
      const balance = balanceOf(plan)
      if (!balance.found || Math.abs(balance.tillerDeg) > 8) continue
      const holds = [1, 2].every((seed) => {
        const conditions = { ...plan.setup.conditions, seed }
        return runHolds({
          plan,
          conditions,
          events: [],
          helm: 'lashed',
          solver: 'fixed-step',
          durationS: 600,
          outputIntervalS: 1,
        }).holds
      })
      if (holds) holding++
    }
  }
  return holding
}

describe.each(['long-keel-28', 'fin-skeg-31'])('%s, lashed and searched over trims', (id) => {
  test('holds close-hauled, under fewer trims on a reach, under none running', () => {
    const [closeHauled, reaching, running] = [50, 90, 170].map((course) =>
      trimsThatHold(boatCalled(id), course),
    ) as [number, number, number]
    expect(closeHauled).toBeGreaterThan(0)
    expect(reaching).toBeLessThan(closeHauled)
    expect(running).toBe(0)
  }, 120_000)
})

test('there are courses and trims where sheet-to-tiller holds and lashed does not', () => {
  // The demo setups were found by search; two boats at least must show it.
  const boats = new Set<string>()
  for (const plan of soundPlans) {
    if (boats.has(plan.boat.id)) continue
    if (heldOf(plan, 'lashed', 10) <= 3 && heldOf(plan, 'sheet-to-tiller', 10) >= 8) {
      boats.add(plan.boat.id)
    }
    if (boats.size === 2) break
  }
  expect(boats.size).toBe(2)
}, 120_000)
