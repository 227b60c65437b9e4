import { line } from 'd3-shape'

const path = line<[number, number]>().digits(1)

/** A linear scale without its ceremony: thousands of samples go through it at every change. */
export function straight(scale: (value: number) => number): (value: number) => number {
  const origin = scale(0)
  const perUnit = scale(1) - origin
  return (value) => origin + perUnit * value
}

/**
 * A trace as path data. Where several samples share a column of paper, as wide as the ink, only the
 * lowest and the highest are kept: the ink is the same and the path stays short. A jump of more than
 * `breakAt` pixels lifts the pen (a course that comes round through the stern).
 */
export function tracePath(
  times: Float64Array,
  values: Float64Array,
  x: (timeS: number) => number,
  y: (value: number) => number,
  breakAt = Number.POSITIVE_INFINITY,
): string {
  let data = ''
  let stroke: [number, number][] = []
  for (const index of keptSamples(times, values, x)) {
    const point: [number, number] = [x(times[index] ?? 0), y(values[index] ?? 0)]
    const before = stroke[stroke.length - 1]
    if (before && Math.abs(point[1] - before[1]) > breakAt) {
      data += path(stroke) ?? ''
      stroke = []
    }
    stroke.push(point)
  }
  return data + (path(stroke) ?? '')
}

/** As wide as the ink of a trace, pixels. */
const columnPx = 2

/** Indices of the samples that make a difference on paper, in order. */
export function keptSamples(
  times: Float64Array,
  values: Float64Array,
  x: (timeS: number) => number,
): number[] {
  const kept: number[] = []
  const keep = (index: number) => {
    if (kept[kept.length - 1] !== index) kept.push(index)
  }
  let start = 0
  const columnOf = (index: number) => Math.floor(x(times[index] ?? 0) / columnPx)
  let next = columnOf(0)
  while (start < times.length) {
    let end = start
    let low = start
    let high = start
    const column = next
    while (end + 1 < times.length) {
      next = columnOf(end + 1)
      if (next !== column) break
      end++
      if ((values[end] ?? 0) < (values[low] ?? 0)) low = end
      if ((values[end] ?? 0) > (values[high] ?? 0)) high = end
    }
    if (start === 0) keep(0)
    keep(Math.min(low, high))
    keep(Math.max(low, high))
    start = end + 1
  }
  if (times.length > 0) keep(times.length - 1)
  return kept
}
