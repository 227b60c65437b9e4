import { RHO_SEA } from '../constants'

/** Added mass in surge and sway, kg, and in yaw and roll, kg m^2. */
export interface AddedMass {
  surge: number
  sway: number
  yaw: number
  roll: number
}

/**
 * Added mass of the canoe body: in sway the half-ellipse strip pi/2 rho T^2 over the waterline, whose ends are
 * fined by pi/4; in surge a prolate spheroid's k1, close to .05 at the usual slenderness; in yaw the strips' second moment;
 * in roll .15 of the body's own inertia.
 *
 * @param length waterline, m
 * @param draught of the canoe body, m
 * @param mass kg
 * @param rollInertia of the body, kg m^2
 * @source strip theory; Lamb, R&M 623, for the spheroid; roll share from memory
 */
export function addedMass(
  length: number,
  draught: number,
  mass: number,
  rollInertia: number,
): AddedMass {
  const sway = ((Math.PI / 2) * RHO_SEA * draught * draught * length * Math.PI) / 4
  return {
    surge: 0.05 * mass,
    sway,
    yaw: (sway * length * length) / 16,
    roll: 0.15 * rollInertia,
  }
}

/**
 * Added mass in sway of a keel under the hull, kg: a flat plate moving square to itself, rho pi/4 c^2 b, brought down
 * for its short span, which the hull doubles.
 *
 * @param chord c, m
 * @param span b, m
 * @source plate strips with the aspect-ratio correction 1/sqrt(1 + (c/2b)^2); Brennen, added mass review 1982, from memory
 */
export function keelAddedMass(chord: number, span: number): number {
  const slenderness = chord / (2 * span)
  return ((Math.PI / 4) * RHO_SEA * chord * chord * span) / Math.sqrt(1 + slenderness * slenderness)
}

/**
 * Munk moment N = -(m22 - m11) u v, N m, which turns a drifting body across the stream.
 *
 * @source Munk 1924; Newman, Marine Hydrodynamics
 */
export function munkMoment(surgeMass: number, swayMass: number, u: number, v: number): number {
  return -(swayMass - surgeMass) * u * v
}
