import { cos, sin } from '../elementary'
import type { Helm } from '../plan/types'
import { type Environment, waveGain, windAcross, windAlong, windFrom } from './environment'
import { createLineSolver } from './line-pull'
import { createSailLoads } from './sail-loads'
import { BOOM, EAST, HEADING, HEEL, NORTH, ROLL_RATE, SURGE, SWAY, YAW_RATE } from './state'
import { createTiller } from './tiller'
import type { Vessel } from './vessel'
import { createWaterLoads } from './water-loads'
import { createWaveLoads } from './wave-loads'

/** What the last call of the derivative found on its way; SI. */
export interface Observation {
  lineTension: number
  elasticTension: number
  sheetTension: number
  hitchOut: number
  elasticExtension: number
  apparentAngle: number
  apparentSpeed: number
  windNorth: number
  windEast: number
  surface: number
  /** Rudder moment about the stock, N m, positive when it turns the tiller to starboard. */
  rudderMoment: number
  /** Per sail: 0 flogging, 1 drawing. */
  drawing: Float64Array
  /** Per sail: sheet tension per part, N. */
  sheet: Float64Array
}

export interface System {
  size: number
  /** Writes the time derivative of y at t into dy. Allocates nothing. */
  derivative(t: number, y: Float64Array, dy: Float64Array): void
  observed: Observation
}

/**
 * Assembles the phenomena into one derivative.
 *
 * Four degrees of freedom (surge, sway, roll, yaw) with the rudder, a lag per boom and three friction states;
 * the equations of motion are those of a rigid body with added mass about the centre of gravity.
 *
 * @param helm 'lashed' keeps the rudder where it is, 'free' leaves the tiller without line and elastic
 * @source Fossen, Handbook of Marine Craft Hydrodynamics and Motion Control, 4-DOF manoeuvring model
 */
export function createSystem(vessel: Vessel, environment: Environment, helm: Helm): System {
  const pull = helm === 'sheet-to-tiller' ? createLineSolver(vessel.line) : undefined
  const waves = createWaveLoads(environment.sea, vessel)
  const sails = createSailLoads(vessel, environment.events, pull)
  const water = createWaterLoads(vessel, waves)
  const tiller = createTiller(vessel, pull, helm === 'lashed')
  const observed: Observation = {
    lineTension: 0,
    elasticTension: 0,
    sheetTension: 0,
    hitchOut: 0,
    elasticExtension: 0,
    apparentAngle: 0,
    apparentSpeed: 0,
    windNorth: 0,
    windEast: 0,
    surface: 0,
    rudderMoment: 0,
    drawing: sails.drawing,
    sheet: sails.sheet,
  }

  function derivative(t: number, y: Float64Array, dy: Float64Array): void {
    const psi = y[HEADING] as number
    const u = y[SURGE] as number
    const v = y[SWAY] as number
    const r = y[YAW_RATE] as number
    const cosPsi = cos(psi)
    const sinPsi = sin(psi)

    // Wind over the water, then in the body frame.
    const along = windAlong(environment, t)
    const across = windAcross(environment, t)
    const from = windFrom(environment, t)
    const cosFrom = cos(from)
    const sinFrom = sin(from)
    const windNorth = -along * cosFrom + across * sinFrom
    const windEast = -along * sinFrom - across * cosFrom
    const windX = windNorth * cosPsi + windEast * sinPsi
    const windY = -windNorth * sinPsi + windEast * cosPsi

    waves.update(y[NORTH] as number, y[EAST] as number, cosPsi, sinPsi, t, waveGain(environment, t))
    sails.update(t, y, dy, windX, windY)
    water.update(y)
    tiller.update(y, dy, water.stock, sails.sourceTension)

    const X = waves.surge + sails.surge + water.surge
    const Y = waves.sway + sails.sway + water.sway
    const N = waves.yaw + sails.yaw + water.yaw
    const K = sails.roll + water.roll
    dy[NORTH] = u * cosPsi - v * sinPsi
    dy[EAST] = u * sinPsi + v * cosPsi
    dy[HEADING] = r
    dy[HEEL] = y[ROLL_RATE] as number
    dy[SURGE] = (X + vessel.swayMass * v * r) / vessel.surgeMass
    dy[SWAY] = (Y - vessel.surgeMass * u * r) / vessel.swayMass
    dy[ROLL_RATE] = K / vessel.rollInertia
    dy[YAW_RATE] = N / vessel.yawInertia

    observed.lineTension = tiller.lineTension
    observed.elasticTension = tiller.elasticTension
    observed.hitchOut = tiller.hitchOut
    observed.elasticExtension = tiller.elasticExtension
    observed.sheetTension = sails.sourceTension
    observed.apparentAngle = sails.apparentAngle
    observed.apparentSpeed = sails.apparentSpeed
    observed.rudderMoment = water.stock
    observed.windNorth = windNorth
    observed.windEast = windEast
    observed.surface = waves.surface
  }

  return { size: BOOM + vessel.sails.length, derivative, observed }
}
