import { HEADING, HEEL, SURGE } from 'sim/boat/state'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE, KNOT, RHO_AIR } from 'sim/constants'
import { apparentWind } from 'sim/wind/apparent'
import { gustShape, shiftShape } from 'sim/wind/gust'
import { windProfile } from 'sim/wind/profile'
import { describe, expect, test } from 'vitest'
import { bareVessel, forcesOn, plainPlan } from './bare-vessel'

describe('apparent wind', () => {
  // Computed from AWS^2 = TWS^2 + BS^2 + 2 TWS BS cos TWA; heel by tan AWAe = tan AWA cos phi,
  // Jackson, "Modelling the aerodynamics of upwind sails" (read in the abstract).
  const triangle = [
    [10, 90, 5, 0, 11.1803, 63.435],
    [12, 45, 5, 0, 15.9328, 32.179],
    [15, 120, 6, 0, 13.0767, 96.587],
    [20, 150, 6, 0, 15.1048, 138.544],
    [8, 40, 4, 0, 11.359, 26.918],
    [10, 180, 5, 0, 5, 180],
    [12, 45, 5, 20, 15.6662, 30.595],
    [12, 45, 5, 30, 15.3575, 28.587],
    [15, 90, 6, 20, 15.3193, 66.942],
  ] as const

  test.each(triangle)('TWS %d TWA %d BS %d heel %d', (tws, twa, bs, heel, aws, awa) => {
    const felt = apparentWind(tws, twa * DEGREE, bs, heel * DEGREE)
    expect(felt.speed).toBeCloseTo(aws, 3)
    expect(felt.angle / DEGREE).toBeCloseTo(awa, 3)
    const other = apparentWind(tws, -twa * DEGREE, bs, -heel * DEGREE)
    expect(other.speed).toBeCloseTo(aws, 3)
    expect(Math.abs(other.angle / DEGREE)).toBeCloseTo(awa, 3)
  })

  test.each(triangle)(
    'the assembled boat feels the same at TWS %d TWA %d BS %d heel %d',
    (...row) => {
      const [tws, twa, bs, heel, aws, awa] = row
      const [sail] = vesselOf(plainPlan).sails
      if (!sail) throw new Error('no sail set')
      const vessel = bareVessel({ sails: [{ ...sail, profile: tws / 20 }] })
      const { observed } = forcesOn(vessel, {
        [HEADING]: -twa * DEGREE,
        [HEEL]: -heel * DEGREE,
        [SURGE]: bs * KNOT,
      })
      expect(observed.apparentSpeed / KNOT).toBeCloseTo(aws, 3)
      expect(Math.abs(observed.apparentAngle) / DEGREE).toBeCloseTo(awa, 3)
    },
  )

  test('dynamic pressure of 10 and 20 knots', () => {
    // Computed, rho 1.225.
    expect(0.5 * RHO_AIR * (10 * KNOT) ** 2).toBeCloseTo(16.21, 2)
    expect(0.5 * RHO_AIR * (20 * KNOT) ** 2).toBeCloseTo(64.84, 2)
  })
})

describe('profile over the sea', () => {
  // Froya, ISO 19901-1 (read where another page quotes it): U(z) = U0 (1 + C ln(z/10)), C = .0573 sqrt(1 + .15 U0).
  test('ten metres a second at 10 m', () => {
    expect(10 * windProfile(5, 10)).toBeCloseTo(9.372, 3)
    expect(10 * windProfile(10, 10)).toBeCloseTo(10, 9)
    expect(10 * windProfile(20, 10)).toBeCloseTo(10.628, 3)
  })

  test('each sail feels it at its own centre of effort', () => {
    for (const trueWindSpeedKn of [6, 20]) {
      const plan = { ...plainPlan, setup: { ...plainPlan.setup } }
      plan.setup.conditions = { ...plan.setup.conditions, trueWindSpeedKn }
      for (const sail of vesselOf(plan).sails) {
        const wind = trueWindSpeedKn * KNOT
        const slope = 0.0573 * Math.sqrt(1 + 0.15 * wind)
        expect(sail.profile).toBeCloseTo(1 + slope * Math.log(sail.effortHeight / 10), 9)
      }
    }
  })
})

describe('gusts dropped in', () => {
  // One-minus-cosine shape, IEC 61400-1 ed. 3, transient gusts (from memory, sure).
  test('a gust rises to its strength half way and leaves nothing', () => {
    expect(gustShape(5, 10)).toBeCloseTo(1, 12)
    expect(gustShape(2.5, 10)).toBeCloseTo(0.5, 12)
    for (const t of [-1, 0, 10, 11]) expect(gustShape(t, 10)).toBe(0)
  })

  test('a lasting change stays', () => {
    expect(shiftShape(0, 6)).toBe(0)
    expect(shiftShape(3, 6)).toBeCloseTo(0.5, 12)
    expect(shiftShape(60, 6)).toBe(1)
  })
})
