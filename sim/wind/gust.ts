import { cos } from '../elementary'

/**
 * Shape of a dropped-in gust or lull: (1 - cos(2 pi t/T))/2, zero outside 0..T.
 *
 * @param t s since the gust began
 * @param duration T, s
 * @source one-minus-cosine gust, IEC 61400-1 ed. 3, transient gusts
 */
export function gustShape(t: number, duration: number): number {
  if (t <= 0 || t >= duration) return 0
  return 0.5 * (1 - cos((2 * Math.PI * t) / duration))
}

/** Shape of a lasting change: rises as (1 - cos(pi t/T))/2 and stays at 1; same source, direction change. */
export function shiftShape(t: number, duration: number): number {
  if (t <= 0) return 0
  if (t >= duration) return 1
  return 0.5 * (1 - cos((Math.PI * t) / duration))
}
