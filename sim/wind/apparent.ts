import { atan2, cos, hypot, sin } from '../elementary'

/** Wind as the boat feels it. */
export interface ApparentWind {
  /** Same unit as the speeds given. */
  speed: number
  /** Radians, positive over the starboard side. */
  angle: number
}

/**
 * Apparent wind of a boat without leeway.
 *
 * @param trueSpeed true wind speed, any unit
 * @param trueAngle true wind angle, rad, positive over the starboard side
 * @param boatSpeed speed through the water, same unit
 * @param heel rad; the sails feel tan AWAe = tan AWA cos phi
 * @source wind triangle; heel correction from Jackson, "Modelling the aerodynamics of upwind sails", 1996
 */
export function apparentWind(
  trueSpeed: number,
  trueAngle: number,
  boatSpeed: number,
  heel = 0,
): ApparentWind {
  const ahead = trueSpeed * cos(trueAngle) + boatSpeed
  const across = trueSpeed * sin(trueAngle) * cos(heel)
  return { speed: hypot(ahead, across), angle: atan2(across, ahead) }
}
