import { environmentOf } from '../boat/environment'
import { BOOM, HEADING, HEEL, ROLL_RATE, RUDDER, SURGE, SWAY, YAW_RATE } from '../boat/state'
import { createSystem, type System } from '../boat/system'
import { type Vessel, vesselOf } from '../boat/vessel'
import { DEGREE, KNOT } from '../constants'
import { atan2, hypot } from '../elementary'
import { rungeKutta } from '../integrate/runge-kutta'
import { clamp } from '../numbers'
import type { Conditions, Plan } from '../plan/types'

/** Steady state with the helm as unknown. */
export interface Balance {
  /** Whether a steady state was found with the rudder inside its stops. */
  found: boolean
  state: Float64Array
  speedKn: number
  heelDeg: number
  leewayDeg: number
  /** Tiller positive to starboard. */
  tillerDeg: number
  /** Moment of the water on the rudder, N m, positive when it turns the tiller to starboard. */
  rudderMoment: number
  sheetTension: number
  /** Largest acceleration left, SI. */
  residual: number
}

const MARCH_TIME = 90
const MARCH_STEP = 0.05
const NEWTON_STEPS = 25
const TOLERANCE = 1e-9
/** Change of each unknown for the slopes, SI. */
const NUDGE = 1e-6

/**
 * Balance of a plan at its conditions' mean wind and asked course: calm water, steady wind, no control line or elastic
 * at work. A steered march in time comes close, Newton's method finishes.
 */
export function balanceOf(plan: Plan): Balance {
  const conditions: Conditions = {
    ...plan.setup.conditions,
    turbulenceIntensity: 0,
    significantWaveHeightM: 0,
  }
  const vessel = vesselOf(plan)
  const environment = environmentOf(conditions, [], 1, vessel.tack)
  const system = createSystem(vessel, environment, 'lashed')
  const heading = -conditions.trueWindAngleDeg * DEGREE
  const y = new Float64Array(system.size)
  y[HEADING] = heading
  y[SURGE] = Math.min(0.4 * environment.meanWind, 1.5 * Math.sqrt(vessel.length))
  vessel.sails.forEach((sail, i) => {
    y[BOOM + i] = sail.heldAt
  })
  const start = Float64Array.from(y)
  march(system, vessel, y, heading)
  // A boat beyond the model's reach has no balance; she starts as she was put into the water.
  if (!y.every(Number.isFinite)) y.set(start)
  const residual = polish(system, y, heading)
  const dy = new Float64Array(system.size)
  system.derivative(0, y, dy)
  const u = y[SURGE] as number
  const rudder = y[RUDDER] as number
  return {
    found: residual < 1e-6 && Math.abs(rudder) < vessel.rudder.stop,
    state: y,
    speedKn: hypot(u, y[SWAY] as number) / KNOT,
    heelDeg: (y[HEEL] as number) / DEGREE,
    leewayDeg: atan2(y[SWAY] as number, u) / DEGREE,
    tillerDeg: -rudder / DEGREE,
    rudderMoment: system.observed.rudderMoment,
    sheetTension: system.observed.sheetTension,
    residual,
  }
}

/** Steers the boat along the heading until she settles. */
function march(system: System, vessel: Vessel, y: Float64Array, heading: number): void {
  const step = rungeKutta(system.size, system.derivative)
  let helm = 0
  const steps = Math.round(MARCH_TIME / MARCH_STEP)
  for (let i = 0; i < steps; i++) {
    const error = heading - (y[HEADING] as number)
    helm = clamp(helm + 0.15 * error * MARCH_STEP, -vessel.rudder.stop, vessel.rudder.stop)
    const asked = helm + 1.2 * error - 1.5 * (y[YAW_RATE] as number)
    y[RUDDER] = clamp(asked, -vessel.rudder.stop, vessel.rudder.stop)
    step(i * MARCH_STEP, y, MARCH_STEP)
  }
  y[RUDDER] = helm
}

/** Newton's method on surge, sway, heel, rudder and booms; returns the largest acceleration left. */
function polish(system: System, y: Float64Array, heading: number): number {
  const unknowns = [SURGE, SWAY, HEEL, RUDDER]
  const equations = [SURGE, SWAY, ROLL_RATE, YAW_RATE]
  for (let i = BOOM; i < system.size; i++) {
    unknowns.push(i)
    equations.push(i)
  }
  const n = unknowns.length
  const dy = new Float64Array(system.size)
  const shifted = new Float64Array(system.size)
  const matrix = new Float64Array(n * n)
  const right = new Float64Array(n)
  const best = Float64Array.from(y)
  let bestResidual = Number.POSITIVE_INFINITY
  y[HEADING] = heading
  y[ROLL_RATE] = 0
  y[YAW_RATE] = 0
  for (let iteration = 0; iteration < NEWTON_STEPS; iteration++) {
    system.derivative(0, y, dy)
    let residual = 0
    for (let i = 0; i < n; i++) {
      right[i] = -(dy[equations[i] as number] as number)
      residual = Math.max(residual, Math.abs(right[i] as number))
    }
    if (residual < bestResidual) {
      bestResidual = residual
      best.set(y)
    }
    if (!(residual > TOLERANCE)) break
    for (let j = 0; j < n; j++) {
      const place = unknowns[j] as number
      // Differences to both sides, so that port and starboard take the same steps.
      shifted.set(y)
      shifted[place] = (y[place] as number) + NUDGE
      system.derivative(0, shifted, dy)
      for (let i = 0; i < n; i++) matrix[i * n + j] = dy[equations[i] as number] as number
      shifted[place] = (y[place] as number) - NUDGE
      system.derivative(0, shifted, dy)
      for (let i = 0; i < n; i++) {
        const rise = (matrix[i * n + j] as number) - (dy[equations[i] as number] as number)
        matrix[i * n + j] = rise / (2 * NUDGE)
      }
    }
    if (!solve(matrix, right, n)) break
    let largest = 0
    for (let i = 0; i < n; i++) largest = Math.max(largest, Math.abs(right[i] as number))
    const damp = largest > 0.2 ? 0.2 / largest : 1
    for (let i = 0; i < n; i++) {
      const place = unknowns[i] as number
      y[place] = (y[place] as number) + damp * (right[i] as number)
    }
  }
  y.set(best)
  return bestResidual
}

/** Gaussian elimination with row exchange in place; false for a singular matrix. */
function solve(a: Float64Array, b: Float64Array, n: number): boolean {
  for (let k = 0; k < n; k++) {
    let pivot = k
    for (let i = k + 1; i < n; i++) {
      if (Math.abs(a[i * n + k] as number) > Math.abs(a[pivot * n + k] as number)) pivot = i
    }
    const head = a[pivot * n + k] as number
    if (!(Math.abs(head) > 1e-14)) return false
    if (pivot !== k) {
      for (let j = 0; j < n; j++) {
        const held = a[k * n + j] as number
        a[k * n + j] = a[pivot * n + j] as number
        a[pivot * n + j] = held
      }
      const held = b[k] as number
      b[k] = b[pivot] as number
      b[pivot] = held
    }
    for (let i = k + 1; i < n; i++) {
      const factor = (a[i * n + k] as number) / head
      for (let j = k; j < n; j++)
        a[i * n + j] = (a[i * n + j] as number) - factor * (a[k * n + j] as number)
      b[i] = (b[i] as number) - factor * (b[k] as number)
    }
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = b[i] as number
    for (let j = i + 1; j < n; j++) sum -= (a[i * n + j] as number) * (b[j] as number)
    b[i] = sum / (a[i * n + i] as number)
  }
  return true
}
