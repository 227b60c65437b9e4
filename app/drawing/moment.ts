import { type Channel, channels } from 'sim/trial/channels'
import { clamp, wrapDegrees } from './frame'
import type { Moment, Run } from './types'

const channelNames = Object.keys(channels) as Channel[]

/** Channels that come round again after 360 degrees. */
const circular: ReadonlySet<Channel> = new Set([
  'courseToWindDeg',
  'headingDeg',
  'windDirectionDeg',
  'apparentWindAngleDeg',
])

function along(values: Float64Array, index: number, part: number): number {
  const here = values[index] ?? 0
  const next = values[index + 1] ?? here
  return here + (next - here) * part
}

function around(values: Float64Array, index: number, part: number): number {
  const here = values[index] ?? 0
  const next = values[index + 1] ?? here
  return wrapDegrees(here + wrapDegrees(next - here) * part)
}

/** Index of the last sample at or before a moment, and how far on towards the next. */
export function sampleAt(times: Float64Array, timeS: number): { index: number; part: number } {
  let low = 0
  let high = Math.max(0, times.length - 2)
  while (low < high) {
    const middle = Math.ceil((low + high) / 2)
    if ((times[middle] ?? 0) <= timeS) low = middle
    else high = middle - 1
  }
  const from = times[low] ?? 0
  const interval = (times[low + 1] ?? from) - from
  return { index: low, part: interval > 0 ? clamp((timeS - from) / interval, 0, 1) : 0 }
}

/** The moment of a run, between samples too, so that slow playback moves smoothly. */
export function momentAt(run: Run, timeS: number): Moment {
  const { series, boomDeg, drawing } = run.result
  const { index, part } = sampleAt(series.timeS, timeS)
  const values = {} as Record<Channel, number>
  for (const name of channelNames)
    values[name] = (circular.has(name) ? around : along)(series[name], index, part)
  return {
    ...values,
    boomDeg: sailValues(boomDeg, index, part),
    drawing: sailValues(drawing, index, part),
    reef: reefAt(run, values.timeS),
  }
}

function sailValues(columns: Record<string, Float64Array>, index: number, part: number) {
  const values: Record<string, number> = {}
  for (const [sail, column] of Object.entries(columns)) values[sail] = along(column, index, part)
  return values
}

function reefAt(run: Run, timeS: number) {
  const reef: Record<string, number> = {}
  for (const [sail, trim] of Object.entries(run.request.plan.setup.trim)) reef[sail] = trim.reef
  for (const event of run.request.events)
    if (event.kind === 'reef' && event.atS <= timeS) reef[event.sail] = event.percent
  return reef
}
