import type { Conditions } from 'sim/plan/types'
import type { Anchor } from './types'

/** On deck, metres: x forward from the rudder stock, y to starboard. */
export interface Point {
  x: number
  y: number
}

/** With z, metres above the waterline. */
export interface DeckPoint extends Point {
  z: number
}

/** 1 with the wind over the starboard side, -1 over the port side. */
export type Tack = 1 | -1

const degree = Math.PI / 180

export function radians(degrees: number): number {
  return degrees * degree
}

/** Into -180..180. */
export function wrapDegrees(angle: number): number {
  return angle - 360 * Math.round(angle / 360)
}

export function clamp(value: number, low: number, high: number): number {
  return Math.min(high, Math.max(low, value))
}

/** The tack a setup is rigged for; it stays so when the boat goes about by herself. */
export function tackOf(conditions: Conditions): Tack {
  return conditions.trueWindAngleDeg < 0 ? -1 : 1
}

/** Which way a straight line on deck runs, from the bow to starboard positive. */
export function direction(angleDeg: number): Point {
  return { x: Math.cos(radians(angleDeg)), y: Math.sin(radians(angleDeg)) }
}

export function between(from: DeckPoint, to: DeckPoint, part: number): DeckPoint {
  return {
    x: from.x + (to.x - from.x) * part,
    y: from.y + (to.y - from.y) * part,
    z: from.z + (to.z - from.z) * part,
  }
}

export function distance(a: DeckPoint, b: DeckPoint): number {
  return Math.hypot(a.x - b.x, a.y - b.y, a.z - b.z)
}

/** Bow up on paper: starboard to the right, pixels. */
export function onPaper(point: Point, pxPerM: number): Anchor {
  return { x: point.y * pxPerM, y: -point.x * pxPerM }
}

/** A tenth of a pixel is finer than anyone sees and keeps path data short. */
export function tenth(value: number): number {
  return Math.round(value * 10) / 10
}

export function polyline(points: readonly Anchor[]): string {
  let path = ''
  for (const point of points) path += `${path ? 'L' : 'M'}${tenth(point.x)} ${tenth(point.y)}`
  return path
}

export function deckPath(points: readonly Point[], pxPerM: number): string {
  return polyline(points.map((point) => onPaper(point, pxPerM)))
}
