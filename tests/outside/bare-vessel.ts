/** A boat stripped of everything that pushes her, to which a check gives back one thing. */
import { type Environment, environmentOf } from 'sim/boat/environment'
import { ROLL_RATE, SURGE, SWAY, YAW_RATE } from 'sim/boat/state'
import { createSystem, type Observation } from 'sim/boat/system'
import { type Vessel, vesselOf } from 'sim/boat/vessel'
import type { Plan } from 'sim/plan/types'
import { boatCalled, calm, planWith } from '../demo-plans'

export const plainPlan: Plan = planWith(boatCalled('long-keel-28'), {
  trim: { main: { sheetAngleDeg: 20 } },
  conditions: { ...calm, trueWindSpeedKn: 20, trueWindAngleDeg: 90 },
})

export function bareVessel(given: Partial<Vessel> = {}, plan = plainPlan): Vessel {
  const vessel = vesselOf(plan)
  return {
    ...vessel,
    munkMass: 0,
    gm: 0,
    rollDamping: 0,
    draught: 0,
    resistance: vessel.resistance.map(() => 0),
    heelYawLever: 0,
    keel: { ...vessel.keel, area: 0, turnDamping: 0 },
    rudder: { ...vessel.rudder, area: 0, skegArea: 0, friction: 0 },
    windageAhead: 0,
    windageAbeam: 0,
    sails: [],
    source: -1,
    ...given,
  }
}

export interface Forces {
  /** Forward, to starboard, N; heeling to starboard, turning to starboard, N m. */
  X: number
  Y: number
  K: number
  N: number
  observed: Observation
}

/** What pushes a vessel in a state given by its places; inertia of turning and drifting together left out. */
export function forcesOn(
  vessel: Vessel,
  places: Readonly<Record<number, number>>,
  environment: Environment = environmentOf(plainPlan.setup.conditions, [], 1, 1),
): Forces {
  const system = createSystem(vessel, environment, 'lashed')
  const y = new Float64Array(system.size)
  for (const [place, value] of Object.entries(places)) y[Number(place)] = value
  const dy = new Float64Array(system.size)
  system.derivative(0, y, dy)
  const [u, v, r] = [y[SURGE], y[SWAY], y[YAW_RATE]] as [number, number, number]
  return {
    X: (dy[SURGE] as number) * vessel.surgeMass - vessel.swayMass * v * r,
    Y: (dy[SWAY] as number) * vessel.swayMass + vessel.surgeMass * u * r,
    K: (dy[ROLL_RATE] as number) * vessel.rollInertia,
    N: (dy[YAW_RATE] as number) * vessel.yawInertia,
    observed: system.observed,
  }
}
