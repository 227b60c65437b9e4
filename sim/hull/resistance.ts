import { GRAVITY, NU_SEA, RHO_SEA } from '../constants'
import { log } from '../elementary'

/** ITTC-57 friction line CF = .075/(log10 Re - 2)^2, with Re not below 1e5; Tupper, Introduction to Naval Architecture. */
export function frictionCoefficient(reynolds: number): number {
  const decades = log(Math.max(reynolds, 1e5)) / Math.LN10 - 2
  return 0.075 / (decades * decades)
}

/**
 * Residuary resistance over displacement weight, x 1000, mean of the 22 hulls of the first Delft series
 * (Gerritsma, Onnink & Versluis 1981; the form between the published means follows the published single hull);
 * above Fn .45 a steep wall, extrapolated.
 */
const FROUDE = [
  0, 0.1, 0.125, 0.15, 0.175, 0.2, 0.225, 0.25, 0.275, 0.3, 0.325, 0.35, 0.375, 0.4, 0.425, 0.45,
  0.475, 0.5, 0.55, 0.6, 0.7, 0.9,
]
const RESIDUARY = [
  0, 0.05, 0.115, 0.275, 0.475, 0.791, 1.2, 1.855, 2.665, 3.847, 5.38, 8.12, 13.3, 22.018, 35.1,
  52.112, 72, 90, 118, 138, 165, 210,
]
/** Where the table ends; faster than that the last value holds. */
export const HIGHEST_FROUDE = 0.9

/** Residuary resistance per unit weight of an average hull at a Froude number on the waterline length. */
export function residuaryPerWeight(froude: number): number {
  const fn = Math.min(Math.abs(froude), HIGHEST_FROUDE)
  let i = 1
  while (i < FROUDE.length - 1 && fn > (FROUDE[i] as number)) i++
  return 1e-3 * monotoneCubic(i, fn)
}

/** Cubic through the table that never overshoots it (Fritsch & Carlson 1980, harmonic-mean slopes). */
function monotoneCubic(i: number, x: number): number {
  const x0 = FROUDE[i - 1] as number
  const x1 = FROUDE[i] as number
  const h = x1 - x0
  const s = (x - x0) / h
  const y0 = RESIDUARY[i - 1] as number
  const y1 = RESIDUARY[i] as number
  const m0 = slopeAt(i - 1) * h
  const m1 = slopeAt(i) * h
  const d = y1 - y0
  return y0 + s * (m0 + s * (3 * d - 2 * m0 - m1 + s * (m0 + m1 - 2 * d)))
}

function slopeAt(i: number): number {
  if (i === 0) return 0
  const before = secant(i)
  if (i === FROUDE.length - 1) return before
  const after = secant(i + 1)
  return before * after > 0 ? (2 * before * after) / (before + after) : 0
}

function secant(i: number): number {
  const rise = (RESIDUARY[i] as number) - (RESIDUARY[i - 1] as number)
  return rise / ((FROUDE[i] as number) - (FROUDE[i - 1] as number))
}

/**
 * Upright resistance of the canoe body, N.
 *
 * @param speed m/s
 * @param length waterline, m
 * @param wetted area, m^2
 * @param mass kg
 * @param factor residuary resistance against the series mean
 */
export function hullResistance(
  speed: number,
  length: number,
  wetted: number,
  mass: number,
  factor: number,
): number {
  // Reynolds number on .7 of the waterline length, as usual for yachts.
  const friction = frictionCoefficient((speed * 0.7 * length) / NU_SEA)
  const froude = speed / Math.sqrt(GRAVITY * length)
  return (
    0.5 * RHO_SEA * speed * speed * wetted * friction +
    factor * residuaryPerWeight(froude) * mass * GRAVITY
  )
}
