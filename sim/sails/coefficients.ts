import { DEGREE } from '../constants'
import { cos, sin } from '../elementary'
import { helmboldSlope } from '../foils/section'
import { smoothStep } from '../numbers'

/** Constants of one sail's curve, fixed by its shape. */
export interface SailCurve {
  /** Finite-span lift slope, per rad. */
  slope: number
  /** Incidence of zero lift below the chord, rad, from the camber. */
  zeroLift: number
  /** Effective aspect ratio for induced drag. */
  aspect: number
}

/**
 * @param luff m
 * @param area m^2
 * @param camber f/c
 * @source slope: Helmbold, of which a soft sail keeps about .82 (estimate, so that it lifts most at 15 to 25 degrees); zero lift of a circular arc -2 f (Schlichting & Truckenbrodt eq. 2-36), of which a
 *   soft sail with a separation bubble keeps about .7 (estimate)
 */
export function sailCurve(luff: number, area: number, camber: number): SailCurve {
  const aspect = (1.1 * luff * luff) / area
  return { slope: SOFT_SLOPE * helmboldSlope(aspect), zeroLift: 0.7 * 2 * camber, aspect }
}

const SOFT_SLOPE = 0.82
const SKIN_DRAG = 0.02
/** Drag of flogging cloth on its area; flags of cloth lie between .05 and .15, from memory. */
const FLOGGING_DRAG = 0.1
const LUFFS_AT = 1 * DEGREE
const FULL_AT = 8 * DEGREE
const STALL_BEGINS = 12 * DEGREE
const STALL_ENDS = 28 * DEGREE

/** How full a sail is: 0 flogging, 1 drawing, from its incidence in radians. */
export function fullness(incidence: number): number {
  return smoothStep(LUFFS_AT, FULL_AT, Math.abs(incidence))
}

/**
 * How far a sail twists as its boom goes out and the sheet no longer holds the leech down, 0..1: head and foot then no
 * longer work at the best incidence together. What it costs below is chosen so that the best trim at 80 and 100 degrees
 * stays inside Hazen's envelope.
 */
function twist(boomAngle: number): number {
  return smoothStep(15 * DEGREE, 80 * DEGREE, Math.abs(boomAngle))
}

/**
 * Normal coefficient of a stalled soft sail. It keeps a plateau from the stall nearly to square on
 * (Hazen's totals, sqrt(CL^2 + CD^2) = 1.24 at 80 and 1.31 at 100 degrees), and falls as the wind comes by the lee,
 * when the leech leads (Hazen's run: .9). A twisted sail stalls a little lower, until it stands square to the wind.
 */
function stalledNormal(incidence: number, boomAngle: number): number {
  const square = smoothStep(50 * DEGREE, 80 * DEGREE, incidence)
  const plateau = 1.28 - 0.125 * square - 1.155 * smoothStep(80 * DEGREE, 160 * DEGREE, incidence)
  return plateau * (1 - 0.2 * twist(boomAngle) * (1 - square))
}

/**
 * Lift coefficient of a soft sail at fixed trim against its incidence; odd, so that a sail held aback
 * pushes the other way.
 *
 * @param incidence apparent wind against the chord, rad, in (-pi, pi]
 * @param boomAngle rad
 */
export function sailLift(incidence: number, boomAngle: number, curve: SailCurve): number {
  const a = Math.abs(incidence)
  const full = fullness(a)
  if (full === 0) return 0
  const stalled = smoothStep(STALL_BEGINS, STALL_ENDS, a)
  const attached =
    stalled < 1 ? curve.slope * (a + curve.zeroLift) * (1 - 0.5 * twist(boomAngle)) : 0
  const lift = (1 - stalled) * attached + stalled * stalledNormal(a, boomAngle) * cos(a)
  return incidence < 0 ? -full * lift : full * lift
}

/**
 * Drag coefficient that goes with sailLift: cloth, induced, stalled, flogging.
 *
 * @param lift from sailLift
 */
export function sailDrag(
  incidence: number,
  lift: number,
  boomAngle: number,
  curve: SailCurve,
): number {
  const a = Math.abs(incidence)
  const full = fullness(a)
  const stalled = smoothStep(STALL_BEGINS, STALL_ENDS, a)
  const induced = (lift * lift) / (Math.PI * curve.aspect)
  const separated = stalledNormal(a, boomAngle) * sin(a)
  return (
    SKIN_DRAG + FLOGGING_DRAG * (1 - full) + (1 - stalled) * induced + full * stalled * separated
  )
}

/**
 * Centre of pressure behind the luff over the chord: near .37 while drawing, at mid-chord square on,
 * and nearer the leech when that leads.
 *
 * @source thin circular arc f = .10: .3835 at 10 degrees; inclined plates: .5 at 90 (Rayleigh, Joessel)
 */
export function sailCentre(incidence: number): number {
  const s = sin(Math.abs(incidence))
  return Math.abs(incidence) <= Math.PI / 2 ? 0.34 + 0.16 * s : 0.66 - 0.16 * s
}
