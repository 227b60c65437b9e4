import { DEGREE } from 'sim/constants'
import { foilCentre, foilDrag, foilLift, liftSlope } from 'sim/foils/section'
import { describe, expect, test } from 'vitest'

const within = (value: number, figure: number, share: number) =>
  expect(Math.abs(value / figure - 1)).toBeLessThan(share)

describe('lift slope', () => {
  // Whicker & Fehlner 1958, DTMB report 933 (from memory, sure); no sweep.
  test.each([
    [0.5, 0.7322],
    [1, 1.4011],
    [1.5, 1.9726],
    [2, 2.4435],
    [3, 3.1384],
    [4, 3.6063],
    [6, 4.1761],
  ])('aspect ratio %d', (aspect, slope) => {
    expect(liftSlope(aspect)).toBeCloseTo(slope, 4)
  })

  test.each([
    [1, 1.4652],
    [2, 2.4784],
    [3, 3.1572],
    [4, 3.6357],
  ])('agrees within 5 percent with Soeding and Brix at aspect ratio %d', (aspect, slope) => {
    // 2 pi L (L + .7)/(L + 1.7)^2 (from memory, sure).
    within(liftSlope(aspect), slope, 0.05)
  })

  test('goes to pi a/2 for a slender wing, within 6 percent', () => {
    // Jones's limit; the formula's own limit is 1.8 pi a/3.8.
    within(liftSlope(0.02), (Math.PI * 0.02) / 2, 0.06)
  })

  test('falls with sweep', () => {
    expect(liftSlope(3, 40 * DEGREE)).toBeLessThan(liftSlope(3, 20 * DEGREE))
    expect(liftSlope(3, 20 * DEGREE)).toBeLessThan(liftSlope(3))
  })
})

describe('a foil of aspect ratio 3', () => {
  // Whicker & Fehlner with their cross-flow term, taper .45, square tips (from memory, sure).
  const slope = liftSlope(3)
  test.each([
    [5, 0.276, 0.0155],
    [10, 0.5561, 0.043],
  ])(
    'at %d degrees lifts within 5 and drags within 10 percent of theirs',
    (degrees, lift, drag) => {
      const own = foilLift(degrees * DEGREE, slope)
      within(own, lift, 0.05)
      within(foilDrag(degrees * DEGREE, own, 3), drag, 0.1)
    },
  )

  test('near its stall at 20 degrees lifts within 15 percent of theirs', () => {
    within(foilLift(20 * DEGREE, slope), 1.1288, 0.15)
  })

  test('drags by section and induced drag before it stalls', () => {
    // CD = .0065 + CL^2/(.9 pi a), same source.
    for (const degrees of [0, 4, 8, 12]) {
      const lift = foilLift(degrees * DEGREE, slope)
      const drag = 0.0065 + lift ** 2 / (0.9 * Math.PI * 3)
      expect(foilDrag(degrees * DEGREE, lift, 3)).toBeCloseTo(drag, 9)
    }
  })

  test('presses at .208 of the chord at 10 degrees, within a fiftieth of the chord', () => {
    // From memory, fairly sure.
    expect(Math.abs(foilCentre(10 * DEGREE) - 0.208)).toBeLessThan(0.02)
  })

  test('drags like a plate of its span when square on', () => {
    // 1.11 + .018 a, Viterna & Corrigan 1982 (read where another page quotes it).
    within(foilDrag(90 * DEGREE, 0, 3), 1.11 + 0.018 * 3, 0.05)
  })

  test('is odd in its incidence and lifts nothing square on', () => {
    for (const degrees of [3, 17, 40, 90, 130]) {
      const lift = foilLift(degrees * DEGREE, slope)
      expect(foilLift(-degrees * DEGREE, slope)).toBeCloseTo(-lift, 12)
    }
    expect(foilLift(90 * DEGREE, slope)).toBeCloseTo(0, 9)
  })

  test('past its stall follows the separated plate in shape', () => {
    // Hoerner 1/(.222 + .283/sin a) over its value square on (read where another page quotes it).
    const square = 1.9802
    for (const [degrees, plate] of [
      [45, 1.6071],
      [60, 1.8222],
    ] as const) {
      const a = degrees * DEGREE
      const lift = foilLift(a, slope)
      const normal = lift * Math.cos(a) + foilDrag(a, lift, 3) * Math.sin(a)
      within(normal / foilDrag(90 * DEGREE, 0, 3), plate / square, 0.02)
    }
  })
})
