import type { Boat } from 'sim/plan/types'
import type { Point } from './frame'

/**
 * The deck seen from above. Half of it is two cubic curves that meet at the widest station with
 * their tangents fore and aft, so that the line is fair; what differs by type of boat is where
 * she is widest, how broad the transom is and how much it is rounded. These shapes are drawn,
 * not measured: the model knows length, beam and stem only.
 */
interface Form {
  /** Widest station, part of the length from the stem. */
  widest: number
  /** Transom half-breadth over the half-beam. */
  transom: number
  /** How far the transom is rounded aft, over its half-breadth. */
  round: number
  /** Fullness of the bow: half-breadth of the first control point over the half-beam. */
  bow: number
}

const formByRudder: Record<Boat['rudder']['kind'], Form> = {
  'keel-hung': { widest: 0.53, transom: 0.54, round: 0.24, bow: 0.36 },
  skeg: { widest: 0.56, transom: 0.64, round: 0.14, bow: 0.3 },
  spade: { widest: 0.6, transom: 0.74, round: 0.1, bow: 0.26 },
  outboard: { widest: 0.62, transom: 0.76, round: 0.04, bow: 0.24 },
}

/** Cubic Bezier curve. */
export type Cubic = readonly [Point, Point, Point, Point]

export interface HullOutline {
  stem: Point
  sternX: number
  halfBeam: number
  /** Starboard half: stem to the widest station, then to the transom corner. */
  starboard: readonly [Cubic, Cubic]
  /** Aftmost control point of the rounded transom, on the centreline. */
  transomRound: Point
  cockpit: { aftX: number; foreX: number; aftHalf: number; foreHalf: number }
  roof: { aftX: number; foreX: number; aftHalf: number; foreHalf: number }
  hatch: { x: number; half: number }
}

/** The foremost mast: a mainsail's luff, or the middle of the boat where there is none. */
export function mastX(boat: Boat): number {
  const luffs = Object.values(boat.sails)
    .filter((sail) => sail.kind === 'main')
    .map((sail) => sail.luffX)
  return luffs.length ? Math.max(...luffs) : boat.hull.bowX - boat.hull.lengthOverall * 0.4
}

export function hullOutline(boat: Boat): HullOutline {
  const { lengthOverall, beamOverall, bowX } = boat.hull
  const form = formByRudder[boat.rudder.kind]
  const halfBeam = beamOverall / 2
  const sternX = bowX - lengthOverall
  const widestX = bowX - form.widest * lengthOverall
  const transomHalf = form.transom * halfBeam
  const fore = bowX - widestX
  const aft = widestX - sternX
  const stem = { x: bowX, y: 0 }
  const widest = { x: widestX, y: halfBeam }
  const corner = { x: sternX, y: transomHalf }

  const cockpitAft = Math.max(sternX + 0.22, 0.1)
  const cockpitFore = Math.min(
    cockpitAft + Math.max(1.75 * boat.tiller.length, 0.22 * lengthOverall),
    mastX(boat) - 0.12 * lengthOverall,
  )
  const roofFore = Math.min(mastX(boat) + 0.09 * lengthOverall, bowX - 0.2 * lengthOverall)

  return {
    stem,
    sternX,
    halfBeam,
    starboard: [
      [
        stem,
        { x: bowX - 0.2 * fore, y: form.bow * halfBeam },
        { x: widestX + 0.46 * fore, y: halfBeam },
        widest,
      ],
      [
        widest,
        { x: widestX - 0.44 * aft, y: halfBeam },
        { x: sternX + 0.34 * aft, y: transomHalf + 0.6 * (halfBeam - transomHalf) },
        corner,
      ],
    ],
    transomRound: { x: sternX - form.round * transomHalf, y: 0 },
    cockpit: {
      aftX: cockpitAft,
      foreX: cockpitFore,
      aftHalf: 0.66 * transomHalf,
      foreHalf: 0.56 * halfBeam,
    },
    roof: {
      aftX: cockpitFore,
      foreX: roofFore,
      aftHalf: 0.64 * halfBeam,
      foreHalf: 0.36 * halfBeam,
    },
    hatch: { x: (roofFore + bowX) / 2 - 0.06 * lengthOverall, half: 0.28 },
  }
}

function cubicAt(curve: Cubic, t: number): Point {
  const [a, b, c, d] = curve
  const s = 1 - t
  const [wa, wb, wc, wd] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t]
  return {
    x: wa * a.x + wb * b.x + wc * c.x + wd * d.x,
    y: wa * a.y + wb * b.y + wc * c.y + wd * d.y,
  }
}

/** Half-breadth of the deck at a station; 0 ahead of the stem and abaft the transom. */
export function halfBreadthAt(outline: HullOutline, x: number): number {
  if (x >= outline.stem.x || x < outline.sternX) return 0
  const curve = outline.starboard.find((part) => x >= part[3].x)
  if (!curve) return 0
  let [low, high] = [0, 1]
  for (let halving = 0; halving < 24; halving++) {
    const middle = (low + high) / 2
    if (cubicAt(curve, middle).x > x) low = middle
    else high = middle
  }
  return cubicAt(curve, (low + high) / 2).y
}
