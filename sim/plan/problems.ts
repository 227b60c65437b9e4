/** Refusals of a plan before a run starts: every value in its range, and what only several values together tell. */

import { RHO_SEA } from '../constants'
import { cos, hypot, sin } from '../elementary'
import { sheetAcross } from '../sails/sheet'
import { checkValue, keysOf, parameterAt, readValue } from './keys'
import type { Plan, Sail } from './types'

/** One refusal: the key, the value given, and in words with the allowed range where there is one. */
export interface Problem {
  key: string
  given: unknown
  message: string
  min?: number
  max?: number
}

interface Point {
  x: number
  y: number
  z: number
}

/** Shortest distance at which two points of a line are still two points, m. */
const LEAST_LENGTH = 0.03

/** Everything that forbids a run, in the order of the parameters; empty when the plan may be sailed. */
export function problemsOf(plan: Plan): Problem[] {
  const single = outOfRange(plan)
  // Geometry is only worth reading once each value by itself can be.
  return single.length > 0
    ? single
    : [...hullProblems(plan), ...sailProblems(plan), ...lineProblems(plan)]
}

function outOfRange(plan: Plan): Problem[] {
  const problems: Problem[] = []
  for (const key of keysOf(plan)) {
    const parameter = parameterAt(plan, key)
    if (!parameter) continue
    const given = readValue(plan, key)
    const message = checkValue(key, parameter, given)
    if (!message) continue
    const range =
      parameter.type === 'quantity' ? { min: parameter.min, max: parameter.max } : undefined
    problems.push({ key, given, message, ...range })
  }
  return problems
}

/** Closest angle to the wind that may be asked; no sail draws closer. */
const CLOSEST_COURSE = 25
/** Part of the box of waterline, beam and draught that a canoe body fills; usual hulls lie between .35 and .55. */
const BLOCK = { min: 0.2, max: 0.75 }
/** Largest strain of the elastic as rigged; its jacket locks near 1. */
const MOST_STRAIN = 1.2
/** Share of a sheet that must work across a boom eased right out, or it can hold nothing. */
const LEAST_SHARE = 0.3

function hullProblems({ boat, setup }: Plan): Problem[] {
  const problems: Problem[] = []
  const { hull } = boat
  const course = setup.conditions.trueWindAngleDeg
  if (Math.abs(course) < CLOSEST_COURSE) {
    problems.push({
      key: 'conditions.trueWindAngleDeg',
      given: course,
      message: `conditions.trueWindAngleDeg must be ${CLOSEST_COURSE} to 180 deg off the wind on either side: no sail draws closer`,
    })
  }
  if (hull.waterlineLength > hull.lengthOverall) {
    problems.push({
      key: 'hull.waterlineLength',
      given: hull.waterlineLength,
      message: `hull.waterlineLength must be from 3.5 to ${hull.lengthOverall} m: the boat is no longer than that`,
      min: 3.5,
      max: hull.lengthOverall,
    })
  }
  const longest = round(boat.keel.span * hull.waterlineLength)
  if (boat.keel.area > longest) {
    problems.push({
      key: 'keel.area',
      given: boat.keel.area,
      message: `keel.area must be from 0.2 to ${longest} m2 at this depth: the keel is no longer than the waterline`,
      min: 0.2,
      max: longest,
    })
  }
  const box = RHO_SEA * hull.waterlineLength * hull.waterlineBeam * hull.canoeBodyDraught
  const min = Math.ceil(BLOCK.min * box)
  const max = Math.floor(BLOCK.max * box)
  if (hull.displacement < min || hull.displacement > max) {
    problems.push({
      key: 'hull.displacement',
      given: hull.displacement,
      message: `hull.displacement must be from ${min} to ${max} kg for this waterline, beam and draught`,
      min,
      max,
    })
  }
  return problems
}

function sailProblems({ boat, setup }: Plan): Problem[] {
  const problems: Problem[] = []
  if (setup.boatId !== boat.id) {
    problems.push({
      key: 'boatId',
      given: setup.boatId,
      message: `boatId must be the boat's own, ${boat.id}`,
    })
  }
  for (const id of Object.keys(setup.trim)) {
    if (!Object.hasOwn(boat.sails, id)) {
      problems.push({ key: `trim.${id}`, given: id, message: `the boat has no sail called ${id}` })
    }
  }
  for (const [id, sail] of Object.entries(boat.sails)) {
    const longest = round(1.05 * sail.footLength)
    if (sail.sheetReach > longest) {
      problems.push({
        key: `sails.${id}.sheetReach`,
        given: sail.sheetReach,
        message: `sails.${id}.sheetReach must be from 0.2 to ${longest} m: the foot is no longer`,
        min: 0.2,
        max: longest,
      })
    }
    const trim = setup.trim[id]
    if (trim?.set !== 'yes') continue
    if (sail.kind !== 'headsail' && (trim.held === 'pole' || trim.held === 'backed')) {
      problems.push({
        key: `trim.${id}.held`,
        given: trim.held,
        message: `trim.${id}.held must be sheet or preventer: only a headsail is held to windward`,
      })
    }
    if (sail.kind !== 'headsail' && shareEasedOut(sail) < LEAST_SHARE) {
      problems.push({
        key: `sails.${id}.sheetX`,
        given: sail.sheetX,
        message: `sails.${id}.sheetX must lie clear of the boom's pivot: led from there the sheet pulls along the boom and cannot hold it`,
      })
    }
  }
  const set = Object.keys(boat.sails).filter((id) => setup.trim[id]?.set === 'yes')
  if (set.length === 0) {
    problems.push({ key: 'trim', given: 'none', message: 'at least one sail must be set' })
  }
  if (!set.includes(setup.source)) {
    problems.push({
      key: 'source',
      given: setup.source,
      message: `source must be a sail that is set: ${set.join(', ')}`,
    })
  }
  return problems
}

