/** Follows a run as it goes: course to the wind, its moving mean, and what happens on the way. */

import { BOOM, HEADING, HEEL, RUDDER, SURGE, SWAY } from '../boat/state'
import type { Observation } from '../boat/system'
import type { Vessel } from '../boat/vessel'
import { DEGREE, KNOT } from '../constants'
import { atan2, cos, hypot, sin } from '../elementary'
import { wrapAngle } from '../numbers'
import { judgingParameters } from '../parameters/judging'
import type { Happening } from './types'

/** Interval at which a run is judged, s. */
export const WATCH_STEP = 0.25

const judge = {
  wind: Math.round(judgingParameters.windMeanS.default / WATCH_STEP),
  course: Math.round(judgingParameters.courseMeanS.default / WATCH_STEP),
  unjudged: judgingParameters.unjudgedS.default,
  broachHeel: judgingParameters.broachHeelDeg.default * DEGREE,
  broachError: judgingParameters.broachErrorDeg.default * DEGREE,
  broachTime: judgingParameters.broachErrorS.default,
}

/** Beyond this a run has left the range in which the model means anything. */
const CAPSIZED = 85 * DEGREE
const SLACK_LINE = 1
const STOP_MARGIN = 0.2 * DEGREE
/** A happening of the same kind is told again only after this, s, and at most so often. */
const TELL_AGAIN = 20
const TELL_MOST = 8
/** Slackness shorter than this is not told, s. */
const SLACK_TIME = 1

/** Why the model means nothing here, or undefined while it does. */
function leftRange(heel: number, speed: number, topSpeed: number): string | undefined {
  if (!Number.isFinite(heel) || !Number.isFinite(speed)) return 'The numbers ran away'
  if (Math.abs(heel) >= CAPSIZED) return 'Knocked flat'
  return speed > topSpeed ? 'Faster than the resistance is known' : undefined
}

/** What has been seen of a run so far; angles in rad, loads in N, speed in knots. */
export interface Watch {
  /** Course to the wind against its one-minute mean direction, rad, positive over the starboard side. */
  courseToWind: number
  /** Judged samples of the moving mean of the course, rad, on the tack sailed (positive on the asked side). */
  means: number[]
  happenings: Happening[]
  lost: boolean
  /** When the run was lost, s, or so far. */
  lastedS: number
  outOfRange: boolean
  /** Sum of the judged samples' speed, kn. */
  judgedSpeedSum: number
  heelMost: number
  lineMost: number
  elasticMost: number
  sheetMost: number
  samples: number
  slackLine: number
  slackElastic: number
  onStop: number
  tillerSum: number
  tillerSquares: number
  lineSum: number
  elasticSum: number
  see(t: number, y: Float64Array, observed: Observation): void
  /** Ends the run for a named reason. */
  stop(atS: number, reason: string): void
}

class Ring {
  private readonly values: Float64Array
  private at = 0
  private filled = 0
  sum = 0
  constructor(size: number) {
    this.values = new Float64Array(size)
  }
  push(value: number): void {
    if (this.filled === this.values.length) this.sum -= this.values[this.at] as number
    else this.filled++
    this.values[this.at] = value
    this.sum += value
    this.at = (this.at + 1) % this.values.length
  }
}

/**
 * @param asked course to the wind, rad
 * @param rigged whether line and elastic are at work
 */
