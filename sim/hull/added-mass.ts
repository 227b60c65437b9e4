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
 * Munk moment N = -(m22 - m11) u v, N m, which turns a drifting body across the stream.
 *
 * @source Munk 1924; Newman, Marine Hydrodynamics
 */
export function munkMoment(surgeMass: number, swayMass: number, u: number, v: number): number {
  return -(swayMass - surgeMass) * u * v
}
