import { atan2, cos, hypot, sin } from '../elementary'

/**
 * Length a sheet gives or takes for a change of boom angle, per part, over the reach a:
 * |d length / d beta| / a, from its real direction in three dimensions. A part that leads down or along
 * the boom holds little of the sail and carries more for it.
 *
 * @param luffX gooseneck or tack forward of the rudder stock, m
 * @param reach a, where the sheet is made fast aft of the luff, m
 * @param height of that point, m
 * @param beta boom angle, rad, positive to starboard
 * @param leadX deck lead, m; leadY to starboard; leadZ above the waterline
 * @returns 0..1
 */
export function sheetAcross(
  luffX: number,
  reach: number,
  height: number,
  beta: number,
  leadX: number,
  leadY: number,
  leadZ: number,
): number {
  const s = sin(beta)
  const c = cos(beta)
  const dx = leadX - (luffX - reach * c)
  const dy = leadY - reach * s
  const dz = leadZ - height
  // Unit vector in which the clew moves as beta grows, dotted with the direction of the sheet.
  const along = s * dx + c * dy
  const length = Math.sqrt(dx * dx + dy * dy + dz * dz)
  return length > 0 ? Math.abs(along) / length : 0
}

/** Least share across the boom that is reckoned with: a boom is never held by a sheet that only pulls along it. */
export const LEAST_ACROSS = 0.2

/** Share of a headsail's moment that its sheet carries; stay and foot carry the rest (estimate, inside the handbook bound). */
export const HEADSAIL_SHEET_SHARE = 0.65

/**
 * Angle at which a headsail's cloth leaves the clew against its chord: 4 f of a circular arc. The sheet pulls along
 * the cloth, so it is never closer to the chord than this.
 */
export function clothAngle(camber: number): number {
  return atan2(4 * camber, 1)
}

/**
 * Handbook sheet load of a genoa, N; an upper bound for a drawing sail.
 *
 * @param area m^2
 * @param wind apparent, m/s
 * @source rigging handbooks: .02104 A V^2 kg, V in knots
 */
export function genoaSheetBound(area: number, wind: number): number {
  const kn = wind / 0.514444444
  return 0.02104 * area * kn * kn * 9.80665
}

/**
 * Handbook load of a mainsheet as a whole, N; an upper bound for a drawing sail.
 *
 * @param luff P, m
 * @param foot E, m
 * @param fromEnd D, m, sheet made fast forward of the boom end
 * @param wind apparent, m/s
 * @source rigging handbooks: E^2 P^2 .00431 V^2/(sqrt(P^2 + E^2)(E - D)) lb, feet and knots
 */
export function mainsheetBound(luff: number, foot: number, fromEnd: number, wind: number): number {
  const ft = 1 / 0.3048
  const P = luff * ft
  const E = foot * ft
  const kn = wind / 0.514444444
  const pounds = (E * E * P * P * 0.00431 * kn * kn) / (hypot(P, E) * (E - fromEnd * ft))
  return pounds * 4.4482216
}
