/** A demo boat set going without the judging of a run, to look at single moments. */
import { balanceOf } from 'sim/analysis/balance'
import { type Environment, environmentOf } from 'sim/boat/environment'
import { HEADING } from 'sim/boat/state'
import { createSystem, type System } from 'sim/boat/system'
import { type Vessel, vesselOf } from 'sim/boat/vessel'
import { DEGREE } from 'sim/constants'
import { rungeKutta } from 'sim/integrate/runge-kutta'
import type { Helm, Plan } from 'sim/plan/types'

export interface Afloat {
  vessel: Vessel
  system: System
  /** State, which `sail` moves on. */
  y: Float64Array
  /** Sails on for a time, s. */
  sail(seconds: number): void
  /** Course to the mean wind, degrees on the tack sailed. */
  course(): number
}

const STEP = 0.0125

/** Starts in balance, in the conditions' mean wind and sea. */
export function afloat(
  plan: Plan,
  helm: Helm,
  change: { vessel?: Partial<Vessel>; environment?: Environment } = {},
): Afloat {
  const vessel = { ...vesselOf(plan), ...change.vessel }
  const environment =
    change.environment ?? environmentOf(plan.setup.conditions, [], 600, vessel.tack)
  const system = createSystem(vessel, environment, helm)
  const y = Float64Array.from(balanceOf(plan).state)
  const step = rungeKutta(system.size, system.derivative)
  let t = 0
  return {
    vessel,
    system,
    y,
    sail(seconds) {
      const steps = Math.round(seconds / STEP)
      for (let i = 0; i < steps; i++) step(t + i * STEP, y, STEP)
      t += steps * STEP
    },
    course: () => (-vessel.tack * (y[HEADING] as number)) / DEGREE,
  }
}
