import { BOOM, HEADING, HEEL, ROLL_RATE } from 'sim/boat/state'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE, GRAVITY } from 'sim/constants'
import { rightingArm } from 'sim/hull/stability'
import { describe, expect, test } from 'vitest'
import { bareVessel, forcesOn, plainPlan } from './bare-vessel'

describe('righting arm', () => {
  test('agrees with a wall-sided hull at small heel, within 4 percent at 10 degrees', () => {
    // (GM + .5 BM tan^2) sin, GM 1.1, BM 1.6 (computed): .1953 m. Beyond, that beamy hull is stiffer than a cruiser.
    expect(Math.abs(rightingArm(10 * DEGREE, 1.1, 130 * DEGREE) / 0.1953 - 1)).toBeLessThan(0.04)
    expect(rightingArm(20 * DEGREE, 1.1, 130 * DEGREE)).toBeLessThan(0.4125)
    expect(rightingArm(30 * DEGREE, 1.1, 130 * DEGREE)).toBeLessThan(0.6833)
  })

  test('has the shape of one published design, within 5 percent', () => {
    // GZ .475 m at 30 degrees, largest .700 m at 65.9 degrees (read).
    const vanishing = 2 * 65.9 * DEGREE
    const atThirty = rightingArm(30 * DEGREE, 1, vanishing)
    const gm = 0.475 / atThirty
    expect(Math.abs(rightingArm(65.9 * DEGREE, gm, vanishing) / 0.7 - 1)).toBeLessThan(0.05)
    // And a metacentric height as cruisers have.
    expect(gm).toBeGreaterThan(0.8)
    expect(gm).toBeLessThan(1.4)
  })

  test('starts at the metacentric height, vanishes where it is said to, and is odd', () => {
    expect(rightingArm(1e-6, 0.9, 2.2) / 1e-6).toBeCloseTo(0.9, 9)
    expect(rightingArm(2.2, 0.9, 2.2)).toBeCloseTo(0, 12)
    expect(rightingArm(-0.4, 0.9, 2.2)).toBeCloseTo(-rightingArm(0.4, 0.9, 2.2), 12)
  })

  test('rights the assembled boat by displacement times it', () => {
    const { gm, vanishing, mass } = vesselOf(plainPlan)
    for (const heel of [-0.9, -0.2, 0.1, 0.5, 1.2]) {
      const { K } = forcesOn(bareVessel({ gm, vanishing }), { [HEEL]: heel })
      expect(K).toBeCloseTo(-mass * GRAVITY * rightingArm(heel, gm, vanishing), 6)
    }
  })
})

test('roll of the bare hull dies at the stated share of critical damping', () => {
  // Damped oscillator: K = -b p with b = 2 zeta sqrt(m g GM I).
  const { gm, vanishing, mass, rollInertia, rollDamping } = vesselOf(plainPlan)
  const { K } = forcesOn(bareVessel({ gm, vanishing, rollDamping }), { [ROLL_RATE]: 1 })
  const critical = 2 * Math.sqrt(mass * GRAVITY * gm * rollInertia)
  expect(-K / critical).toBeCloseTo(plainPlan.boat.hull.rollDampingRatio, 9)
})

describe('thrust of a heeled rig', () => {
  // |N| = Fx h sin phi, towards the high side (computed).
  test.each([
    [800, 6, 20, 1641.7],
    [1000, 5, 25, 2113.1],
  ])('%d N at %d m, heeled %d degrees', (thrust, height, degrees, moment) => {
    const [sail] = vesselOf(plainPlan).sails
    if (!sail) throw new Error('no sail set')
    // A sail whose force acts at the mast, at the centre of gravity: heel alone gives it a lever.
    const vessel = bareVessel({
      sails: [{ ...sail, chord: 0, luffFromCentre: 0, effortHeight: height }],
    })
    for (const side of [1, -1]) {
      const places = {
        [HEADING]: side * 90 * DEGREE,
        [HEEL]: side * degrees * DEGREE,
        [BOOM]: side * 50 * DEGREE,
      }
      // Wind from the side opposite to the heel.
      const { X, N } = forcesOn(vessel, places)
      expect(X).toBeGreaterThan(0)
      expect((N / X) * thrust).toBeCloseTo(-side * moment, 1)
    }
  })
})
