import type { Plan, Sail } from 'sim/plan/types'
import { between, type DeckPoint, direction, distance, type Tack, tackOf } from './frame'
import type { Moment } from './types'

/** Where the rope and the timber are, metres on deck. */
export interface RigGeometry {
  tack: Tack
  /** The part of the sheet the pull is taken from: deck block, and boom or clew. */
  sheetDeck: DeckPoint
  sheetBoom: DeckPoint
  /** Where the hitch lies on the straight part, and where the line has pulled it to. */
  hitchAtRest: DeckPoint
  hitch: DeckPoint
  leads: DeckPoint[]
  /** Control line from the sheet over its leads to the tiller. */
  line: DeckPoint[]
  stock: DeckPoint
  tillerTip: DeckPoint
  tillerLine: DeckPoint
  tillerElastic: DeckPoint
  elasticAnchor: DeckPoint
  /** End of the lanyard, where the cord itself begins. */
  cordFrom: DeckPoint
}

/** What of a moment moves the rope and the timber. */
export type RigMoment = Pick<Moment, 'boomDeg' | 'tillerDeg' | 'hitchOutM' | 'elasticStretchM'>

/** Boom block or clew, with the clew to starboard at positive angles. */
export function clewPoint(sail: Sail, boomDeg: number, reach: number): DeckPoint {
  const aft = direction(boomDeg)
  return { x: sail.luffX - reach * aft.x, y: reach * aft.y, z: sail.footZ }
}

/** Boom angle of a sail: as it lies, or amidships when it is stowed. */
export function boomAngle(moment: Pick<Moment, 'boomDeg'>, sailId: string): number {
  return moment.boomDeg[sailId] ?? 0
}

/** Side on which a sail is sheeted, 1 to starboard: to leeward, unless it is held to windward. */
export function sheetSide(plan: Plan, sailId: string): Tack {
  const tack = tackOf(plan.setup.conditions)
  const held = plan.setup.trim[sailId]?.held
  return held === 'pole' || held === 'backed' ? tack : tack === 1 ? -1 : 1
}

export function sheetLead(plan: Plan, sailId: string): DeckPoint | undefined {
  const sail = plan.boat.sails[sailId]
  if (!sail) return undefined
  return { x: sail.sheetX, y: sheetSide(plan, sailId) * sail.sheetY, z: sail.sheetZ }
}

/** Boom angle at which the sheet of a sail is trimmed to hold it. */
export function trimmedAngle(plan: Plan, sailId: string): number {
  return sheetSide(plan, sailId) * (plan.setup.trim[sailId]?.sheetAngleDeg ?? 0)
}

/** Where the hitch sits on its part, 0 at the deck block, 1 at the boom: made fast as trimmed. */
function hitchShare(plan: Plan, sail: Sail, deck: DeckPoint): number {
  const trimmed = clewPoint(sail, trimmedAngle(plan, plan.setup.source), sail.sheetReach)
  return Math.min(plan.setup.line.hitchDistance / Math.max(distance(deck, trimmed), 0.01), 0.98)
}

function tillerPoint(plan: Plan, tillerDeg: number, radius: number): DeckPoint {
  const ahead = direction(tillerDeg)
  return { x: radius * ahead.x, y: radius * ahead.y, z: plan.boat.tiller.height }
}

/** Undefined when the setup names a sheet the boat does not have. */
export function rigGeometry(plan: Plan, moment: RigMoment): RigGeometry | undefined {
  const { line, elastic, source } = plan.setup
  const sail = plan.boat.sails[source]
  const sheetDeck = sheetLead(plan, source)
  if (!sail || !sheetDeck) return undefined

  const tack = tackOf(plan.setup.conditions)
  const sheetBoom = clewPoint(sail, boomAngle(moment, source), sail.sheetReach)
  const leads = plan.setup.leads.map((lead) => ({ x: lead.x, y: tack * lead.y, z: lead.z }))
  const tillerLine = tillerPoint(plan, moment.tillerDeg, line.tillerRadius)
  const tillerElastic = tillerPoint(plan, moment.tillerDeg, elastic.tillerRadius)
  const elasticAnchor = { x: elastic.anchorX, y: -tack * elastic.anchorY, z: elastic.anchorZ }

  const hitchAtRest =
    line.pull === 'deflected'
      ? between(sheetDeck, sheetBoom, hitchShare(plan, sail, sheetDeck))
      : sheetDeck
  const towards = leads[0] ?? tillerLine
  const reach = distance(hitchAtRest, towards)
  const hitch =
    line.pull === 'deflected' && reach > 0
      ? between(hitchAtRest, towards, moment.hitchOutM / reach)
      : hitchAtRest

  const elasticSpan = distance(elasticAnchor, tillerElastic)
  const cord = elastic.naturalLength + Math.max(0, moment.elasticStretchM)
  const lanyard = elasticSpan > 0 ? Math.max(0, 1 - cord / elasticSpan) : 0

  return {
    tack,
    sheetDeck,
    sheetBoom,
    hitchAtRest,
    hitch,
    leads,
    line: [hitch, ...leads, tillerLine],
    stock: { x: 0, y: 0, z: plan.boat.tiller.height },
    tillerTip: tillerPoint(plan, moment.tillerDeg, plan.boat.tiller.length),
    tillerLine,
    tillerElastic,
    elasticAnchor,
    cordFrom: between(elasticAnchor, tillerElastic, lanyard),
  }
}

export function lengthOf(points: readonly DeckPoint[]): number {
  let length = 0
  points.forEach((point, index) => {
    const before = points[index - 1]
    if (before) length += distance(before, point)
  })
  return length
}

/** Angle between a pull and the square to the tiller, degrees: 0 pulls best, 90 does nothing. */
export function offSquareDeg(rig: RigGeometry, on: DeckPoint, from: DeckPoint): number {
  const tiller = { x: rig.tillerTip.x - rig.stock.x, y: rig.tillerTip.y - rig.stock.y }
  const pull = { x: from.x - on.x, y: from.y - on.y }
  const across = Math.abs(tiller.x * pull.y - tiller.y * pull.x)
  const along = Math.abs(tiller.x * pull.x + tiller.y * pull.y)
  return (Math.atan2(along, across) * 180) / Math.PI
}

/** Line and elastic at the tiller against square. */
export function tillerAngles(rig: RigGeometry): { line: number; elastic: number } {
  const last = rig.line[rig.line.length - 2] ?? rig.hitch
  return {
    line: offSquareDeg(rig, rig.tillerLine, last),
    elastic: offSquareDeg(rig, rig.tillerElastic, rig.elasticAnchor),
  }
}
