import fc from 'fast-check'
import { atan2, cos, exp, hypot, log, power, sin } from 'sim/elementary'
import { describe, expect, test } from 'vitest'

/** Distance in units in the last place of the figure, or of `scale` where the figure is smaller. */
function units(value: number, figure: number, scale = 0): number {
  const size = Math.max(Math.abs(figure), scale, 1e-280)
  return Math.abs(value - figure) / (2 ** Math.floor(Math.log2(size)) * Number.EPSILON)
}

const settings = { numRuns: 20_000, seed: 5 }
/** Numbers of a range: special ones, and others spread evenly over it. */
const double = (min: number, max: number) =>
  fc.oneof(
    fc.double({ min, max, noNaN: true }),
    fc.integer({ min: 0, max: 2 ** 31 }).map((i) => min + ((max - min) * i) / 2 ** 31),
  )

describe('elementary functions agree with the engine within a few units in the last place', () => {
  test('sine and cosine, to a thousand turns', () => {
    fc.assert(
      fc.property(double(-6300, 6300), (x) => {
        // Near a zero crossing the unit is that of the argument's own rounding.
        const slack = Math.abs(x) * Number.EPSILON
        expect(units(sin(x), Math.sin(x), slack)).toBeLessThan(4)
        expect(units(cos(x), Math.cos(x), slack)).toBeLessThan(4)
      }),
      settings,
    )
  })

  test('angle of a point in every quadrant', () => {
    fc.assert(
      fc.property(double(-1e4, 1e4), double(-1e4, 1e4), (y, x) => {
        fc.pre(x !== 0 || y !== 0)
        const figure = y === 0 && x < 0 ? Math.PI : Math.atan2(y, x)
        expect(units(atan2(y, x), figure, 1e-300)).toBeLessThan(4)
      }),
      settings,
    )
  })

  test('exponential and logarithm', () => {
    fc.assert(
      fc.property(double(-600, 600), (x) => {
        expect(units(exp(x), Math.exp(x))).toBeLessThan(4)
      }),
      settings,
    )
    fc.assert(
      fc.property(double(1e-12, 1e12), (x) => {
        expect(units(log(x), Math.log(x), 1e-3)).toBeLessThan(4)
      }),
      settings,
    )
  })

  test('power of a positive number, to a part in ten million millions', () => {
    fc.assert(
      fc.property(double(1e-4, 1e4), double(-8, 8), (x, y) => {
        expect(Math.abs(power(x, y) / x ** y - 1)).toBeLessThan(1e-13)
      }),
      settings,
    )
  })

  test('length of a vector', () => {
    fc.assert(
      fc.property(double(-1e6, 1e6), double(-1e6, 1e6), double(-1e6, 1e6), (x, y, z) => {
        expect(units(hypot(x, y, z), Math.hypot(x, y, z), 1e-100)).toBeLessThan(4)
      }),
      settings,
    )
  })
})

describe('exactly', () => {
  test('sine is odd and cosine even, so that tacks can mirror', () => {
    fc.assert(
      fc.property(double(-6300, 6300), (x) => {
        expect(sin(-x) === -sin(x)).toBe(true)
        expect(cos(-x) === cos(x)).toBe(true)
      }),
      settings,
    )
  })

  test('the ends', () => {
    expect(exp(0)).toBe(1)
    expect(log(1)).toBe(0)
    expect(sin(0)).toBe(0)
    expect(cos(0)).toBe(1)
    expect(atan2(0, 0)).toBe(0)
    expect(log(-1)).toBeNaN()
    expect(sin(Number.NaN)).toBeNaN()
    expect(sin(1e9)).toBeNaN()
    expect(exp(1000)).toBe(Number.POSITIVE_INFINITY)
    expect(exp(-1000)).toBe(0)
  })

  test('within the last place of known constants', () => {
    // Decimal expansions from mathematical tables.
    const known: [number, number][] = [
      [sin(1), 0.8414709848078965],
      [cos(1), 0.5403023058681398],
      [sin(Math.PI / 6), 0.5],
      [atan2(1, 1), Math.PI / 4],
      [exp(1), Math.E],
      [log(10), Math.LN10],
      [log(2), Math.LN2],
      [power(2, 0.5), Math.SQRT2],
    ]
    for (const [value, figure] of known) expect(units(value, figure)).toBeLessThanOrEqual(2)
  })
})
