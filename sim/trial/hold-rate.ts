import { runHolds } from './run'
import type { TrialRequest } from './types'

/** Runs that held, of how many. */
export interface HoldRate {
  held: number
  of: number
  /** 95 % interval of the true rate. */
  interval: [number, number]
}

/**
 * Wilson's interval for a share of `held` in `of` tries at 95 %.
 *
 * @source Wilson 1927, Journal of the American Statistical Association 22
 */
export function wilsonInterval(held: number, of: number): [number, number] {
  if (of === 0) return [0, 1]
  const z = 1.959963984540054
  const p = held / of
  const scale = 1 + (z * z) / of
  const centre = (p + (z * z) / (2 * of)) / scale
  const half = (z / scale) * Math.sqrt((p * (1 - p)) / of + (z * z) / (4 * of * of))
  return [Math.max(0, centre - half), Math.min(1, centre + half)]
}

/**
 * How many of `seeds` runs hold, with seeds following on from the request's own.
 *
 * @param onRun told after each run
 */
export function holdRate(
  request: TrialRequest,
  seeds: number,
  onRun?: (held: number, of: number) => void,
): HoldRate {
  let held = 0
  for (let i = 0; i < seeds; i++) {
    const conditions = { ...request.conditions, seed: request.conditions.seed + i }
    if (runHolds({ ...request, conditions }).holds) held++
    onRun?.(held, i + 1)
  }
  return { held, of: seeds, interval: wilsonInterval(held, seeds) }
}
