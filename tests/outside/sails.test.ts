import { demoBoats } from 'db/demo/boats'
import { DEGREE } from 'sim/constants'
import { helmboldSlope } from 'sim/foils/section'
import { type SailCurve, sailCentre, sailCurve, sailDrag, sailLift } from 'sim/sails/coefficients'
import { describe, expect, test } from 'vitest'

const sails = demoBoats.flatMap((boat) =>
  Object.entries(boat.sails).map(([id, sail]) => ({
    name: `${id} of ${boat.id}`,
    id,
    sail,
    curve: sailCurve(sail.luffLength, sail.area, sail.camber),
  })),
)
const mains = sails.filter(({ id }) => id === 'main')
const headsails = sails.filter(({ sail }) => sail.kind === 'headsail')
const soft = [...mains, ...headsails]

/** Coefficients of a sail at an apparent wind angle and a boom angle to leeward, degrees. */
function trimmed(curve: SailCurve, wind: number, boom: number) {
  const incidence = (wind - boom) * DEGREE
  const lift = sailLift(incidence, -boom * DEGREE, curve)
  const drag = sailDrag(incidence, lift, -boom * DEGREE, curve)
  const drive = lift * Math.sin(wind * DEGREE) - drag * Math.cos(wind * DEGREE)
  return { lift, drag, drive, total: Math.hypot(lift, drag) }
}

/** The trim that drives most, boom no further out than its shrouds let it. */
function bestTrim(curve: SailCurve, wind: number) {
  let best = trimmed(curve, wind, 0)
  for (let boom = 0.5; boom <= 80; boom += 0.5) {
    const tried = trimmed(curve, wind, boom)
    if (tried.drive > best.drive) best = tried
  }
  return best
}

function greatestLift(curve: SailCurve, boom: number) {
  let most = { lift: 0, at: 0 }
  for (let at = 1; at <= 90; at += 0.25) {
    const lift = sailLift(at * DEGREE, -boom * DEGREE, curve)
    if (lift > most.lift) most = { lift, at }
  }
  return most
}

describe('slope of a sail of finite span', () => {
  // Helmbold, read where another page quotes it; Prandtl's 2 pi a/(a + 2) from memory (sure), the upper limit.
  test.each([
    [1, 1.4833],
    [2, 2.6026],
    [3, 3.3627],
    [4, 3.8832],
    [5, 4.2539],
    [6, 4.5287],
  ])('aspect ratio %d', (aspect, helmbold) => {
    expect(helmboldSlope(aspect)).toBeCloseTo(helmbold, 4)
    expect(helmboldSlope(aspect)).toBeLessThan((2 * Math.PI * aspect) / (aspect + 2))
  })
})

describe('camber', () => {
  test('shifts zero lift by no more than the thin circular arc does', () => {
    // cl = 2 pi (alpha + 2 f), read in Schlichting & Truckenbrodt, eq. 2-36; a soft sail keeps a part of it.
    for (const { sail, curve } of sails) {
      expect(curve.zeroLift).toBeGreaterThan(0)
      expect(curve.zeroLift).toBeLessThanOrEqual(2 * sail.camber)
    }
  })

  test('gives less lift than the two-dimensional arc', () => {
    // f = .10: 1.2566 at 0, 1.8049 at 5, 2.3533 at 10 degrees (computed).
    const curve = sailCurve(8.1, 13.5, 0.1)
    for (const [degrees, arc] of [
      [0, 1.2566],
      [5, 1.8049],
      [10, 2.3533],
    ] as const) {
      expect(sailLift(degrees * DEGREE, 0, curve)).toBeLessThan(arc)
    }
  })
})

