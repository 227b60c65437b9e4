import type { Plan } from 'sim/plan/types'
import { type Point, tackOf } from './frame'
import { clewPoint, sheetLead, trimmedAngle } from './geometry'

/** The round piece of deck that the detail shows: the same ring is drawn on the main sheet. */
export interface DetailFrame {
  centre: Point
  radiusM: number
}

const marginM = 0.32

/** Encloses tiller, leads, hitch and elastic of a setup; it does not move during a run. */
export function detailFrame(plan: Plan): DetailFrame {
  const tack = tackOf(plan.setup.conditions)
  const { source, line, elastic, leads } = plan.setup
  const points: Point[] = [
    { x: -0.25, y: 0 },
    { x: plan.boat.tiller.length, y: 0.3 },
    { x: plan.boat.tiller.length, y: -0.3 },
    { x: elastic.anchorX, y: -tack * elastic.anchorY },
    ...leads.map((lead) => ({ x: lead.x, y: tack * lead.y })),
  ]
  const deck = sheetLead(plan, source)
  const sail = plan.boat.sails[source]
  if (deck && sail) {
    points.push(deck)
    const boom = clewPoint(sail, trimmedAngle(plan, source), sail.sheetReach)
    const length = Math.hypot(boom.x - deck.x, boom.y - deck.y, boom.z - deck.z) || 1
    const shown = Math.min(1, (line.hitchDistance + 0.25) / length)
    points.push({ x: deck.x + (boom.x - deck.x) * shown, y: deck.y + (boom.y - deck.y) * shown })
  }
  return enclose(points)
}

/** Small circle round the points, found by walking towards the farthest one. */
function enclose(points: readonly Point[]): DetailFrame {
  let centre = points[0] ?? { x: 0, y: 0 }
  for (let step = 1; step <= 120; step++) {
    const far = farthest(points, centre)
    centre = {
      x: centre.x + (far.x - centre.x) / (step + 1),
      y: centre.y + (far.y - centre.y) / (step + 1),
    }
  }
  const far = farthest(points, centre)
  return { centre, radiusM: Math.hypot(far.x - centre.x, far.y - centre.y) + marginM }
}

function farthest(points: readonly Point[], from: Point): Point {
  return points.reduce((best, point) =>
    Math.hypot(point.x - from.x, point.y - from.y) > Math.hypot(best.x - from.x, best.y - from.y)
      ? point
      : best,
  )
}
