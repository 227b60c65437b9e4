import { GRAVITY, RHO_AIR, RHO_SEA } from '../constants'
import { foilDrag, foilLift } from '../foils/section'
import { wrapAngle } from '../numbers'
import type { Helm } from '../plan/types'
import { boomTarget } from '../sails/boom'
import { fullness, sailCentre, sailDrag, sailLift } from '../sails/coefficients'
import { elasticPull } from '../steering/elastic'
import { frictionRate } from '../steering/friction'
import { stockMoment } from '../steering/stock'
import { shiftShape } from '../wind/gust'
import { type Environment, waveGain, windAcross, windAlong, windFrom } from './environment'
import { createLineSolver } from './line-pull'
import {
  BEARING_FRICTION,
  BOOM,
  EAST,
  ELASTIC_FRICTION,
  HEADING,
  HEEL,
  LINE_FRICTION,
  NORTH,
  ROLL_RATE,
  RUDDER,
  RUDDER_RATE,
  SURGE,
  SWAY,
  YAW_RATE,
} from './state'
import { effortHeight, reefedArea, type Vessel } from './vessel'
import { createWaveLoads } from './wave-loads'

/** Lag of a boom behind where the wind carries it, s. */
const BOOM_LAG = 0.35
/** Cross-flow drag of the canoe body's sections; Hoerner, bluff sections, from memory. */
const CROSS_FLOW_DRAG = 0.7
const CROSS_FLOW_STATIONS = 7
/** Way over which bearings, leads and cord turn from one direction of friction to the other. */
const BEARING_WAY = 0.02
const LINE_WAY = 0.006
const ELASTIC_WAY = 0.01
/** Time a crew needs to take in a reef, s. */
const REEFING_TIME = 25
/** Damping of the tiller's stop over critical. */
const STOP_DAMPING = 0.5
/** Natural frequency of the tiller against its stop, rad/s. */
const STOP_FREQUENCY = 22

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
  const { sails, keel, rudder, line } = vessel
  const { elastic } = line
  const count = sails.length
  const size = BOOM + count
  const rigged = helm === 'sheet-to-tiller'
  const lashed = helm === 'lashed'
  const waves = createWaveLoads(environment.sea, vessel)
  const pull = createLineSolver(line)
  const reefs = environment.events.filter((event) => event.kind === 'reef')
  const area = Float64Array.from(sails, (sail) => sail.area)
  const height = Float64Array.from(sails, (sail) => sail.effortHeight)
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
    drawing: new Float64Array(count),
    sheet: new Float64Array(count),
  }
  const mainIndex = sails.findIndex((sail) => sail.kind === 'main')
  const topSpeed = (vessel.resistance.length - 2) * vessel.speedStep
  const stationLength = vessel.length / CROSS_FLOW_STATIONS
  const stopStiffness = rudder.inertia * STOP_FREQUENCY * STOP_FREQUENCY
  const stopDamping = 2 * STOP_DAMPING * rudder.inertia * STOP_FREQUENCY

  function applyReefs(t: number): void {
    for (let i = 0; i < reefs.length; i++) {
      const event = reefs[i]
      if (event?.kind !== 'reef') continue
      for (let k = 0; k < count; k++) {
        const sail = sails[k]
        if (sail?.id !== event.sail) continue
        const percent = event.percent * shiftShape(t - event.atS, REEFING_TIME)
        area[k] = reefedArea(sail.area, percent)
        const luffNow = (sail.effortHeight - sail.footZ) / effortHeight(0, 1, 0)
        height[k] = effortHeight(sail.footZ, luffNow, percent)
      }
    }
  }

  function derivative(t: number, y: Float64Array, dy: Float64Array): void {
    const psi = y[HEADING] as number
    const phi = y[HEEL] as number
    const u = y[SURGE] as number
    const v = y[SWAY] as number
    const p = y[ROLL_RATE] as number
    const r = y[YAW_RATE] as number
    const delta = y[RUDDER] as number
    const deltaRate = y[RUDDER_RATE] as number
    const cosPsi = Math.cos(psi)
    const sinPsi = Math.sin(psi)
    const cosPhi = Math.cos(phi)
    const sinPhi = Math.sin(phi)
    if (reefs.length > 0) applyReefs(t)

    // Wind over the water, then in the body frame.
    const along = windAlong(environment, t)
    const across = windAcross(environment, t)
    const from = windFrom(environment, t)
    const cosFrom = Math.cos(from)
    const sinFrom = Math.sin(from)
    const windNorth = -along * cosFrom + across * sinFrom
    const windEast = -along * sinFrom - across * cosFrom
    const windX = windNorth * cosPsi + windEast * sinPsi
    const windY = -windNorth * sinPsi + windEast * cosPsi

    waves.update(y[NORTH] as number, y[EAST] as number, cosPsi, sinPsi, t, waveGain(environment, t))

    let X = waves.surge
    let Y = waves.sway
    let N = waves.yaw
    let K = 0

    // Sails, each at its own height, chord and boom angle.
    let mainBlanket = 0
    if (mainIndex >= 0) {
      const out = Math.abs(wrapAngle(Math.atan2(-(windY - v), -(windX - u))))
      mainBlanket = out > 2.3 ? Math.min((out - 2.3) / 0.6, 1) : 0
    }
    let sourceTension = 0
    for (let k = 0; k < count; k++) {
      const sail = sails[k] as (typeof sails)[number]
      const boom = y[BOOM + k] as number
      const h = height[k] as number
      const ax = windX * sail.profile - u
      const ay = (windY * sail.profile - v - r * sail.luffFromCentre - p * h) * cosPhi
      const speed = Math.sqrt(ax * ax + ay * ay)
      const angle = Math.atan2(-ay, -ax)
      const incidence = wrapAngle(angle + boom)
      let pressure = 0.5 * RHO_AIR * speed * speed * (area[k] as number)
      // Behind a squared-off main on the same side a headsail stands in its lee.
      if (mainBlanket > 0 && sail.kind === 'headsail') {
        const main = y[BOOM + mainIndex] as number
        if (main * boom > 0) pressure *= 1 - 0.65 * mainBlanket
      }
      const lift = sailLift(incidence, boom, sail.curve)
      const drag = sailDrag(incidence, lift, sail.curve)
      const cosA = speed > 0 ? -ax / speed : 1
      const sinA = speed > 0 ? -ay / speed : 0
      const cosB = Math.cos(boom)
      const sinB = Math.sin(boom)
      const forceX = pressure * (lift * sinA - drag * cosA)
      const forceH = pressure * (-lift * cosA - drag * sinA)
      const forceY = forceH * cosPhi
      const arm = sailCentre(incidence) * sail.chord
      const ceX = sail.luffFromCentre - arm * cosB
      const ceY = arm * sinB * cosPhi + h * sinPhi
      X += forceX
      Y += forceY
      K += forceH * h
      N += ceX * forceY - ceY * forceX

      // Force across the chord, towards the side on which the boom lies under its sheet.
      const normal = forceX * sinB + forceH * cosB
      const side = boom < 0 ? -1 : 1
      const moment = side * normal * arm
      const tension = moment > 0 ? moment * sail.tensionOverMoment : 0
      observed.sheet[k] = tension
      observed.drawing[k] = fullness(incidence)
      if (k === vessel.source) sourceTension = tension
      let goal = sail.heldAt
      if (sail.hold === 'sheet') {
        const ease =
          k === vessel.source && rigged
            ? pull.easedLength(boom, delta, tension) / (sail.reach * sail.across)
            : 0
        const limit = sail.limit + ease
        goal = boomTarget(angle, boom, limit > 0 ? Math.min(limit, 1.6) : 0)
      }
      dy[BOOM + k] = (goal - boom) / BOOM_LAG
      if (k === 0 || k === mainIndex) {
        observed.apparentAngle = angle
        observed.apparentSpeed = speed
      }
    }

    // Hull and rigging in the wind.
    const wx = windX - u
    const wy = windY - v
    const windageSpeed = 0.5 * RHO_AIR * Math.sqrt(wx * wx + wy * wy)
    X += windageSpeed * vessel.windageAhead * wx
    const windageY = windageSpeed * vessel.windageAbeam * wy
    Y += windageY
    K += windageY * vessel.windageHeight

    // Water past the hull.
    const ur = u - waves.orbitalX
    const vr = v - waves.orbitalY
    const place = Math.min(Math.abs(ur), topSpeed) / vessel.speedStep
    const cell = Math.floor(place)
    const low = vessel.resistance[cell] as number
    const high = vessel.resistance[cell + 1] as number
    const resistance = low + (place - cell) * (high - low)
    X -= ur < 0 ? -resistance : resistance
    N -= vessel.munkMass * ur * vr
    N -= vessel.heelYawLever * sinPhi * resistance
    for (let i = 0; i < CROSS_FLOW_STATIONS; i++) {
      const x = (i + 0.5) * stationLength - 0.5 * vessel.length
      const w = vr + r * x
      const f = -0.5 * RHO_SEA * CROSS_FLOW_DRAG * vessel.draught * stationLength * w * Math.abs(w)
      Y += f
      N += x * f
    }
    K -=
      vessel.mass *
        GRAVITY *
        ((vessel.gm * vessel.vanishing) / Math.PI) *
        Math.sin((Math.PI * (phi + waves.slope)) / vessel.vanishing) +
      vessel.rollDamping * p

    // Keel.
    const keelV = (v + r * keel.feltX - p * keel.depth - waves.orbitalY) * cosPhi
    const keelAngle = Math.atan2(keelV, ur)
    const keelQ = 0.5 * RHO_SEA * keel.area * (ur * ur + keelV * keelV)
    const keelLift = foilLift(keelAngle, keel.slope)
    const keelDrag = foilDrag(keelAngle, keelLift, keel.aspect)
    const keelCos = Math.cos(keelAngle)
    const keelSin = Math.sin(keelAngle)
    const keelForce = -keelQ * (keelLift * keelCos + keelDrag * keelSin)
    X += keelQ * (keelLift * keelSin - keelDrag * keelCos)
    Y += keelForce * cosPhi
    N += keel.x * keelForce * cosPhi - keel.turnDamping * Math.abs(ur) * r
    K -= keel.depth * keelForce

    // Rudder in the keel's wake.
    const flowU = rudder.speedRatio * ur
    const flowV =
      (rudder.leewayRatio * v + r * rudder.x - p * rudder.depth - waves.rudderOrbitalY) * cosPhi
    const flow = Math.sqrt(flowU * flowU + flowV * flowV)
    const drift = Math.atan2(flowV, flowU)
    const swing = (deltaRate * (0.75 - rudder.balance) * rudder.chord) / (flow + 0.3)
    const rudderAngle = drift + delta + swing
    const rudderQ = 0.5 * RHO_SEA * rudder.area * flow * flow
    const rudderLift = foilLift(rudderAngle, rudder.slope)
    const rudderDrag = foilDrag(rudderAngle, rudderLift, rudder.aspect)
    const driftCos = Math.cos(drift)
    const driftSin = Math.sin(drift)
    const rudderForce = -rudderQ * (rudderLift * driftCos + rudderDrag * driftSin)
    X += rudderQ * (rudderLift * driftSin - rudderDrag * driftCos)
    // The skeg stands in the same water and does not turn.
    const skegQ = 0.5 * RHO_SEA * rudder.skegArea * flow * flow
    const skegLift = foilLift(drift, rudder.slope)
    const skegDrag = foilDrag(drift, skegLift, rudder.aspect)
    X += skegQ * (skegLift * driftSin - skegDrag * driftCos)
    const sternForce = rudderForce - skegQ * (skegLift * driftCos + skegDrag * driftSin)
    Y += sternForce * cosPhi
    N += rudder.x * sternForce * cosPhi
    K -= rudder.depth * sternForce
    const bladeNormal =
      -rudderQ * (rudderLift * Math.cos(rudderAngle) + rudderDrag * Math.sin(rudderAngle))
    const waterMoment = stockMoment(bladeNormal, rudderAngle, rudder.chord, rudder.balance)
    observed.rudderMoment = waterMoment

    // Tiller: line to windward, elastic to leeward, water, friction, stops.
    const tiller = -delta
    const cosT = Math.cos(tiller)
    const sinT = Math.sin(tiller)
    let moment = waterMoment
    let lineSpeed = 0
    let elasticSpeed = 0
    observed.lineTension = 0
    observed.elasticTension = 0
    observed.hitchOut = 0
    observed.elasticExtension = 0
    if (rigged) {
      const tillerRate = -deltaRate
      if (vessel.source >= 0) {
        const px = line.tillerRadius * cosT
        const py = line.tillerRadius * sinT
        const dx = line.lastX - px
        const dy0 = line.lastY - py
        const dz = line.lastZ - line.tillerZ
        const reach = Math.sqrt(dx * dx + dy0 * dy0 + dz * dz)
        const lever = reach > 0 ? (px * dy0 - py * dx) / reach : 0
        lineSpeed = lever * tillerRate
        const boom = y[BOOM + vessel.source] as number
        const tension = pull.tension(boom, delta, sourceTension, y[LINE_FRICTION] as number)
        observed.lineTension = tension
        observed.hitchOut = pull.hitchOut
        moment += lever * tension
      }
      const ex = elastic.tillerRadius * cosT
      const ey = elastic.tillerRadius * sinT
      const fx = elastic.anchorX - ex
      const fy = elastic.anchorY - ey
      const fz = elastic.anchorZ - line.tillerZ
      const span = Math.sqrt(fx * fx + fy * fy + fz * fz)
      const elasticLever = span > 0 ? (ex * fy - ey * fx) / span : 0
      elasticSpeed = -elasticLever * tillerRate
      const extension = elastic.stretch + span - elastic.distanceAtRest
      const cord =
        elasticPull(extension, elastic.naturalLength, elastic.area, elastic.modulus) *
        (1 + elastic.hysteresis * (y[ELASTIC_FRICTION] as number))
      observed.elasticTension = cord
      observed.elasticExtension = extension
      moment += elasticLever * cord
    }
    const bearing = rudder.friction * (y[BEARING_FRICTION] as number)
    let rudderMoment = -moment - bearing
    const beyond = Math.abs(delta) - rudder.stop
    if (beyond > 0) {
      rudderMoment -= (delta < 0 ? -1 : 1) * stopStiffness * beyond + stopDamping * deltaRate
    }

    dy[NORTH] = u * cosPsi - v * sinPsi
    dy[EAST] = u * sinPsi + v * cosPsi
    dy[HEADING] = r
    dy[HEEL] = p
    dy[SURGE] = (X + vessel.swayMass * v * r) / vessel.surgeMass
    dy[SWAY] = (Y - vessel.surgeMass * u * r) / vessel.swayMass
    dy[ROLL_RATE] = K / vessel.rollInertia
    dy[YAW_RATE] = N / vessel.yawInertia
    dy[RUDDER] = lashed ? 0 : deltaRate
    dy[RUDDER_RATE] = lashed ? 0 : rudderMoment / rudder.inertia
    dy[BEARING_FRICTION] = frictionRate(deltaRate, y[BEARING_FRICTION] as number, BEARING_WAY)
    dy[LINE_FRICTION] = frictionRate(lineSpeed, y[LINE_FRICTION] as number, LINE_WAY)
    dy[ELASTIC_FRICTION] = frictionRate(elasticSpeed, y[ELASTIC_FRICTION] as number, ELASTIC_WAY)

    observed.sheetTension = sourceTension
    observed.windNorth = windNorth
    observed.windEast = windEast
    observed.surface = waves.surface
  }

  return { size, derivative, observed }
}
