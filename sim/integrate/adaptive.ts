import { Outcome, Solver } from 'odex'
import type { Derivative } from './runge-kutta'

/** Raised when the adaptive solver cannot reach the end of an interval within its step limit. */
export class StepLimitError extends Error {
  constructor(readonly atS: number) {
    super(`the adaptive solver needed too many steps at ${atS.toFixed(2)} s`)
  }
}

/**
 * Extrapolation with step and order control, for reference runs.
 *
 * @param tolerance relative and absolute, on every component of the state (SI)
 * @returns a function that advances y in place from one time to another
 * @source odex, Hairer, Norsett & Wanner, Solving Ordinary Differential Equations I, section II.9
 */
export function adaptive(
  size: number,
  derivative: Derivative,
  tolerance: number,
): (from: number, to: number, y: Float64Array) => void {
  const state = new Float64Array(size)
  const rate = new Float64Array(size)
  const solver = new Solver(size)
  solver.absoluteTolerance = tolerance
  solver.relativeTolerance = tolerance
  const right = (t: number, y: number[]): number[] => {
    state.set(y)
    derivative(t, state, rate)
    return Array.from(rate)
  }
  return (from, to, y) => {
    solver.initialStepSize = (to - from) / 4
    const solution = solver.solve(right, from, Array.from(y), to)
    if (solution.outcome !== Outcome.Converged) throw new StepLimitError(from)
    y.set(solution.y)
  }
}
