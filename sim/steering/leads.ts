import { exp, log, sin } from '../elementary'

/** Unit tension T over leads: what each takes from it, as a friction exponent ln(T_in/T_out). */

/** Loss at a half turn of a sheave; Toss, The Complete Rigger's Apprentice: 2 % on balls, 3 to 10 % on plain bearings. */
const SHEAVE_LOSS = { ball: 0.02, plain: 0.08 } as const
/** Friction of polyester line on a smooth fairlead and on bare wood or gelcoat; usual range .1 to .3, from memory. */
const RUBBING = { fairlead: 0.14, rub: 0.25 } as const

/** Kinds of lead: two sheaves, two things to rub on. */
export type LeadKind = keyof typeof SHEAVE_LOSS | keyof typeof RUBBING

/** Capstan ratio of tensions e^(mu theta); Eytelwein. */
export function capstan(friction: number, turning: number): number {
  return exp(friction * turning)
}

/** Load on a block over the line's tension: 2 sin(theta/2). */
export function blockLoad(turning: number): number {
  return 2 * sin(turning / 2)
}

/**
 * Friction exponent of one lead. A sheave's loss is taken in proportion to the load on it (derivation, not published);
 * a rubbing lead follows the capstan law.
 *
 * @param turning angle through which the line turns, rad, 0..pi
 */
export function leadExponent(kind: LeadKind, turning: number): number {
  if (kind === 'ball' || kind === 'plain') {
    return -log(1 - (SHEAVE_LOSS[kind] * blockLoad(turning)) / 2)
  }
  return RUBBING[kind] * turning
}
