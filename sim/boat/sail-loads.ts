import { RHO_AIR } from '../constants'
import { atan2, cos, sin } from '../elementary'
import { smoothStep, wrapAngle } from '../numbers'
import type { TrialEvent } from '../plan/types'
import { boomTarget } from '../sails/boom'
import { fullness, sailCentre, sailDrag, sailLift } from '../sails/coefficients'
import { shiftShape } from '../wind/gust'
import type { LineSolver } from './line-pull'
import { BOOM, HEEL, ROLL_RATE, RUDDER, SURGE, SWAY, YAW_RATE } from './state'
import type { Vessel } from './vessel'

/** Lag of a boom behind where the wind carries it, s. */
const BOOM_LAG = 0.35
/** No boom goes further out than its shrouds let it, rad. */
const SHROUDS = 1.6
/** Over this much short of its sheet, rad, a boom takes up the sheet's whole load. */
const TAUT_FROM = 0.1
const TAUT_AT = 0.02
/** Boom angle, rad, over which a boom changes sides. */
const SIDE_SOFTNESS = 0.01
/** Below this limit, rad, a boom hauled amidships is held both ways. */
const AMIDSHIPS = 0.06
/** Time a crew needs to take in a reef, s. */
const REEFING_TIME = 25
/** Apparent wind angles, rad, over which the lee of a squared-off main closes on a headsail, and how much wind it takes. */
const LEE_BEGINS = 2.3
const LEE_FULL = 2.9
const LEE_LOSS = 0.65
/** Clew angle, rad, over which a headsail passes from one side of the boat to the other. */
const SIDE_BAND = 0.1

export interface SailLoads {
  /** Body axes about the centre of gravity, N and N m; the moment in roll about the waterline. */
  surge: number
  sway: number
  yaw: number
  roll: number
  /** Tension per part of the sheet that gives the pull, N. */
  sourceTension: number
  /** Apparent wind at the main, or at the first sail of a boat that has none set. */
  apparentAngle: number
  apparentSpeed: number
  /** Per sail: 0 flogging, 1 drawing; sheet tension per part, N. */
  drawing: Float64Array
  sheet: Float64Array
  /** @param windX, windY wind over the water at 10 m, body axes, m/s; boom rates are written into dy */
  update(t: number, y: Float64Array, dy: Float64Array, windX: number, windY: number): void
}

/**
 * Loads of all sails set, each at its own height, chord and boom angle, and of hull and rigging in the wind.
 *
 * @param pull the control line where it takes its pull from a sheet, or undefined where none is rigged
 */
