// Common practice, no source.
import { balanceOf } from 'sim/analysis/balance'
import { HEADING } from 'sim/boat/state'
import { DEGREE } from 'sim/constants'
import { describe, expect, test } from 'vitest'
import { boatCalled, calm, planWith } from '../demo-plans'
import { afloat } from './afloat'

describe.each(['long-keel-28', 'fin-skeg-31', 'lifting-keel-22', 'ketch-38'])('%s', (id) => {
  const boat = boatCalled(id)

  test('heading up from a reach at the same speed raises the apparent wind', () => {
    const plan = planWith(boat, {
      trim: { main: { sheetAngleDeg: 45 }, genoa: { sheetAngleDeg: 40 } },
      conditions: { ...calm, trueWindSpeedKn: 12, trueWindAngleDeg: 110 },
    })
    const { system, y } = afloat(plan, 'lashed')
    const rate = new Float64Array(system.size)
    let before = 0
    for (let course = 110; course >= 50; course -= 10) {
      y[HEADING] = -course * DEGREE
      system.derivative(0, y, rate)
      expect(system.observed.apparentSpeed).toBeGreaterThan(before)
      before = system.observed.apparentSpeed
    }
  })

  test('so it does from balance to balance, sails trimmed to each course', () => {
    let before = 0
    for (const course of [110, 90, 70]) {
      const out = course / 2 - 8
      const plan = planWith(boat, {
        trim: { main: { sheetAngleDeg: out }, genoa: { sheetAngleDeg: out } },
        conditions: { ...calm, trueWindSpeedKn: 12, trueWindAngleDeg: course },
      })
      expect(balanceOf(plan).found).toBe(true)
      const { system, y } = afloat(plan, 'lashed')
      system.derivative(0, y, new Float64Array(system.size))
      expect(system.observed.apparentSpeed).toBeGreaterThan(before)
      before = system.observed.apparentSpeed
    }
  })
})
