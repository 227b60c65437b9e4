import { DEGREE } from '../constants'
import { atan2, cos, sin } from '../elementary'
import { wrapAngle } from '../numbers'
import { judgingParameters } from '../parameters/judging'
import type { Metrics } from './types'
import type { Watch } from './watch'

const band = judgingParameters.bandDeg.default * DEGREE

/**
 * Headline figures of a run, as the judging table defines them.
 *
 * @param asked course to the wind, rad, with its sign
 * @param balanceSpeedKn speed of the balance from which the run began
 * @param ended whether the run reached its end
 */
export function metricsOf(
  watch: Watch,
  asked: number,
  balanceSpeedKn: number,
  ended: boolean,
): Metrics {
  const { means } = watch
  const side = asked < 0 ? -1 : 1
  const askedSide = Math.abs(asked)
  let c = 0
  let s = 0
  for (const mean of means) {
    c += cos(mean)
    s += sin(mean)
  }
  const judged = means.length > 0
  const average = judged ? atan2(s, c) : askedSide
  let inside = 0
  let squares = 0
  let most = 0
  for (const mean of means) {
    const away = Math.abs(wrapAngle(mean - average))
    if (away <= band) inside++
    const error = wrapAngle(mean - askedSide)
    squares += error * error
    most = Math.max(most, Math.abs(error))
  }
  const within = judged ? inside / means.length : 0
  const meanSpeedKn = judged ? watch.judgedSpeedSum / means.length : 0
  const holds =
    ended &&
    judged &&
    !watch.lost &&
    within >= judgingParameters.withinShare.default &&
    Math.abs(wrapAngle(average - askedSide)) <= band &&
    meanSpeedKn >= judgingParameters.leastSpeedShare.default * balanceSpeedKn
  return {
    holds,
    lastedS: watch.lastedS,
    meanCourseToWindDeg: (side * average) / DEGREE,
    rmsCourseErrorDeg: judged ? Math.sqrt(squares / means.length) / DEGREE : 0,
    maxCourseErrorDeg: most / DEGREE,
    withinBandFraction: within,
    meanSpeedKn,
    balanceSpeedKn,
    maxHeelDeg: watch.heelMost,
    peakControlLineN: watch.lineMost,
    peakElasticN: watch.elasticMost,
    peakSheetN: watch.sheetMost,
  }
}