export function watchOf(vessel: Vessel, asked: number, rigged: boolean): Watch {
  const windNorth = new Ring(judge.wind)
  const windEast = new Ring(judge.wind)
  const courseCos = new Ring(judge.course)
  const courseSin = new Ring(judge.course)
  const booms = vessel.sails.map((sail) => sail.heldAt)
  const told = new Map<Happening['code'], { count: number; atS: number }>()
  const lasting = { error: 0, line: 0, elastic: 0 }
  const topSpeed = (vessel.resistance.length - 2) * vessel.speedStep
  let side = vessel.tack as number

  function tell(code: Happening['code'], atS: number, text: string): void {
    const before = told.get(code)
    if (before && (before.count >= TELL_MOST || atS - before.atS < TELL_AGAIN)) {
      before.atS = atS
      return
    }
    told.set(code, { count: (before?.count ?? 0) + 1, atS })
    watch.happenings.push({ atS, code, text })
  }

  const watch: Watch = {
    courseToWind: asked,
    means: [],
    happenings: [],
    lost: false,
    lastedS: 0,
    outOfRange: false,
    judgedSpeedSum: 0,
    heelMost: 0,
    lineMost: 0,
    elasticMost: 0,
    sheetMost: 0,
    samples: 0,
    slackLine: 0,
    slackElastic: 0,
    onStop: 0,
    tillerSum: 0,
    tillerSquares: 0,
    lineSum: 0,
    elasticSum: 0,
    stop(atS, reason) {
      watch.lost = true
      watch.outOfRange = true
      tell('left-valid-range', atS, reason)
    },
    see(t, y, observed) {
      const heading = y[HEADING] as number
      const heel = y[HEEL] as number
      windNorth.push(observed.windNorth)
      windEast.push(observed.windEast)
      const windFrom = atan2(-windEast.sum, -windNorth.sum)
      const course = wrapAngle(windFrom - heading)
      watch.courseToWind = course
      courseCos.push(cos(course))
      courseSin.push(sin(course))
      const speed = hypot(y[SURGE] as number, y[SWAY] as number)
      const out = leftRange(heel, speed, topSpeed)
      if (out) {
        watch.stop(t, out)
        return
      }

      // Bow through the wind, boom across under load, broach.
      if (course * side < 0) {
        if (Math.abs(course) < Math.PI / 2) {
          watch.lost = true
          tell('tacked', t, 'Bow through the wind')
        }
        side = -side
      }
      const aft = Math.abs(observed.apparentAngle) > Math.PI / 2
      for (let k = 0; k < booms.length; k++) {
        const boom = y[BOOM + k] as number
        const before = booms[k] as number
        const kind = vessel.sails[k]?.kind
        if ((kind === 'main' || kind === 'mizzen') && boom * before < 0 && aft) {
          watch.lost = true
          tell('gybed', t, 'Boom across under load')
        }
        if (boom !== 0) booms[k] = boom
      }
      if (Math.abs(heel) > judge.broachHeel) {
        watch.lost = true
        tell(
          'broached',
          t,
          `Broaches, heeled past ${judgingParameters.broachHeelDeg.default} degrees,`,
        )
      }
      // Positive bears away, also where she has gone past dead before the wind.
      const off = vessel.tack * wrapAngle(course - asked)
      lasting.error = Math.abs(off) > judge.broachError ? lasting.error + WATCH_STEP : 0
      if (lasting.error >= judge.broachTime) {
        watch.lost = true
        tell('broached', t, off < 0 ? 'Rounds up far off course' : 'Bears away far off course')
      }

      if (!watch.lost) watch.lastedS = t

      const rudder = y[RUDDER] as number
      if (Math.abs(rudder) > vessel.rudder.stop - STOP_MARGIN) {
        watch.onStop++
        tell('tiller-on-stop', t, 'Tiller on its stop')
      }
      if (rigged) {
        lasting.line = observed.lineTension < SLACK_LINE ? lasting.line + WATCH_STEP : 0
        if (observed.lineTension < SLACK_LINE) watch.slackLine++
        if (lasting.line >= SLACK_TIME) tell('line-slack', t, 'Control line slack')
        lasting.elastic = observed.elasticExtension <= 0 ? lasting.elastic + WATCH_STEP : 0
        if (observed.elasticExtension <= 0) watch.slackElastic++
        if (lasting.elastic >= SLACK_TIME) tell('elastic-slack', t, 'Elastic slack')
      }

      watch.samples++
      watch.heelMost = Math.max(watch.heelMost, Math.abs(heel) / DEGREE)
      watch.lineMost = Math.max(watch.lineMost, observed.lineTension)
      watch.elasticMost = Math.max(watch.elasticMost, observed.elasticTension)
      watch.sheetMost = Math.max(watch.sheetMost, observed.sheetTension)
      watch.tillerSum += -rudder
      watch.tillerSquares += rudder * rudder
      watch.lineSum += observed.lineTension
      watch.elasticSum += observed.elasticTension
      if (t >= judge.unjudged) {
        watch.judgedSpeedSum += speed / KNOT
        watch.means.push(vessel.tack * atan2(courseSin.sum, courseCos.sum))
      }
    },
  }
  return watch
}
