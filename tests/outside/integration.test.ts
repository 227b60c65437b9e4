import { adaptive } from 'sim/integrate/adaptive'
import { type Derivative, rungeKutta } from 'sim/integrate/runge-kutta'
import { describe, expect, test } from 'vitest'

/** The two integrators of the model, brought to one form. */
function fixed(
  derivative: Derivative,
  from: Float64Array,
  to: number,
  steps: number,
): Float64Array {
  const y = Float64Array.from(from)
  const step = rungeKutta(y.length, derivative)
  const h = to / steps
  for (let i = 0; i < steps; i++) step(i * h, y, h)
  return y
}
function controlled(derivative: Derivative, from: Float64Array, to: number): Float64Array {
  const y = Float64Array.from(from)
  adaptive(y.length, derivative, 1e-11)(0, to, y)
  return y
}

const at = (y: Float64Array, i: number) => y[i] as number

/** Three bodies, the third without mass; Hairer, Norsett & Wanner I, section II.0 (read), digits as far as they can be held. */
const arenstorf: Derivative = (_, y, dy) => {
  const mu = 0.012277471
  const rest = 1 - mu
  const [x, z, vx, vz] = [at(y, 0), at(y, 1), at(y, 2), at(y, 3)]
  const d1 = ((x + mu) ** 2 + z * z) ** 1.5
  const d2 = ((x - rest) ** 2 + z * z) ** 1.5
  dy[0] = vx
  dy[1] = vz
  dy[2] = x + 2 * vz - (rest * (x + mu)) / d1 - (mu * (x - rest)) / d2
  dy[3] = z - 2 * vx - (rest * z) / d1 - (mu * z) / d2
}
const arenstorfStart = Float64Array.of(0.994, 0, 0, -2.0015851063790824)
const ARENSTORF_PERIOD = 17.065216560157964

const rigidBody: Derivative = (_, y, dy) => {
  dy[0] = at(y, 1) * at(y, 2)
  dy[1] = -at(y, 0) * at(y, 2)
  dy[2] = -0.51 * at(y, 0) * at(y, 1)
}
const kepler: Derivative = (_, y, dy) => {
  const r = Math.hypot(at(y, 0), at(y, 1)) ** 3
  dy[0] = at(y, 2)
  dy[1] = at(y, 3)
  dy[2] = -at(y, 0) / r
  dy[3] = -at(y, 1) / r
}
const keplerStart = Float64Array.of(0.4, 0, 0, 2)
/** Natural period 3 s, damping .1 of critical. */
const oscillator: Derivative = (_, y, dy) => {
  const w = (2 * Math.PI) / 3
  dy[0] = at(y, 1)
  dy[1] = -2 * 0.1 * w * at(y, 1) - w * w * at(y, 0)
}

describe('both integrators', () => {
  const ways = [
    ['fixed step', (f: Derivative, y: Float64Array, to: number) => fixed(f, y, to, 40_000)],
    ['adaptive', controlled],
  ] as const

  test.each(ways)('%s: rigid body without forces, k^2 .51, at 12', (_, run) => {
    const y = run(rigidBody, Float64Array.of(0, 1, 1), 12)
    expect(at(y, 0)).toBeCloseTo(-0.70539781, 7)
    expect(at(y, 1)).toBeCloseTo(-0.70881163, 7)
    expect(at(y, 2)).toBeCloseTo(0.86384669, 7)
  })

  test.each(ways)('%s: Kepler orbit of eccentricity .6 at 20', (_, run) => {
    const y = run(kepler, keplerStart, 20)
    expect(at(y, 0)).toBeCloseTo(-0.770075578, 7)
    expect(at(y, 1)).toBeCloseTo(0.788344817, 7)
  })

  test.each(ways)('%s: damped oscillator', (_, run) => {
    for (const [t, x] of [
      [1, -0.327107519],
      [3, 0.531535124],
      [10, -0.038750037],
    ] as const) {
      expect(at(run(oscillator, Float64Array.of(1, 0), t), 0)).toBeCloseTo(x, 8)
    }
  })

  test.each(ways)('%s: pendulum at large swings', (_, run) => {
    // Period over that of small swings (computed from the elliptic integral).
    for (const [degrees, ratio] of [
      [30, 1.017409],
      [60, 1.073182],
      [90, 1.180341],
    ] as const) {
      const start = (degrees * Math.PI) / 180
      const swing: Derivative = (_, y, dy) => {
        dy[0] = at(y, 1)
        dy[1] = -Math.sin(at(y, 0))
      }
      const quarter = run(swing, Float64Array.of(start, 0), (Math.PI / 2) * ratio)
      expect(at(quarter, 0)).toBeCloseTo(0, 5)
    }
  })
})

describe('Arenstorf orbit closes after its period', () => {
  test('adaptive', () => {
    const y = controlled(arenstorf, arenstorfStart, ARENSTORF_PERIOD)
    expect(at(y, 0)).toBeCloseTo(0.994, 5)
    expect(at(y, 1)).toBeCloseTo(0, 5)
  })

  test('fixed step, closer by about sixteen for every halving', () => {
    const miss = (steps: number) => {
      const y = fixed(arenstorf, arenstorfStart, ARENSTORF_PERIOD, steps)
      return Math.hypot(at(y, 0) - 0.994, at(y, 1))
    }
    const coarse = miss(200_000)
    const fine = miss(400_000)
    expect(fine).toBeLessThan(1e-3)
    expect(Math.log2(coarse / fine)).toBeGreaterThan(3.7)
  })
})

test('the fixed step has order four', () => {
  const exact = -0.327107518925
  const error = (steps: number) =>
    Math.abs(at(fixed(oscillator, Float64Array.of(1, 0), 1, steps), 0) - exact)
  for (const steps of [10, 20, 40]) {
    const order = Math.log2(error(steps) / error(2 * steps))
    expect(order).toBeGreaterThan(3.8)
    expect(order).toBeLessThan(4.3)
  }
})