export function createSailLoads(
  vessel: Vessel,
  events: readonly TrialEvent[],
  pull: LineSolver | undefined,
): SailLoads {
  const { sails } = vessel
  const count = sails.length
  const reefs = events.filter((event) => event.kind === 'reef')
  const area = Float64Array.from(sails, (sail) => sail.area)
  const height = Float64Array.from(sails, (sail) => sail.effortHeight)
  const chord = Float64Array.from(sails, (sail) => sail.chord)
  const mainIndex = sails.findIndex((sail) => sail.kind === 'main')
  const first = Math.max(mainIndex, 0)

  const left = new Float64Array(count)

  /** Each reef takes its part of what stands then; a crew works at one sail after another. */
  function applyReefs(t: number): void {
    left.fill(1)
    for (let i = 0; i < reefs.length; i++) {
      const event = reefs[i] as (typeof reefs)[number]
      const taken = (event.percent / 100) * shiftShape(t - event.atS, REEFING_TIME)
      for (let k = 0; k < count; k++) {
        if (sails[k]?.id === event.sail) left[k] = (left[k] as number) * (1 - taken)
      }
    }
    for (let k = 0; k < count; k++) {
      const sail = sails[k] as (typeof sails)[number]
      const share = left[k] as number
      const shrink = Math.sqrt(share)
      area[k] = sail.area * share
      height[k] = sail.footZ + (sail.effortHeight - sail.footZ) * shrink
      chord[k] = sail.chord * shrink
    }
  }

  const loads: SailLoads = {
    surge: 0,
    sway: 0,
    yaw: 0,
    roll: 0,
    sourceTension: 0,
    apparentAngle: 0,
    apparentSpeed: 0,
    drawing: new Float64Array(count),
    sheet: new Float64Array(count),
    update(t, y, dy, windX, windY) {
      if (reefs.length > 0) applyReefs(t)
      const u = y[SURGE] as number
      const v = y[SWAY] as number
      const p = y[ROLL_RATE] as number
      const r = y[YAW_RATE] as number
      const delta = y[RUDDER] as number
      const cosPhi = cos(y[HEEL] as number)
      const sinPhi = sin(y[HEEL] as number)
      const relativeX = windX - u
      const relativeY = windY - v

      // Hull and rigging.
      const flow = 0.5 * RHO_AIR * Math.sqrt(relativeX * relativeX + relativeY * relativeY)
      const windage = flow * vessel.windageAbeam * relativeY
      let surge = flow * vessel.windageAhead * relativeX
      let sway = windage
      let roll = windage * vessel.windageHeight
      let yaw = 0

      let lee = 0
      if (mainIndex >= 0) {
        const aft = Math.abs(atan2(-relativeY, -relativeX))
        lee = smoothStep(LEE_BEGINS, LEE_FULL, aft)
      }
      for (let k = 0; k < count; k++) {
        const sail = sails[k] as (typeof sails)[number]
        const boom = y[BOOM + k] as number
        const h = height[k] as number
        const ax = windX * sail.profile - u
        // The mast's own swing is already square to it; only what is level is foreshortened by heel.
        const ay = (windY * sail.profile - v - r * sail.luffFromCentre) * cosPhi - p * h
        const speed = Math.sqrt(ax * ax + ay * ay)
        const angle = atan2(-ay, -ax)
        const incidence = wrapAngle(angle + boom)
        let pressure = 0.5 * RHO_AIR * speed * speed * (area[k] as number)
        // Behind a squared-off main on the same side a headsail stands in its lee.
        if (lee > 0 && sail.kind === 'headsail') {
          const main = y[BOOM + mainIndex] as number
          const mainSide = main / Math.sqrt(main * main + SIDE_SOFTNESS * SIDE_SOFTNESS)
          const sameSide = smoothStep(-SIDE_BAND, SIDE_BAND, mainSide * boom)
          pressure *= 1 - LEE_LOSS * lee * sameSide
        }
        const lift = sailLift(incidence, boom, sail.curve)
        const drag = sailDrag(incidence, lift, boom, sail.curve)
        const cosA = speed > 0 ? -ax / speed : 1
        const sinA = speed > 0 ? -ay / speed : 0
        const cosB = cos(boom)
        const sinB = sin(boom)
        const forceX = pressure * (lift * sinA - drag * cosA)
        const forceH = pressure * (-lift * cosA - drag * sinA)
        const forceY = forceH * cosPhi
        const arm = sailCentre(incidence) * (chord[k] as number)
        const ceX = sail.luffFromCentre - arm * cosB
        // The heeled centre of effort lies out to leeward: thrust there makes weather helm.
        const ceY = arm * sinB * cosPhi + h * sinPhi
        surge += forceX
        sway += forceY
        roll += forceH * h
        yaw += ceX * forceY - ceY * forceX

        // Force across the chord, towards the side on which the boom lies.
        const normal = forceX * sinB + forceH * cosB
        const pulls = k === vessel.source
        let goal = sail.heldAt
        let moment = (sail.heldAt < 0 ? -normal : normal) * arm
        if (sail.hold === 'sheet') {
          const side = boom / Math.sqrt(boom * boom + SIDE_SOFTNESS * SIDE_SOFTNESS)
          const amidships = 1 - smoothStep(0, AMIDSHIPS, sail.limit)
          const outward = amidships * Math.abs(normal) + (1 - amidships) * side * normal
          const untaut = outward > 0 ? outward * arm * sail.tensionOverMoment : 0
          const eased =
            pulls && pull ? pull.easedLength(boom, delta, untaut) / (sail.reach * sail.across) : 0
          const limit = sail.limit + eased
          const out = boom < 0 ? -boom : boom
          // A boom short of its sheet leaves it slack; one against the shrouds is held by them.
          const taut =
            smoothStep(limit - TAUT_FROM, limit - TAUT_AT, out) *
            (1 - smoothStep(SHROUDS - TAUT_FROM, SHROUDS, limit))
          moment = outward * arm * taut
          goal = boomTarget(angle, boom, limit > 0 ? Math.min(limit, SHROUDS) : 0)
        }
        const tension = moment > 0 ? moment * sail.tensionOverMoment : 0
        dy[BOOM + k] = (goal - boom) / BOOM_LAG
        loads.sheet[k] = tension
        loads.drawing[k] = fullness(incidence)
        if (pulls) loads.sourceTension = tension
        if (k === first) {
          loads.apparentAngle = angle
          loads.apparentSpeed = speed
        }
      }
      loads.surge = surge
      loads.sway = sway
      loads.yaw = yaw
      loads.roll = roll
    },
  }
  return loads
}
