import { type Problem, problemsOf } from 'sim/plan/problems'
import type { Plan } from 'sim/plan/types'
import type { TrialRequest } from 'sim/trial/types'
import { changedPlan } from './address'
import type { TrialState } from './state'

/** Fine enough to draw the roll in a short sea smoothly. */
const OUTPUT_INTERVAL_S = 0.5

/** The part of a state that determines the run. */
type Asked = Omit<TrialState, 'setupId' | 'ghosts'>

/** What a state asks of the model. */
export function requestOf(state: Asked, kept: Plan): TrialRequest {
  const plan = changedPlan(kept, state.changes)
  return {
    plan,
    conditions: plan.setup.conditions,
    events: [...state.events],
    helm: state.helm,
    solver: state.solver,
    durationS: state.durationS,
    outputIntervalS: OUTPUT_INTERVAL_S,
  }
}

/** What forbids running a request as it is set; empty when it can be run. */
export function refusalsOf({ plan }: TrialRequest): Problem[] {
  return problemsOf(plan)
}
