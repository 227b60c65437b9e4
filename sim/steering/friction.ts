/**
 * Rate of a friction state z in [-1, 1]: a bristle that bends over a short way and then slides. The force is the
 * sliding friction times z, so that a part at rest can hold a load without moving, and the force turns with the motion
 * without a jump.
 *
 *   dz/dt = (w - |w| z)/(w0 + |w| t0)
 *
 * The time t0 bounds the rate so that a fixed step stays stable however fast the part moves.
 *
 * @param speed w, of the sliding part
 * @param z present state
 * @param way w0, over which the bristle bends, in the unit of w times seconds
 * @source Dahl 1968, solid friction damping; the bound t0 is ours
 */
export function frictionRate(speed: number, z: number, way: number): number {
  const s = speed < 0 ? -speed : speed
  return (speed - s * z) / (way + s * SETTLING)
}

const SETTLING = 0.06
