import type { Channel } from 'sim/trial/channels'

type Column = ArrayLike<number | null>
export type Traces = Readonly<
  Record<'timeS' | 'courseToWindDeg' | 'tillerDeg' | 'controlLineN', Column>
>

/** How far two runs of the same request are apart at most, and when they first part. */
export interface Difference {
  courseDeg: number
  tillerDeg: number
  lineN: number
  /** First moment at which the courses are more than a degree apart. */
  partedAtS: number | null
}

const PARTED_DEG = 1

/**
 * A run is the same on every machine, to the last bit: only the rounding of what a server sends may
 * lie between two. Degrees, newtons.
 */
export const SAME_WITHIN = 1e-6

export function isSame({ courseDeg, tillerDeg, lineN }: Difference): boolean {
  return Math.max(courseDeg, tillerDeg, lineN) <= SAME_WITHIN
}

/** Compares at the times both have. */
export function differenceOf(one: Traces, other: Traces): Difference {
  const most: Difference = { courseDeg: 0, tillerDeg: 0, lineN: 0, partedAtS: null }
  let second = 0
  for (let first = 0; first < one.timeS.length; first++) {
    const timeS = one.timeS[first] ?? 0
    while (second < other.timeS.length && (other.timeS[second] ?? 0) < timeS - 1e-6) second++
    if (Math.abs((other.timeS[second] ?? Number.NaN) - timeS) > 1e-6) continue
    const gap = (name: Exclude<Channel & keyof Traces, 'timeS'>) =>
      (one[name][first] ?? 0) - (other[name][second] ?? 0)
    const course = Math.abs(wrapped(gap('courseToWindDeg')))
    if (course > PARTED_DEG && most.partedAtS === null) most.partedAtS = timeS
    most.courseDeg = Math.max(most.courseDeg, course)
    most.tillerDeg = Math.max(most.tillerDeg, Math.abs(gap('tillerDeg')))
    most.lineN = Math.max(most.lineN, Math.abs(gap('controlLineN')))
  }
  return most
}

function wrapped(deg: number): number {
  return deg - 360 * Math.round(deg / 360)
}