describe('a soft sail', () => {
  test.each(soft)('$name lifts most, 1.2 to 1.6, at 15 to 25 degrees', ({ curve }) => {
    // Soft Bermudan sails, a range of plausibility (from memory, unsure).
    const { lift, at } = greatestLift(curve, 10)
    expect(lift).toBeGreaterThan(1.2)
    expect(lift).toBeLessThan(1.6)
    expect(at).toBeGreaterThanOrEqual(15)
    expect(at).toBeLessThan(25)
  })

  test.each(soft)('$name keeps a plateau past the stall', ({ curve }) => {
    // Normal coefficient 1.1..1.45 from 25 to 90 degrees of incidence at fixed trim, after the totals of
    // Hazen 1980 as tabulated in Larsson & Eliasson, Principles of Yacht Design (from memory, fairly sure).
    for (let degrees = 25; degrees <= 90; degrees++) {
      const incidence = degrees * DEGREE
      const lift = sailLift(incidence, -10 * DEGREE, curve)
      const drag = sailDrag(incidence, lift, -10 * DEGREE, curve)
      const normal = lift * Math.cos(incidence) + drag * Math.sin(incidence)
      expect(normal).toBeGreaterThan(1.1)
      expect(normal).toBeLessThan(1.45)
    }
  })

  test('luffs without lift and pushes back when it is aback', () => {
    for (const { curve } of sails) {
      expect(sailLift(0, 0, curve)).toBe(0)
      expect(sailDrag(0, 0, 0, curve)).toBeGreaterThan(0)
      for (const degrees of [10, 40, 100, 170]) {
        const there = sailLift(degrees * DEGREE, 0.3, curve)
        expect(sailLift(-degrees * DEGREE, 0.3, curve)).toBeCloseTo(-there, 12)
      }
    }
  })
})

describe('best trim against the envelope of Hazen 1980', () => {
  // As tabulated in Larsson & Eliasson, Principles of Yacht Design (from memory, fairly sure): lift and viscous drag of
  // a main. Not to be exceeded by more than 15 percent.
  const envelope = [
    [27, 1.5, 0.02],
    [50, 1.5, 0.15],
    [80, 0.95, 0.8],
    [100, 0.85, 1],
  ] as const

  test.each(envelope)('total force of a main at %d degrees', (wind, lift, drag) => {
    for (const { curve } of mains) {
      expect(bestTrim(curve, wind).total).toBeLessThan(1.15 * Math.hypot(lift, drag))
    }
  })

  test.each(envelope)('lift of a main at %d degrees', (wind, lift) => {
    for (const { curve } of mains) {
      expect(bestTrim(curve, wind).lift).toBeLessThan(1.15 * lift)
    }
  })

  test('drag of a main dead before the wind', () => {
    for (const { curve } of mains) expect(bestTrim(curve, 180).drive).toBeLessThan(1.15 * 0.9)
  })

  test('lift of a jib at 27 degrees', () => {
    for (const { curve } of headsails) expect(bestTrim(curve, 27).lift).toBeLessThan(1.15 * 1.5)
  })

  test('a main is no weaker than two thirds of it on any point of sailing', () => {
    // A lower limit of our own, so that the envelope cannot be met by a sail that hardly draws.
    for (const { curve } of mains) {
      for (const [wind, lift, drag] of envelope) {
        expect(bestTrim(curve, wind).total).toBeGreaterThan(0.66 * Math.hypot(lift, drag))
      }
    }
  })
})

describe('centre of pressure', () => {
  // Inclined plates: Rayleigh 1/2 - (3/4) cos a/(4 + pi sin a), Joessel .195 + .305 sin a (both read where another page
  // quotes them). Thin circular arc 1/4 + f/(2 (alpha + 2 f)), f = .10 (Schlichting & Truckenbrodt, read).
  test('of a drawing sail lies between an inclined plate and a thin circular arc', () => {
    expect(sailCentre(10 * DEGREE)).toBeGreaterThan(0.248)
    expect(sailCentre(10 * DEGREE)).toBeLessThan(0.3835)
    expect(sailCentre(5 * DEGREE)).toBeLessThan(0.4241)
  })

  test.each([
    [20, 0.299, 0.361],
    [30, 0.348, 0.383],
    [45, 0.411, 0.415],
  ])(
    'of a sail stalled at %d degrees lies within a tenth of the chord aft of a plate',
    (...row) => {
      // A cambered sail carries its load further aft than the plate; a tenth of the chord is ours.
      const [degrees, joessel, rayleigh] = row
      expect(sailCentre(degrees * DEGREE)).toBeGreaterThan(joessel)
      expect(sailCentre(degrees * DEGREE)).toBeLessThan(rayleigh + 0.1)
    },
  )

  test('lies at mid-chord square on', () => {
    expect(sailCentre(90 * DEGREE)).toBeCloseTo(0.5, 9)
  })
})
