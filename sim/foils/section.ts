import { RHO_SEA } from '../constants'
import { cos, sin } from '../elementary'
import { smoothStep } from '../numbers'

/**
 * Lift slope of a low-aspect foil, per rad:
 * 1.8 pi a / (1.8 + cos L sqrt(a^2/cos^4 L + 4)).
 *
 * @param aspect effective aspect ratio a (twice the geometric one on a hull)
 * @param sweep L, rad at the quarter chord
 * @source Whicker & Fehlner 1958, DTMB report 933
 */
export function liftSlope(aspect: number, sweep = 0): number {
  const c = cos(sweep)
  return (1.8 * Math.PI * aspect) / (1.8 + c * Math.sqrt((aspect * aspect) / (c * c * c * c) + 4))
}

/** Lift slope of a wing by Helmbold, per rad: 2 pi a / (2 + sqrt(a^2 + 4)). Used for sails. */
export function helmboldSlope(aspect: number): number {
  return (2 * Math.PI * aspect) / (2 + Math.sqrt(aspect * aspect + 4))
}

/**
 * Moment of a turning foil about its quarter chord over speed and rate of turn, kg m: it resists the turn by
 * (pi/16) rho U c^3 b r in two dimensions, brought down by the finite span as the lift is. The foil's incidence
 * is felt at three quarters of the chord.
 *
 * @param slope lift slope, per rad
 * @param chord c, m
 * @param span b, m
 * @source thin-aerofoil theory with pitch rate; Katz & Plotkin, Low-Speed Aerodynamics, section 5.6, from memory
 */
export function turnDamping(slope: number, chord: number, span: number): number {
  return (Math.PI / 16) * RHO_SEA * chord * chord * chord * span * (slope / (2 * Math.PI))
}

/** Section drag at zero lift; Whicker & Fehlner 1958. */
export const FOIL_DRAG = 0.0065
/** Span efficiency; Whicker & Fehlner 1958. */
const SPAN_EFFICIENCY = 0.9
const STALL_BEGINS = 0.36
const STALL_ENDS = 0.62

/** Share of a foil that is stalled, 0..1, at an incidence in radians. */
export function stalledShare(incidence: number): number {
  return smoothStep(STALL_BEGINS, STALL_ENDS, Math.abs(incidence))
}

/**
 * Normal coefficient of a stalled plate of finite span, odd in sin(incidence):
 * Hoerner's 1/(.222 + .283/sin a), brought from 1.98 down to 1.15 square on.
 *
 * @source Hoerner, Fluid-Dynamic Drag; finite span 1.11 + .018 a, Viterna & Corrigan 1982
 */
function stalledNormal(sine: number): number {
  return (1.15 * 0.505 * sine) / (0.283 + 0.222 * Math.abs(sine))
}

/**
 * Lift coefficient through stall and beyond, odd in the incidence.
 *
 * @param incidence rad, any
 * @param slope per rad
 */
export function foilLift(incidence: number, slope: number): number {
  const s = sin(incidence)
  const c = cos(incidence)
  const stalled = stalledShare(incidence)
  return c * ((1 - stalled) * slope * s + stalled * stalledNormal(s))
}

/**
 * Drag coefficient: section, induced and stalled.
 *
 * @param incidence rad
 * @param lift coefficient from foilLift
 * @param aspect effective aspect ratio
 */
export function foilDrag(incidence: number, lift: number, aspect: number): number {
  const s = sin(incidence)
  const stalled = stalledShare(incidence)
  const induced = (lift * lift) / (SPAN_EFFICIENCY * Math.PI * aspect)
  return FOIL_DRAG + (1 - stalled) * induced + stalled * s * stalledNormal(s)
}

/** Centre of pressure behind the leading edge over the chord: .22 attached (Whicker & Fehlner), to mid-chord when stalled. */
export function foilCentre(incidence: number): number {
  const s = sin(incidence)
  return 0.22 + 0.22 * stalledShare(incidence) + 0.06 * s * s
}
