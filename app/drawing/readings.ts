import { judgingParameters } from 'sim/parameters/judging'
import { clamp, tackOf, wrapDegrees } from './frame'
import { momentAt } from './moment'
import { courseOnTack } from './strip-scales'
import type { Measure, Measures, Reading, Run } from './types'

/** The strip in words: what each plot shows at the cursor and over the run. */
export function readings(run: Run, cursorS: number, measures: Measures): Reading[] {
  return [
    courseReading(run, cursorS, measures),
    heelReading(run, cursorS, measures),
    tillerReading(run, cursorS, measures),
    loadsReading(run, cursorS, measures),
  ]
}

function figure(measure: Measure, stored: number): string {
  const gap = measure.unit === '°' ? '' : ' '
  return `${measure.format(stored)}${gap}${measure.unit}`
}

interface Summary {
  least: number
  most: number
  mean: number
}

function summary(values: Float64Array, change: (value: number) => number): Summary {
  let [least, most, sum] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY, 0]
  for (const value of values) {
    const changed = change(value)
    least = Math.min(least, changed)
    most = Math.max(most, changed)
    sum += changed
  }
  return values.length > 0
    ? { least, most, mean: sum / values.length }
    : { least: 0, most: 0, mean: 0 }
}

function share(values: Float64Array, holds: (value: number, index: number) => boolean): number {
  let count = 0
  values.forEach((value, index) => {
    if (holds(value, index)) count++
  })
  return values.length > 0 ? count / values.length : 0
}

function percent(part: number): string {
  return `${Math.round(100 * clamp(part, 0, 1))} %`
}

function courseReading(run: Run, cursorS: number, { angle }: Measures): Reading {
  const { series, band } = run.result
  const moment = momentAt(run, cursorS)
  const centre = tackOf(run.request.conditions) * band.centreDeg
  const course = courseOnTack(run, moment.courseToWindDeg)
  const off = course - centre
  const where = Math.abs(off) <= band.halfWidthDeg ? 'within the band' : 'out of the band'
  const side =
    Math.abs(off) < 0.5
      ? 'on the course asked'
      : `${figure(angle, Math.abs(off))} to ${off < 0 ? 'windward' : 'leeward'} of the course asked`
  const all = summary(series.courseToWindDeg, (value) => courseOnTack(run, value))
  const judgedFrom = judgingParameters.unjudgedS.default
  const judged = series.courseToWindDeg.filter(
    (_, index) => (series.timeS[index] ?? 0) >= judgedFrom,
  )
  const within = share(
    judged,
    (value) => Math.abs(courseOnTack(run, value) - centre) <= band.halfWidthDeg,
  )
  return {
    plot: 'course',
    title: 'Course to the wind',
    atCursor: `${figure(angle, Math.abs(wrapDegrees(course)))} to the wind, ${side}, ${where}.`,
    overRun: `${courseRange(angle, all)}; ${percent(within)} of the judged time within ${figure(angle, band.halfWidthDeg)} of the ${figure(angle, centre)} asked.`,
  }
}

/** A boat that went through the wind or round by the stern has no range worth a number. */
function courseRange(angle: Measure, { least, most, mean }: Summary): string {
  if (least < 0) return 'Goes through the wind'
  if (most > 180) return 'Goes round by the stern'
  return `From ${figure(angle, least)} to ${figure(angle, most)}, ${figure(angle, mean)} on average`
}

/** An angle with its side in words instead of a sign. */
function sided(measure: Measure, stored: number, positive: string, negative: string): string {
  const size = figure(measure, Math.abs(stored))
  if (Math.abs(stored) < 0.5) return size
  return `${size} ${stored > 0 ? positive : negative}`
}

function heelReading(run: Run, cursorS: number, { angle }: Measures): Reading {
  const tack = tackOf(run.request.conditions)
  const all = summary(run.result.series.heelDeg, (value) => -tack * value)
  const now = -tack * momentAt(run, cursorS).heelDeg
  return {
    plot: 'heel',
    title: 'Heel',
    atCursor: `Heels ${sided(angle, now, 'to leeward', 'to windward')}.`,
    overRun: `At most ${sided(angle, all.most, 'to leeward', 'to windward')}, ${sided(angle, all.mean, 'to leeward', 'to windward')} on average.`,
  }
}

function tillerReading(run: Run, cursorS: number, { angle }: Measures): Reading {
  const tack = tackOf(run.request.conditions)
  const { series } = run.result
  const all = summary(series.tillerDeg, (value) => tack * value)
  const now = tack * momentAt(run, cursorS).tillerDeg
  const words = (value: number) => sided(angle, value, 'to windward', 'to leeward')
  const stop = run.request.plan.boat.rudder.stopDeg
  const stopped = share(series.tillerDeg, (value) => Math.abs(value) > stop - 0.5)
  return {
    plot: 'tiller',
    title: 'Tiller',
    atCursor: `${words(now)}.`,
    overRun: `From ${words(all.least)} to ${words(all.most)}, ${words(all.mean)} on average${stopped > 0 ? `; on its stop for ${percent(stopped)} of the time` : ''}.`,
  }
}

/** Below this a line carries nothing worth the name. */
const slackN = 1

function loadsReading(run: Run, cursorS: number, { force }: Measures): Reading {
  const { series } = run.result
  const moment = momentAt(run, cursorS)
  const columns = [
    { name: 'Control line', values: series.controlLineN, now: moment.controlLineN },
    { name: 'elastic', values: series.elasticN, now: moment.elasticN },
    { name: 'sheet', values: series.sheetN, now: moment.sheetN },
  ]
  const over = columns.map(({ name, values }) => {
    const { least, most } = summary(values, (value) => value)
    const slack = share(values, (value) => value < slackN)
    const range = `${name} ${force.format(least)} to ${figure(force, most)}`
    return slack > 0 ? `${range} (slack for ${percent(slack)} of the time)` : range
  })
  return {
    plot: 'loads',
    title: 'Loads',
    atCursor: `${columns.map(({ name, now }) => `${name} ${figure(force, now)}`).join(', ')}.`,
    overRun: `${over.join(', ')}.`,
  }
}
