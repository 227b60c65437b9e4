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
 * @source slope: Helmbold; zero lift of a circular arc -2 f (Schlichting & Truckenbrodt eq. 2-36), of which a
 *   soft sail with a separation bubble keeps about .7 (estimate)
 */
export function sailCurve(luff: number, area: number, camber: number): SailCurve {
  const aspect = (1.1 * luff * luff) / area
  return { slope: helmboldSlope(aspect), zeroLift: 0.7 * 2 * camber, aspect }
}

const SKIN_DRAG = 0.02
/** Drag of flogging cloth on its area; flags of cloth lie between .05 and .15, from memory. */
const FLOGGING_DRAG = 0.1
const LUFFS_AT = 1 * DEGREE
const FULL_AT = 8 * DEGREE
const STALL_BEGINS = 8 * DEGREE
const STALL_ENDS = 24 * DEGREE

/** How full a sail is: 0 flogging, 1 drawing, from its incidence in radians. */
export function fullness(incidence: number): number {
  return smoothStep(LUFFS_AT, FULL_AT, Math.abs(incidence))
}

/**
 * Normal coefficient of a stalled soft sail. It keeps a plateau from the stall nearly to square on
 * (Hazen's totals, sqrt(CL^2 + CD^2) = 1.24 at 80 and 1.31 at 100 degrees), and falls as the wind comes by the lee,
 * when the leech leads (Hazen's run: .9).
 */
function stalledNormal(incidence: number): number {
  return (
    1.28 -
    0.125 * smoothStep(50 * DEGREE, 80 * DEGREE, incidence) -
    1.155 * smoothStep(80 * DEGREE, 160 * DEGREE, incidence)
  )
}

/**
 * Part of the attached lift that is left when the boom is far out: the sheet no longer holds the leech down,
 * the sail twists, and its head and foot no longer work at the best incidence together.
 * Chosen so that the best trim at 80 and 100 degrees stays inside Hazen's envelope.
 */
function twistLoss(boomAngle: number): number {
  return 1 - 0.36 * smoothStep(15 * DEGREE, 65 * DEGREE, Math.abs(boomAngle))
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
  const attached = stalled < 1 ? curve.slope * (a + curve.zeroLift) * twistLoss(boomAngle) : 0
  const lift = (1 - stalled) * attached + stalled * stalledNormal(a) * cos(a)
  return incidence < 0 ? -full * lift : full * lift
}

/**
 * Drag coefficient that goes with sailLift: cloth, induced, stalled, flogging.
 *
 * @param lift from sailLift
 */
export function sailDrag(incidence: number, lift: number, curve: SailCurve): number {
  const a = Math.abs(incidence)
  const full = fullness(a)
  const stalled = smoothStep(STALL_BEGINS, STALL_ENDS, a)
  const induced = (lift * lift) / (Math.PI * curve.aspect)
  const separated = stalledNormal(a) * sin(a)
  return (
    SKIN_DRAG + FLOGGING_DRAG * (1 - full) + (1 - stalled) * induced + full * stalled * separated
  )
}

/**
 * Centre of pressure behind the luff over the chord: near .4 while drawing, at mid-chord square on,
 * and nearer the leech when that leads.
 *
 * @source thin circular arc f = .10: .3835 at 10 degrees; inclined plates: .5 at 90 (Rayleigh, Joessel)
 */
export function sailCentre(incidence: number): number {
  const s = sin(Math.abs(incidence))
  return Math.abs(incidence) <= Math.PI / 2 ? 0.38 + 0.12 * s : 0.62 - 0.12 * s
}
