import type { Plan, Sail } from 'sim/plan/types'
import { clamp, direction, type Point } from './frame'
import { mastX } from './hull-outline'
import type { Moment } from './types'

/**
 * A sail seen from above as a sailmaker draws it: the foot and three sections over it. Boom angle,
 * camber, foot and luff come from the plan and the run; twist and roach are drawn, not computed.
 */
export interface SailShape {
  /** Foot first, head last; each from luff to leech. */
  sections: Point[][]
  /** Leech from clew to head. */
  leech: Point[]
  /** The whole cloth as seen from above. */
  cloth: Point[]
  /** From the mast to the boom's end; a headsail has none. */
  boom: [Point, Point] | undefined
  clew: Point
}

const sectionHeights = [0, 0.3, 0.58, 0.82] as const
const pointsPerSection = 15
/** Boom beyond the clew, over the foot. */
const boomOverFoot = 1.05
const twistDeg = { main: 13, headsail: 11, mizzen: 10, steering: 6 } as const
const roach = { main: 0.07, headsail: -0.02, mizzen: 0.06, steering: 0.02 } as const
/** Below this a sail is drawn rippling. */
const ripplesBelow = 0.3

export type SailMoment = Pick<
  Moment,
  'timeS' | 'boomDeg' | 'drawing' | 'reef' | 'apparentWindAngleDeg'
>

/** -1..1: which side of the chord is to leeward, and 0 while the wind runs along it. */
function leewardSide(boomDeg: number, apparentWindAngleDeg: number): number {
  const wind = direction(apparentWindAngleDeg)
  const aft = direction(boomDeg)
  return clamp((wind.x * aft.y + wind.y * aft.x) * 6, -1, 1)
}

/** How far the luff at the head lies abaft the luff at the foot, metres. */
function luffRake(plan: Plan, sail: Sail): number {
  if (sail.kind !== 'headsail') return 0.02 * sail.luffLength
  return Math.max(0, sail.luffX - mastX(plan.boat)) * 0.9
}

export function sailShape(plan: Plan, sailId: string, moment: SailMoment): SailShape | undefined {
  const sail = plan.boat.sails[sailId]
  if (!sail) return undefined
  const boomDeg = moment.boomDeg[sailId] ?? 0
  const drawing = moment.drawing[sailId] ?? 0
  const leeward = leewardSide(boomDeg, moment.apparentWindAngleDeg)
  const left = Math.sqrt(1 - clamp(moment.reef[sailId] ?? 0, 0, 95) / 100)
  const foot = sail.footLength * left
  const rake = luffRake(plan, sail) * left
  const flogging = clamp((ripplesBelow - drawing) / ripplesBelow, 0, 1)
  const fullness = sail.camber * (0.3 + 0.7 * drawing) * leeward

  const sections = sectionHeights.map((height) => {
    const chord = foot * ((1 - height) ** 0.9 + roach[sail.kind] * 4 * height * (1 - height))
    const twist = twistDeg[sail.kind] * height * leeward * (0.35 + 0.65 * drawing)
    const aft = direction(boomDeg - twist)
    const luff = { x: sail.luffX - rake * height, y: 0 }
    return section(luff, aft, chord, fullness, flogging, moment.timeS + height)
  })
  const head = { x: sail.luffX - rake, y: 0 }
  const leech = [...sections.map((points) => points[points.length - 1] ?? head), head]
  const footSection = sections[0] ?? []
  const aft = direction(boomDeg)
  const boomLength = sail.footLength * boomOverFoot
  return {
    sections,
    leech,
    cloth: [...footSection, ...leech.slice(1)],
    boom:
      sail.kind === 'headsail'
        ? undefined
        : [
            { x: sail.luffX, y: 0 },
            { x: sail.luffX - boomLength * aft.x, y: boomLength * aft.y },
          ],
    clew: leech[0] ?? head,
  }
}

/** Deepest at two fifths of the chord; `leeward` is the side the belly lies on, times camber. */
function section(
  luff: Point,
  aft: Point,
  chord: number,
  fullness: number,
  flogging: number,
  timeS: number,
): Point[] {
  const points: Point[] = []
  for (let index = 0; index < pointsPerSection; index++) {
    const along = index / (pointsPerSection - 1)
    const belly = 4 * along * (1 - along) * (1 + 0.45 * (1 - 2 * along)) * fullness
    const ripple = 0.075 * flogging * along * Math.sin(2 * Math.PI * (2.2 * along - 1.1 * timeS))
    const out = (belly + ripple) * chord
    points.push({
      x: luff.x - aft.x * chord * along - aft.y * out,
      y: luff.y + aft.y * chord * along - aft.x * out,
    })
  }
  return points
}
