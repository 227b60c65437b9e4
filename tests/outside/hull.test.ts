import { demoBoats } from 'db/demo/boats'
import { SURGE, SWAY } from 'sim/boat/state'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE, GRAVITY, RHO_SEA } from 'sim/constants'
import { addedMass, munkMoment } from 'sim/hull/added-mass'
import { frictionCoefficient, hullResistance, residuaryPerWeight } from 'sim/hull/resistance'
import { describe, expect, test } from 'vitest'
import { planWith } from '../demo-plans'
import { bareVessel, forcesOn } from './bare-vessel'

describe('friction line', () => {
  // ITTC-57, Tupper, Introduction to Naval Architecture, table 8.3 (read); 1e8 by the formula.
  test.each([
    [1e5, 0.008333],
    [1e6, 0.004688],
    [1e7, 0.003],
    [1e8, 0.0020833],
    [1e9, 0.001531],
  ])('at Reynolds number %d', (reynolds, coefficient) => {
    expect(frictionCoefficient(reynolds) / coefficient).toBeCloseTo(1, 3)
  })

  test('at 5.62e6', () => {
    // NPL Ship Report 142 (read).
    expect(frictionCoefficient(5.62e6) / 3.325e-3).toBeCloseTo(1, 3)
  })
})

describe('residuary resistance', () => {
  // Delft series, data set "Yacht Hydrodynamics" (Gerritsma, Onnink & Versluis 1981), per unit weight times 1000.
  test.each([
    [0.2, 0.63, 0.791, 1.07],
    [0.3, 2.73, 3.847, 5.06],
    [0.35, 6.86, 8.12, 10.36],
    [0.4, 19.18, 22.018, 27.34],
    [0.45, 44.38, 52.112, 62.42],
  ])(
    'at Froude number %d lies within 15 percent of the mean of 22 hulls and inside their range',
    (...row) => {
      const [froude, least, mean, most] = row
      const own = 1000 * residuaryPerWeight(froude)
      expect(Math.abs(own / mean - 1)).toBeLessThan(0.15)
      expect(own).toBeGreaterThan(least)
      expect(own).toBeLessThan(most)
    },
  )

  test('from Froude number .20 lies within 20 percent of one published hull', () => {
    // LCB -2.3 %, Cp .568, L/disp^(1/3) 4.78, B/T 3.99, L/B 3.17.
    const hull = [0.78, 1.18, 1.82, 2.61, 3.76, 4.99, 7.16, 11.93, 20.11, 32.75, 49.49]
    hull.forEach((figure, i) => {
      const own = 1000 * residuaryPerWeight(0.2 + 0.025 * i)
      expect(Math.abs(own / figure - 1)).toBeLessThan(0.2)
    })
  })

  test('never falls as speed grows, to the end of the table', () => {
    let before = 0
    for (let froude = 0; froude <= 0.9; froude += 0.002) {
      const own = residuaryPerWeight(froude)
      expect(own).toBeGreaterThanOrEqual(before)
      before = own
    }
  })
})

describe('resistance of a demo boat', () => {
  test('is friction on .7 of the waterline and residuary resistance by weight', () => {
    // Computed by hand: L 6.9 m, wetted 13.6 m2, 3800 kg, 2.468 m/s (Fn .30): Re 1.0017e7, CF 2.9996e-3.
    const speed = 0.3 * Math.sqrt(GRAVITY * 6.9)
    const friction = 0.5 * RHO_SEA * speed ** 2 * 13.6 * 2.9996e-3
    const residuary = 3.847e-3 * 3800 * GRAVITY
    const own = hullResistance(speed, 6.9, 13.6, 3800, 1)
    expect(own / (friction + residuary)).toBeCloseTo(1, 3)
  })

  test.each(demoBoats)('$id is slowed by that on the assembled boat, within its table', (boat) => {
    const vessel = vesselOf(planWith(boat, { trim: { main: {} } }))
    const bare = bareVessel({ resistance: vessel.resistance, surgeMass: vessel.surgeMass })
    const { hull } = boat
    for (const speed of [0.4, 1.33, 2.71, 3.3]) {
      const exact = hullResistance(
        speed,
        hull.waterlineLength,
        hull.wettedArea,
        hull.displacement,
        hull.residuaryFactor,
      )
      const { X } = forcesOn(bare, { [SURGE]: speed })
      expect(Math.abs(-X / exact - 1)).toBeLessThan(0.02)
    }
  })
})

describe('Munk moment', () => {
  // Prolate spheroid's added-mass factors k1 (read, Lamb, R&M 623), k2 (computed): ratio 3 .122/.8039, 5 .0591/.8943, 10 .0207/.9602.
  const mass = RHO_SEA * 5
  const k1 = 0.0591
  const k2 = 0.8943

  test('of a spheroid of 5 m3 and ratio 5, at 3 m/s and 5 degrees', () => {
    const drift = 5 * DEGREE
    const u = 3 * Math.cos(drift)
    const v = 3 * Math.sin(drift)
    expect(Math.abs(munkMoment(k1 * mass, k2 * mass, u, v)) / 3344.5).toBeCloseTo(1, 3)
  })

  test('on the assembled boat, and it turns her further across the stream', () => {
    const drift = 5 * DEGREE
    const vessel = bareVessel({ munkMass: (k2 - k1) * mass })
    const { N } = forcesOn(vessel, {
      [SURGE]: 3 * Math.cos(drift),
      [SWAY]: 3 * Math.sin(drift),
    })
    // Drifting to starboard, she turns to port, away from where she goes.
    expect(N / -3344.5).toBeCloseTo(1, 3)
  })

  test.each(demoBoats)(
    'added masses of $id lie where those of spheroids and strips do',
    ({ hull }) => {
      // Surge between ratios 10 and 3; sway from a third of the displacement (flat, shallow body; ours) to a spheroid's .96.
      const added = addedMass(hull.waterlineLength, hull.canoeBodyDraught, hull.displacement, 1)
      expect(added.surge / hull.displacement).toBeGreaterThan(0.0207)
      expect(added.surge / hull.displacement).toBeLessThan(0.122)
      expect(added.sway / hull.displacement).toBeGreaterThan(0.33)
      expect(added.sway / hull.displacement).toBeLessThan(0.9602)
    },
  )
})
