import type { Channel, Series } from 'sim/trial/channels'
import type { TrialResult } from 'sim/trial/types'

/**
 * A run thinned out for the first page: enough to draw it before this browser has computed it.
 * The verdict and the metrics are those of the full run.
 */
export interface Sketch extends Omit<TrialResult, 'series' | 'boomDeg' | 'drawing'> {
  series: Record<Channel, number[]>
  boomDeg: Record<string, number[]>
  drawing: Record<string, number[]>
}

export function sketchOf(result: TrialResult, everyS: number): Sketch {
  const { series, boomDeg, drawing, ...rest } = result
  const keep = kept(series.timeS, everyS)
  return {
    ...rest,
    series: thinned(series, keep),
    boomDeg: thinned(boomDeg, keep),
    drawing: thinned(drawing, keep),
  }
}

export function resultOf(sketch: Sketch): TrialResult {
  const { series, boomDeg, drawing, ...rest } = sketch
  return {
    ...rest,
    series: columns(series) as Series,
    boomDeg: columns(boomDeg),
    drawing: columns(drawing),
  }
}

/** Indices about `everyS` apart, the last output always among them. */
function kept(times: Float64Array, everyS: number): number[] {
  const indices: number[] = []
  let due = Number.NEGATIVE_INFINITY
  times.forEach((timeS, index) => {
    if (timeS < due && index !== times.length - 1) return
    indices.push(index)
    due = timeS + everyS - 1e-6
  })
  return indices
}

function thinned<Name extends string>(
  group: Record<Name, Float64Array>,
  keep: readonly number[],
): Record<Name, number[]> {
  return mapped(group, (column) => keep.map((index) => Number((column[index] ?? 0).toPrecision(4))))
}

function columns(group: Record<string, number[]>): Record<string, Float64Array> {
  return mapped(group, (column) => Float64Array.from(column))
}

function mapped<Name extends string, From, To>(
  group: Record<Name, From>,
  change: (column: From) => To,
): Record<Name, To> {
  return Object.fromEntries(
    Object.entries<From>(group).map(([name, column]) => [name, change(column)]),
  ) as Record<Name, To>
}
