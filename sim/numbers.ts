/** Small scalar functions shared by the phenomena. */

/** Cubic step: 0 below `from`, 1 above `to`, with a continuous first derivative. */
export function smoothStep(from: number, to: number, x: number): number {
  const s = x <= from ? 0 : x >= to ? 1 : (x - from) / (to - from)
  return s * s * (3 - 2 * s)
}

/** The number nearest to x between two bounds. */
export function clamp(x: number, low: number, high: number): number {
  return x < low ? low : Math.min(x, high)
}

/** The same direction in (-pi, pi]. */
export function wrapAngle(angle: number): number {
  if (angle > -Math.PI && angle <= Math.PI) return angle
  const turned = angle - 2 * Math.PI * Math.floor((angle + Math.PI) / (2 * Math.PI))
  return turned === -Math.PI ? Math.PI : turned
}
