import type { Helm, Plan } from 'sim/plan/types'
import { holdRate } from 'sim/trial/hold-rate'

/** In how many of the seeds from 1 on a plan holds in its own conditions, ten minutes each. */
export function heldOf(plan: Plan, helm: Helm, seeds: number): number {
  const { held } = holdRate(
    {
      plan,
      conditions: { ...plan.setup.conditions, seed: 1 },
      events: [],
      helm,
      solver: 'fixed-step',
      durationS: 600,
      outputIntervalS: 1,
    },
    seeds,
  )
  return held
}
