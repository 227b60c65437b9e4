import { atan2, cos, hypot, sin } from '../elementary'
import type { Plan } from '../plan/types'
import { leadExponent } from '../steering/leads'
import { ropeStrength } from '../steering/rope'
import type { VesselSail } from './vessel-sail'

/** Geometry and stiffness of control line and elastic, SI, deck frame (y to starboard), on the tack sailed. */
export interface ControlLine {
  tail: boolean
  /** Deck block of the sheet part. */
  blockX: number
  blockY: number
  blockZ: number
  /** Where the hitch sits along the part, 0 at the deck block, 1 at the boom. */
  hitchShare: number
  /** First and last lead. */
  firstX: number
  firstY: number
  firstZ: number
  lastX: number
  lastY: number
  lastZ: number
  /** Boom point's distance aft of the luff, its luff and height. */
  luffX: number
  reach: number
  boomZ: number
  parts: number
  tillerRadius: number
  tillerZ: number
  takeUp: number
  /** Distance from the undeflected hitch to the first lead, and from the last lead to the tiller, as rigged. */
  hitchToLeadAtRest: number
  leadToTillerAtRest: number
  /** Boom angle as trimmed, rad. */
  boomAtRest: number
  /** Axial stiffness, N/m. */
  stiffness: number
  /** Sum of the leads' friction exponents. */
  exponent: number
  elastic: {
    anchorX: number
    anchorY: number
    anchorZ: number
    tillerRadius: number
    distanceAtRest: number
    stretch: number
    naturalLength: number
    area: number
    modulus: number
    hysteresis: number
  }
}

interface Point {
  x: number
  y: number
  z: number
}

/** Turning of a line at `at` on its way from `from` to `to`, rad. */
export function turningAngle(from: Point, at: Point, to: Point): number {
  const a = { x: at.x - from.x, y: at.y - from.y, z: at.z - from.z }
  const b = { x: to.x - at.x, y: to.y - at.y, z: to.z - at.z }
  const product = hypot(a.x, a.y, a.z) * hypot(b.x, b.y, b.z)
  if (product === 0) return 0
  const cosine = (a.x * b.x + a.y * b.y + a.z * b.z) / product
  return atan2(Math.sqrt(Math.max(0, 1 - cosine * cosine)), cosine)
}

function distance(a: Point, b: Point): number {
  return hypot(a.x - b.x, a.y - b.y, a.z - b.z)
}

export function controlLineOf(
  plan: Plan,
  source: VesselSail | undefined,
  tack: 1 | -1,
): ControlLine {
  const { setup, boat } = plan
  const { line, elastic } = setup
  const leads = setup.leads.map((lead) => ({ x: lead.x, y: tack * lead.y, z: lead.z }))
  const first = leads[0] as Point
  const last = leads[leads.length - 1] as Point
  const tiller = { x: line.tillerRadius, y: 0, z: boat.tiller.height }
  const block = source
    ? { x: source.sheetX, y: source.sheetY, z: source.sheetZ }
    : { x: first.x, y: first.y - tack, z: first.z }
  const boom = source
    ? {
        x: source.luffX - source.reach * cos(source.heldAt),
        y: source.reach * sin(source.heldAt),
        z: source.footZ,
      }
    : { ...block, z: block.z + 1 }
  const tail = line.pull === 'tail'
  const part = Math.max(distance(block, boom), 0.01)
  const share = Math.min(line.hitchDistance / part, 0.98)
  const hitch = {
    x: block.x + share * (boom.x - block.x),
    y: block.y + share * (boom.y - block.y),
    z: block.z + share * (boom.z - block.z),
  }
  const hitchToLead = distance(hitch, first)
  const out = Math.max(0, Math.min(line.takeUp, hitchToLead - 0.02)) / Math.max(hitchToLead, 0.02)
  const pulled = {
    x: hitch.x + out * (first.x - hitch.x),
    y: hitch.y + out * (first.y - hitch.y),
    z: hitch.z + out * (first.z - hitch.z),
  }
  const route = [tail ? block : pulled, ...leads, tiller]
  const turning = setup.leads.map((_, i) =>
    turningAngle(route[i] as Point, route[i + 1] as Point, route[i + 2] as Point),
  )
  let exponent = tail ? leadExponent('ball', turningAngle(boom, block, first)) : 0
  setup.leads.forEach((lead, i) => {
    exponent += leadExponent(lead.kind, turning[i] as number)
  })
  let length = tail ? part * (source?.parts ?? 1) : 0
  for (let i = 1; i < route.length; i++)
    length += distance(route[i - 1] as Point, route[i] as Point)
  const anchor = { x: elastic.anchorX, y: -tack * elastic.anchorY, z: elastic.anchorZ }
  const elasticPoint = { x: elastic.tillerRadius, y: 0, z: boat.tiller.height }
  const radius = elastic.diameterMm / 2000
  return {
    tail,
    blockX: block.x,
    blockY: block.y,
    blockZ: block.z,
    hitchShare: share,
    firstX: first.x,
    firstY: first.y,
    firstZ: first.z,
    lastX: last.x,
    lastY: last.y,
    lastZ: last.z,
    luffX: source?.luffX ?? 0,
    reach: source?.reach ?? 1,
    boomZ: source?.footZ ?? 1,
    parts: source?.parts ?? 1,
    tillerRadius: line.tillerRadius,
    tillerZ: boat.tiller.height,
    takeUp: line.takeUp,
    hitchToLeadAtRest: hitchToLead,
    leadToTillerAtRest: distance(last, tiller),
    boomAtRest: source?.heldAt ?? 0,
    stiffness: ropeStrength(line.diameterMm, line.material).axialStiffness / Math.max(length, 0.2),
    exponent,
    elastic: {
      anchorX: anchor.x,
      anchorY: anchor.y,
      anchorZ: anchor.z,
      tillerRadius: elastic.tillerRadius,
      distanceAtRest: distance(anchor, elasticPoint),
      stretch: elastic.stretch,
      naturalLength: elastic.naturalLength,
      area: elastic.strands * Math.PI * radius * radius,
      modulus: elastic.modulus * 1e6,
      hysteresis: elastic.hysteresis,
    },
  }
}
