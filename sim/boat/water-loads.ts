import { GRAVITY, RHO_SEA } from '../constants'
import { atan2, cos, sin } from '../elementary'
import { foilDrag, foilLift } from '../foils/section'
import { munkMoment } from '../hull/added-mass'
import { rightingArm } from '../hull/stability'
import { stockMoment } from '../steering/stock'
import { HEEL, ROLL_RATE, RUDDER, RUDDER_RATE, SURGE, SWAY, YAW_RATE } from './state'
import type { Vessel } from './vessel'
import type { WaveLoads } from './wave-loads'

/** Cross-flow drag of the canoe body's sections; Hoerner, bluff sections, from memory. */
const CROSS_FLOW_DRAG = 0.7
const STATIONS = 7
/** Added to the flow at the rudder where the blade's own swing is reckoned, so that it stays finite at rest, m/s. */
const LEAST_FLOW = 0.3

export interface WaterLoads {
  /** Body axes about the centre of gravity, N and N m; the moment in roll about the waterline. */
  surge: number
  sway: number
  yaw: number
  roll: number
  /** Moment of the water on the rudder about its stock, N m, positive when it turns the tiller to starboard. */
  stock: number
  /** The waves' own loads must be up to date. */
  update(y: Float64Array): void
}

/** Hull, keel, skeg and rudder in the moving water. */
export function createWaterLoads(vessel: Vessel, waves: WaveLoads): WaterLoads {
  const { keel, rudder } = vessel
  const topSpeed = (vessel.resistance.length - 2) * vessel.speedStep
  const station = vessel.length / STATIONS
  const crossFlow = 0.5 * RHO_SEA * CROSS_FLOW_DRAG * vessel.draught * station
  const weight = vessel.mass * GRAVITY

  const loads: WaterLoads = {
    surge: 0,
    sway: 0,
    yaw: 0,
    roll: 0,
    stock: 0,
    update(y) {
      const phi = y[HEEL] as number
      const p = y[ROLL_RATE] as number
      const r = y[YAW_RATE] as number
      const cosPhi = cos(phi)
      const ur = (y[SURGE] as number) - waves.orbitalX
      const vr = (y[SWAY] as number) - waves.orbitalY

      // Canoe body.
      const place = Math.min(Math.abs(ur), topSpeed) / vessel.speedStep
      const cell = Math.floor(place)
      const low = vessel.resistance[cell] as number
      const resistance = low + (place - cell) * ((vessel.resistance[cell + 1] as number) - low)
      let surge = ur < 0 ? resistance : -resistance
      let sway = 0
      let yaw = munkMoment(0, vessel.munkMass, ur, vr) - vessel.heelYawLever * sin(phi) * resistance
      let roll =
        -weight * rightingArm(phi + waves.slope, vessel.gm, vessel.vanishing) -
        vessel.rollDamping * p
      for (let i = 0; i < STATIONS; i++) {
        const x = (i + 0.5) * station - 0.5 * vessel.length
        const w = vr + r * x
        const force = -crossFlow * w * Math.abs(w)
        sway += force
        yaw += x * force
      }

      // Keel.
      const keelV = (vr + r * keel.feltX) * cosPhi - p * keel.depth
      const keelAngle = atan2(keelV, ur)
      const keelQ = 0.5 * RHO_SEA * keel.area * (ur * ur + keelV * keelV)
      const keelLift = foilLift(keelAngle, keel.slope)
      const keelDrag = foilDrag(keelAngle, keelLift, keel.aspect) - keel.borrowedDrag
      const keelCos = cos(keelAngle)
      const keelSin = sin(keelAngle)
      const keelForce = -keelQ * (keelLift * keelCos + keelDrag * keelSin)
      surge += keelQ * (keelLift * keelSin - keelDrag * keelCos)
      sway += keelForce * cosPhi
      yaw += keel.x * keelForce * cosPhi - keel.turnDamping * Math.abs(ur) * r
      roll -= keel.depth * keelForce

      // Rudder and skeg in the keel's wake; the skeg stands in the same water and does not turn.
      // The keel's downwash takes its share of what the keel feels, drift and waves alike.
      const flowU = rudder.speedRatio * ((y[SURGE] as number) - waves.rudderOrbitalX)
      const level = rudder.leewayRatio * vr + waves.orbitalY - waves.rudderOrbitalY + r * rudder.x
      const flowV = level * cosPhi - p * rudder.depth
      const flow = Math.sqrt(flowU * flowU + flowV * flowV)
      const drift = atan2(flowV, flowU)
      const swing =
        ((y[RUDDER_RATE] as number) * (0.75 - rudder.balance) * rudder.chord) / (flow + LEAST_FLOW)
      const incidence = drift + (y[RUDDER] as number) + swing
      const pressure = 0.5 * RHO_SEA * flow * flow
      const lift = foilLift(incidence, rudder.slope)
      const drag = foilDrag(incidence, lift, rudder.aspect)
      const skegLift = foilLift(drift, rudder.slope)
      const skegDrag = foilDrag(drift, skegLift, rudder.aspect)
      const liftArea = rudder.area * lift + rudder.skegArea * skegLift
      const dragArea = rudder.area * drag + rudder.skegArea * skegDrag
      const driftCos = cos(drift)
      const driftSin = sin(drift)
      const sternForce = -pressure * (liftArea * driftCos + dragArea * driftSin)
      surge += pressure * (liftArea * driftSin - dragArea * driftCos)
      sway += sternForce * cosPhi
      yaw += rudder.x * sternForce * cosPhi
      roll -= rudder.depth * sternForce
      const normal = -pressure * rudder.area * (lift * cos(incidence) + drag * sin(incidence))

      loads.surge = surge
      loads.sway = sway
      loads.yaw = yaw
      loads.roll = roll
      loads.stock = stockMoment(normal, incidence, rudder.chord, rudder.balance)
    },
  }
  return loads
}
