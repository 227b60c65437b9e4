/**
 * Pull that a hitch needs to hold one part of a taut line out of straight, over the tension of the part's live side.
 * The other side is held: it carries what is left.
 *
 *   F/T = |b x a| / |e x a|   with a, b the unit directions from the hitch to the held and the live end, e along the pull
 *
 * Square to the middle of the part this is the familiar 2 sin(theta).
 *
 * @param ax, ay, az from the hitch, as pulled out, to the held end, m
 * @param bx, by, bz from the hitch to the live end, m
 * @param ex, ey, ez unit vector along the pull
 * @source equilibrium of the hitch in the plane of the part
 */
export function pullOverTension(
  ax: number,
  ay: number,
  az: number,
  bx: number,
  by: number,
  bz: number,
  ex: number,
  ey: number,
  ez: number,
): number {
  const across = length(ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx)
  const held = length(ay * ez - az * ey, az * ex - ax * ez, ax * ey - ay * ex)
  // A pull along the held side cannot bend the part: it is taken straight to its end.
  const lever = Math.max(held, 0.1 * length(ax, ay, az))
  return across / (length(bx, by, bz) * lever)
}

function length(x: number, y: number, z: number): number {
  return Math.sqrt(x * x + y * y + z * z)
}
