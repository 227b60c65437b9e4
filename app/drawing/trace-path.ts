import { line } from 'd3-shape'

const path = line<[number, number]>().digits(1)

/**
 * A trace as path data. Where several samples share a pixel column only the first, the lowest, the
 * highest and the last are kept: the ink is the same and the path stays short. A jump of more than
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

/** Indices of the samples that make a difference on paper, in order. */
export function keptSamples(
  times: Float64Array,
  values: Float64Array,
  x: (timeS: number) => number,
): number[] {
  const kept: number[] = []
  let start = 0
  while (start < times.length) {
    const column = Math.floor(x(times[start] ?? 0))
    let [end, low, high] = [start, start, start]
    while (end + 1 < times.length && Math.floor(x(times[end + 1] ?? 0)) === column) {
      end++
      if ((values[end] ?? 0) < (values[low] ?? 0)) low = end
      if ((values[end] ?? 0) > (values[high] ?? 0)) high = end
    }
    let before = -1
    for (const index of [start, Math.min(low, high), Math.max(low, high), end])
      if (index > before) {
        kept.push(index)
        before = index
      }
    start = end + 1
  }
  return kept
}
