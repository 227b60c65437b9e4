import { demoBoats } from 'db/demo/boats'
import { RUDDER, SURGE } from 'sim/boat/state'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE, KNOT } from 'sim/constants'
import { liftSlope } from 'sim/foils/section'
import { rudderParameters } from 'sim/parameters/hull'
import { stockMoment } from 'sim/steering/stock'
import { describe, expect, test } from 'vitest'
import { planWith } from '../demo-plans'
import { bareVessel, forcesOn } from './bare-vessel'

/** A blade alone under a hull that pushes nothing. */
function blade(area: number, aspect: number, chord: number, balance: number, speedRatio = 1) {
  const { rudder } = bareVessel()
  return bareVessel({
    rudder: { ...rudder, area, aspect, slope: liftSlope(aspect), chord, balance, speedRatio },
  })
}

describe('stock torque', () => {
  // Computed with Whicker & Fehlner 1958 (from memory, fairly sure): aspect ratio 3, 10 degrees, .30 m2, 3 m/s,
  // chord .32 m, stock at .10 of it: normal force 768.1 N, torque 26.5 N m.
  test('of a given normal force, within 15 percent', () => {
    const torque = stockMoment(768.1, 10 * DEGREE, 0.32, 0.1)
    expect(Math.abs(torque) / 26.5).toBeGreaterThan(0.85)
    expect(Math.abs(torque) / 26.5).toBeLessThan(1.15)
  })

  test('on the assembled boat: normal force within 5, torque within 15 percent', () => {
    const vessel = blade(0.3, 3, 0.32, 0.1)
    const { X, Y, observed } = forcesOn(vessel, { [SURGE]: 3, [RUDDER]: 10 * DEGREE })
    const normal = Math.hypot(X, Y)
    expect(normal / 768.1).toBeGreaterThan(0.95)
    expect(normal / 768.1).toBeLessThan(1.05)
    expect(Math.abs(observed.rudderMoment) / 26.5).toBeGreaterThan(0.85)
    expect(Math.abs(observed.rudderMoment) / 26.5).toBeLessThan(1.15)
  })

  test('brings an unbalanced rudder amidships', () => {
    for (const boat of demoBoats) {
      const vessel = vesselOf(planWith(boat, { trim: { main: {} } }))
      const bare = bareVessel({ rudder: vessel.rudder })
      for (const degrees of [3, 10, 30]) {
        const { observed } = forcesOn(bare, { [SURGE]: 2.5, [RUDDER]: degrees * DEGREE })
        // Trailing edge to starboard puts the tiller to port; the water sends it back to starboard.
        expect(observed.rudderMoment).toBeGreaterThan(0)
      }
    }
  })
})

test('no angle of the blade exceeds the class-rule force', () => {
  // 132 K1 K2 K3 A V^2 N (from memory, sure): .30 m2, K1 1.333, K2 1.1, K3 1, 6 knots: 2091 N.
  const vessel = blade(0.3, 3, 0.32, 0.1)
  let most = 0
  for (let degrees = 1; degrees <= 60; degrees++) {
    const { X, Y } = forcesOn(vessel, { [SURGE]: 6 * KNOT, [RUDDER]: degrees * DEGREE })
    most = Math.max(most, Math.hypot(X, Y))
  }
  expect(most).toBeLessThan(2091)
  expect(most).toBeGreaterThan(2091 / 2)
})

test('behind a keel a rudder sees about half the leeway and .9 of the speed', () => {
  // Gerritsma 1971 (from memory, fairly sure).
  expect(rudderParameters.leewayRatio.default).toBeCloseTo(0.5, 12)
  expect(rudderParameters.speedRatio.default).toBeCloseTo(0.9, 12)
})

test('force grows with the square of the speed the rudder sees', () => {
  const slow = forcesOn(blade(0.3, 3, 0.32, 0, 0.9), { [SURGE]: 3, [RUDDER]: 0.1 })
  const full = forcesOn(blade(0.3, 3, 0.32, 0, 1), { [SURGE]: 3, [RUDDER]: 0.1 })
  expect(slow.Y / full.Y).toBeCloseTo(0.81, 9)
})
