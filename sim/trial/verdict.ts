import type { Balance } from '../analysis/balance'
import { DEGREE } from '../constants'
import { atan2, cos, sin } from '../elementary'
import { wrapAngle } from '../numbers'
import { judgingParameters } from '../parameters/judging'
import type { Helm } from '../plan/types'
import type { Happening, Metrics, Verdict, VerdictCode } from './types'
import { WATCH_STEP, type Watch } from './watch'

/** Closer than this a boat that was asked to sail lower lies luffing, degrees. */
const CLOSE_TO_THE_WIND = 35
const LUFFING_MARGIN = 8
/** More helm than this in balance is told as the reason before anything else, degrees. */
const MUCH_HELM = 8
/** Shares of the time from which slackness and the stop are told as the reason. */
const OFTEN_SLACK = 0.25
const OFTEN_ON_STOP = 0.1

const judge = {
  band: judgingParameters.bandDeg.default,
  within: judgingParameters.withinShare.default,
  unjudged: judgingParameters.unjudgedS.default,
}

function minutes(atS: number): string {
  if (atS < 90) return `${Math.round(atS / 5) * 5} seconds`
  const whole = Math.round(atS / 30) / 2
  return `${whole} minutes`
}

/** Degrees a minute at which the course moved, by least squares; negative towards the wind. */
function drift(means: number[]): number {
  const n = means.length
  if (n < 8) return 0
  const middle = (n - 1) / 2
  let top = 0
  let bottom = 0
  for (let i = 0; i < n; i++) {
    top += (i - middle) * wrapAngle((means[i] as number) - (means[0] as number))
    bottom += (i - middle) * (i - middle)
  }
  return (top / bottom / DEGREE) * (60 / WATCH_STEP)
}

function first(happenings: Happening[], code: Happening['code']): Happening | undefined {
  return happenings.find((happening) => happening.code === code)
}

/** The mean course over the last part of a run, degrees on the asked side. */
function lastCourse(means: number[]): number {
  const tail = means.slice(-Math.round(30 / WATCH_STEP))
  let c = 0
  let s = 0
  for (const mean of tail) {
    c += cos(mean)
    s += sin(mean)
  }
  return atan2(s, c) / DEGREE
}

/** A sailor's sentence on how the run went, and why. */
export function verdictOf(
  watch: Watch,
  metrics: Metrics,
  asked: number,
  helm: Helm,
  balance: Balance,
): Verdict {
  const [code, text] = sentence(watch, metrics, Math.abs(asked) / DEGREE)
  return { code, text, reason: reasonOf(watch, code, helm, balance) }
}

