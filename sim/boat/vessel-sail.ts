import { DEGREE, KNOT } from '../constants'
import { sin } from '../elementary'
import type { Plan } from '../plan/types'
import { type SailCurve, sailCurve } from '../sails/coefficients'
import { clothAngle, HEADSAIL_SHEET_SHARE, LEAST_ACROSS, sheetAcross } from '../sails/sheet'
import { windProfile } from '../wind/profile'

/** Slope of a forestay, horizontal over vertical; usual triangles lie near .31. */
const FORESTAY_RAKE = 0.31
/** Height of the centre of effort over the luff; triangles .33, with roach and gap near .4. */
const EFFORT_HEIGHT = 0.39
/** Chord on which the centre of pressure is placed, over the mean chord: the integral of c^2 over that of c, 4/3 for a triangle. */
const MOMENT_CHORD = 4 / 3
export type SailHold = 'sheet' | 'fixed'

/** One sail set, in SI and on the tack sailed. */
export interface VesselSail {
  id: string
  kind: 'main' | 'headsail' | 'mizzen' | 'steering'
  area: number
  /** Luff at the height of the centre of effort, forward of the centre of gravity, m. */
  luffFromCentre: number
  /** Gooseneck or tack forward of the rudder stock, m. */
  luffX: number
  /** Chord on which the centre of pressure is placed, m. */
  chord: number
  footZ: number
  effortHeight: number
  reach: number
  curve: SailCurve
  /** Wind at the centre of effort over that at 10 m. */
  profile: number
  /** How far out the sheet lets the boom go, rad, not negative. */
  limit: number
  hold: SailHold
  /** Boom angle at which a fixed sail is held, rad, positive to starboard. */
  heldAt: number
  /** Share of the sheet's length that works across the boom. */
  across: number
  /** Sheet tension per part over the sail's moment about its luff, 1/m. */
  tensionOverMoment: number
  parts: number
  sheetX: number
  sheetY: number
  sheetZ: number
}

/** A sail's area and height after taking in a part of it, percent: foot and luff shrink alike. */
function reefedArea(area: number, percent: number): number {
  return area * (1 - percent / 100)
}

function effortHeight(footZ: number, luff: number, percent: number): number {
  return footZ + EFFORT_HEIGHT * luff * Math.sqrt(1 - percent / 100)
}

/** One sail of a plan on a tack, or undefined while it is stowed. */
export function vesselSail(plan: Plan, id: string, tack: 1 | -1): VesselSail | undefined {
  const sail = plan.boat.sails[id]
  const trim = plan.setup.trim[id]
  if (!sail || !trim || trim.set === 'no') return undefined
  const { hull } = plan.boat
  const limit = trim.sheetAngleDeg * DEGREE
  const windward = trim.held === 'pole' || trim.held === 'backed'
  const heldAt = (windward ? tack : -tack) * limit
  const height = effortHeight(sail.footZ, sail.luffLength, trim.reef)
  // A clew held to windward has its sheet led down the windward side.
  const sheetY = (windward ? tack : -tack) * sail.sheetY
  const geometric = sheetAcross(
    sail.luffX,
    sail.sheetReach,
    sail.footZ,
    heldAt,
    sail.sheetX,
    sheetY,
    sail.sheetZ,
  )
  const soft = sail.kind === 'headsail'
  const across = Math.max(geometric, soft ? sin(clothAngle(sail.camber)) : LEAST_ACROSS)
  const rake = soft ? FORESTAY_RAKE * (height - sail.footZ) : 0
  return {
    id,
    kind: sail.kind,
    area: reefedArea(sail.area, trim.reef),
    luffFromCentre: sail.luffX - rake - hull.centreOfGravityX,
    luffX: sail.luffX,
    chord: MOMENT_CHORD * (sail.area / sail.luffLength) * Math.sqrt(1 - trim.reef / 100),
    footZ: sail.footZ,
    effortHeight: height,
    reach: sail.sheetReach,
    curve: sailCurve(sail.luffLength, sail.area, sail.camber),
    profile: windProfile(height, plan.setup.conditions.trueWindSpeedKn * KNOT),
    limit,
    hold: trim.held === 'sheet' ? 'sheet' : 'fixed',
    heldAt,
    across,
    tensionOverMoment:
      (soft ? HEADSAIL_SHEET_SHARE : 1) / (sail.sheetParts * sail.sheetReach * across),
    parts: sail.sheetParts,
    sheetX: sail.sheetX,
    sheetY,
    sheetZ: sail.sheetZ,
  }
}
