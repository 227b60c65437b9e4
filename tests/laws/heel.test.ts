// Common practice, no source.
import { balanceOf } from 'sim/analysis/balance'
import type { Boat, Trim } from 'sim/plan/types'
import { describe, expect, test } from 'vitest'
import { boatCalled, calm, planWith } from '../demo-plans'

/** Weather helm (tiller to windward) and heel to leeward in balance at 55 degrees, degrees. */
function balanced(boat: Boat, knots: number, main: Partial<Trim>, gm = 1) {
  const stiffness = { ...boat.hull, metacentricHeight: gm * boat.hull.metacentricHeight }
  const plan = planWith(
    { ...boat, hull: stiffness },
    {
      trim: { main: { sheetAngleDeg: 22, ...main }, genoa: { sheetAngleDeg: 18 } },
      conditions: { ...calm, trueWindSpeedKn: knots, trueWindAngleDeg: 55 },
    },
  )
  const { found, tillerDeg, heelDeg } = balanceOf(plan)
  expect(found).toBe(true)
  return { helm: tillerDeg, heel: -heelDeg }
}

describe.each(['long-keel-28', 'fin-skeg-31', 'lifting-keel-22', 'ketch-38'])('%s', (id) => {
  const boat = boatCalled(id)

  test('more wind, more heel, more weather helm', () => {
    const light = balanced(boat, 9, {})
    const fresh = balanced(boat, 14, {})
    expect(fresh.heel).toBeGreaterThan(light.heel + 3)
    expect(fresh.helm).toBeGreaterThan(light.helm + 0.5)
  })

  test('the same wind on a less stiff hull heels her further and gives her more weather helm', () => {
    const stiff = balanced(boat, 12, {})
    const tender = balanced(boat, 12, {}, 0.75)
    expect(tender.heel).toBeGreaterThan(stiff.heel + 2)
    expect(tender.helm).toBeGreaterThan(stiff.helm + 0.3)
  })

  test('a reef in the main takes both away', () => {
    const full = balanced(boat, 16, {})
    const reefed = balanced(boat, 16, { reef: 30 })
    expect(reefed.heel).toBeLessThan(full.heel - 1)
    expect(reefed.helm).toBeLessThan(full.helm - 1)
  })

  test('so does easing the main until it lifts', () => {
    const full = balanced(boat, 16, {})
    const eased = balanced(boat, 16, { sheetAngleDeg: 34 })
    expect(eased.heel).toBeLessThan(full.heel - 1)
    expect(eased.helm).toBeLessThan(full.helm - 1)
  })
})