function sentence(watch: Watch, metrics: Metrics, asked: number): [VerdictCode, string] {
  const { happenings, means } = watch
  const average = Math.abs(metrics.meanCourseToWindDeg)
  const mean = Math.round(average)
  const trend = drift(means)
  const rounded = Math.round(asked)
  const stopped = first(happenings, 'left-valid-range')
  if (stopped) return ['stopped', `${stopped.text} after ${minutes(stopped.atS)}`]
  const tacked = first(happenings, 'tacked')
  const gybed = first(happenings, 'gybed')
  const broached = first(happenings, 'broached')
  const events = [tacked, gybed, broached].filter((event) => event !== undefined)
  const earliest = events.sort((a, b) => a.atS - b.atS)[0]
  if (earliest === tacked && tacked) {
    return ['tacks', `Rounds up and tacks herself after ${minutes(tacked.atS)}`]
  }
  if (earliest === gybed && gybed) return ['gybes', `Gybes after ${minutes(gybed.atS)}`]
  if (broached) {
    return ['broaches', `${broached.text} after ${minutes(broached.atS)}`]
  }
  if (metrics.holds) {
    const give = Math.max(1, Math.round(spreadOf(watch)))
    return ['holds', `Holds ${mean} degrees to the wind, give or take ${give}`]
  }
  if (means.length === 0) {
    return ['not-judged', `Too short to judge: the first ${judge.unjudged} seconds do not count`]
  }
  const steady = metrics.withinBandFraction >= judge.within
  if (steady && Math.abs(average - asked) > judge.band) {
    const way = average < asked ? 'higher' : 'lower'
    return ['holds-other-course', `Settles at ${mean} degrees, ${way} than the ${rounded} asked`]
  }
  if (steady) return ['too-slow', `Lies at ${mean} degrees with hardly any way on`]
  const end = lastCourse(means)
  if (trend < -1 && end < asked) {
    const close = means.findIndex((course) => Math.abs(course) / DEGREE < CLOSE_TO_THE_WIND)
    if (close >= 0 && asked > CLOSE_TO_THE_WIND + LUFFING_MARGIN) {
      const after = minutes(judge.unjudged + close * WATCH_STEP)
      return ['creeps-to-windward', `Creeps to windward, luffs after ${after}`]
    }
    return [
      'creeps-to-windward',
      `Creeps to windward, ${Math.round(asked - end)} degrees by the end`,
    ]
  }
  if (trend > 1 && end > asked) {
    return ['sags-to-leeward', `Sags to leeward, ${Math.round(end - asked)} degrees by the end`]
  }
  if (average < CLOSE_TO_THE_WIND && asked > average + LUFFING_MARGIN)
    return ['luffs', 'Comes up and lies luffing']
  return ['hunts', `Hunts ${Math.round(2 * spreadOf(watch))} degrees from side to side`]
}

/** Standard deviation of the judged course about its own mean, degrees. */
function spreadOf(watch: Watch): number {
  const { means } = watch
  if (means.length === 0) return 0
  let sum = 0
  const origin = means[0] as number
  for (const mean of means) sum += wrapAngle(mean - origin)
  const average = sum / means.length
  let squares = 0
  for (const mean of means) {
    const away = wrapAngle(mean - origin) - average
    squares += away * away
  }
  return Math.sqrt(squares / means.length) / DEGREE
}

function reasonOf(watch: Watch, code: VerdictCode, helm: Helm, balance: Balance): string {
  if (helm === 'lashed') {
    return 'The tiller is lashed where the boat balances: only hull and sails answer a change of heading.'
  }
  if (helm === 'free') return 'The tiller is left to itself: the rudder trails with the water.'
  const n = Math.max(watch.samples, 1)
  const line = Math.round(watch.lineSum / n)
  const elastic = Math.round(watch.elasticSum / n)
  const stop = watch.onStop / n
  const slackLine = watch.slackLine / n
  const slackElastic = watch.slackElastic / n
  const tiller = watch.tillerSum / n
  const swing = Math.sqrt(Math.max(0, watch.tillerSquares / n - tiller * tiller)) / DEGREE
  if (!balance.found) {
    return 'She has no balance at this course and trim with the tiller inside its stops: balance the sails first.'
  }
  if (Math.abs(balance.tillerDeg) > MUCH_HELM) {
    return `She needs ${Math.round(Math.abs(balance.tillerDeg))} degrees of tiller to stay on course: out of balance before the line is asked to steer.`
  }
  if (slackLine > OFTEN_SLACK) {
    return `The control line is slack ${Math.round(100 * slackLine)} % of the time: the elastic alone brings her up.`
  }
  if (slackElastic > OFTEN_SLACK) {
    return `The elastic is slack ${Math.round(100 * slackElastic)} % of the time: nothing brings her back up.`
  }
  if (stop > OFTEN_ON_STOP) {
    return `The tiller lies on its stop ${Math.round(100 * stop)} % of the time: too much pull for the stroke.`
  }
  const work = `Line ${line} N against elastic ${elastic} N on average, the tiller working ${swing.toFixed(1)} degrees either way.`
  return code !== 'holds' && swing < 1 ? `${work} The pull hardly changes with her heading.` : work
}
