/** The package ships sources that strict checking refuses; this declares what is used of it. */

/** Called after each accepted step; `dense(i, x)` interpolates component i in it; `false` stops. */
export type OutputFunction = (
  step: number,
  xOld: number,
  x: number,
  y: number[],
  dense: (component: number, x: number) => number,
) => boolean | undefined

export declare enum Outcome {
  Converged = 0,
  MaxStepsExceeded = 1,
  EarlyReturn = 2,
}

export interface Solution {
  y: number[]
  outcome: Outcome
  nStep: number
  xEnd: number
  nAccept: number
  nReject: number
  nEval: number
}

export declare class Solver {
  constructor(dimension: number)
  absoluteTolerance: number | number[]
  relativeTolerance: number | number[]
  initialStepSize: number
  maxStepSize: number
  maxSteps: number
  denseOutput: boolean
  solve(
    derivative: (x: number, y: number[]) => number[],
    x0: number,
    y0: number[],
    xEnd: number,
    output?: OutputFunction,
  ): Solution
}