/** Share of a sheet across a boom eased to 60 degrees. */
function shareEasedOut(sail: Sail): number {
  const eased = -Math.PI / 3
  return sheetAcross(
    sail.luffX,
    sail.sheetReach,
    sail.footZ,
    eased,
    sail.sheetX,
    -sail.sheetY,
    sail.sheetZ,
  )
}

function lineProblems(plan: Plan): Problem[] {
  const { boat, setup } = plan
  const { line, elastic } = setup
  const source = boat.sails[setup.source]
  const trim = setup.trim[setup.source]
  if (!source || !trim) return []
  const problems: Problem[] = []
  const limit = (key: string, given: number, min: number, max: number, why: string) => {
    if (given >= min && given <= max) return
    const range = `${round(min)} to ${round(max)} m`
    problems.push({ key, given, message: `${key} must be from ${range}: ${why}`, min, max })
  }
  if (line.pull === 'tail') {
    if (trim.held !== 'sheet') {
      problems.push({
        key: `trim.${setup.source}.held`,
        given: trim.held,
        message: `trim.${setup.source}.held must be sheet: a sail held fast gives its sheet's tail no way to work the tiller`,
      })
    }
    const swing = (trim.sheetAngleDeg * Math.PI) / 180
    const most = round(source.sheetParts * source.sheetReach * swing)
    limit('line.takeUp', line.takeUp, -0.5, most, 'more would haul the boom past amidships')
  }
  const reach = boat.tiller.length
  limit('line.tillerRadius', line.tillerRadius, 0.1, reach, 'the tiller is no longer than that')
  limit(
    'elastic.tillerRadius',
    elastic.tillerRadius,
    0.1,
    reach,
    'the tiller is no longer than that',
  )

  const angle = (trim.sheetAngleDeg * Math.PI) / 180
  const windward = trim.held === 'pole' || trim.held === 'backed' ? 1 : -1
  const block = { x: source.sheetX, y: windward * source.sheetY, z: source.sheetZ }
  const boom = {
    x: source.luffX - source.sheetReach * cos(angle),
    y: windward * source.sheetReach * sin(angle),
    z: source.footZ,
  }
  const part = distance(block, boom)
  if (line.pull === 'deflected') {
    const most = 0.97 * part
    limit(
      'line.hitchDistance',
      line.hitchDistance,
      0.05,
      most,
      'the part of the sheet is no longer',
    )
    const hitch = between(block, boom, line.hitchDistance / part)
    const toLead = distance(hitch, setup.leads[0] as Point)
    limit(
      'line.takeUp',
      line.takeUp,
      -0.5,
      toLead - LEAST_LENGTH,
      'the hitch would be hauled into its first lead',
    )
  }
  const tiller = { x: line.tillerRadius, y: 0, z: boat.tiller.height }
  const half = boat.hull.beamOverall / 2
  setup.leads.forEach((lead, i) => {
    limit(`leads.${i}.y`, lead.y, -half - 0.1, half + 0.1, 'a lead sits on the boat')
    limit(`leads.${i}.x`, lead.x, -1.5, boat.hull.bowX, 'a lead sits on the boat')
    limit(
      `leads.${i}.z`,
      lead.z,
      boat.hull.freeboard - 0.5,
      boat.hull.freeboard + 2,
      'a lead sits on deck, coaming or rail, not through the hull',
    )
    const next = setup.leads[i + 1] ?? tiller
    if (distance(lead, next) < LEAST_LENGTH) {
      problems.push({
        key: `leads.${i}.x`,
        given: lead.x,
        message: `lead ${i + 1} lies on the next point of the line: its length there would be nothing`,
      })
    }
  })

  limit('elastic.anchorX', elastic.anchorX, -1.5, boat.hull.bowX, 'it is made fast on the boat')
  limit('elastic.anchorY', elastic.anchorY, 0.1, half + 0.1, 'it is made fast on the boat')
  const strained = round(MOST_STRAIN * elastic.naturalLength)
  limit('elastic.stretch', elastic.stretch, -0.5, strained, 'its jacket locks beyond that')
  const anchor = { x: elastic.anchorX, y: elastic.anchorY, z: elastic.anchorZ }
  const span = distance(anchor, { x: elastic.tillerRadius, y: 0, z: boat.tiller.height })
  const room = span - Math.max(elastic.stretch, 0)
  if (room < 0.15) {
    problems.push({
      key: 'elastic.stretch',
      given: elastic.stretch,
      message: `elastic.stretch leaves the cord no room: it is made fast ${round(span)} m from the tiller`,
    })
  } else {
    limit(
      'elastic.naturalLength',
      elastic.naturalLength,
      0.15,
      room,
      'stretched, it must fit between its anchor and the tiller',
    )
  }
  return problems
}

function between(a: Point, b: Point, share: number): Point {
  return {
    x: a.x + share * (b.x - a.x),
    y: a.y + share * (b.y - a.y),
    z: a.z + share * (b.z - a.z),
  }
}

function distance(a: Point, b: Point): number {
  return hypot(a.x - b.x, a.y - b.y, a.z - b.z)
}

function round(value: number): number {
  return Math.round(value * 1000) / 1000
}
