import { DEGREE } from '../constants'
import { smoothStep, wrapAngle } from '../numbers'

/** How far by the lee a boom stays out before the wind takes it across, rad; common practice, no source. */
const BY_THE_LEE = 22 * DEGREE
const GYBE_BAND = 4 * DEGREE

/**
 * Angle towards which the wind carries a boom (positive with the clew to starboard):
 * it streams down the wind while it luffs, lies against its sheet while the sail draws, and goes across
 * once the wind is far enough by the lee.
 *
 * @param wind apparent wind angle, rad, positive over the starboard side
 * @param boom present boom angle, rad
 * @param limit how far out the sheet lets it go, rad, not negative
 */
export function boomTarget(wind: number, boom: number, limit: number): number {
  const side = boom < 0 ? -1 : 1
  // Wind angle measured on the side away from the boom: 0 ahead, pi astern, beyond pi by the lee.
  let windward = wrapAngle(-side * wind)
  const allowed = Math.min(limit, BY_THE_LEE)
  if (windward < -Math.PI + allowed + GYBE_BAND) windward += 2 * Math.PI
  if (windward <= Math.PI) {
    const out = windward < -limit ? -limit : Math.min(windward, limit)
    return side * out
  }
  const across = smoothStep(allowed - GYBE_BAND, allowed + GYBE_BAND, windward - Math.PI)
  return side * limit * (1 - 2 * across)
}
