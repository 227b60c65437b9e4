import { balloonRadius } from './balloon'
import type { Anchor } from './types'

export interface WantedBalloon {
  part: Anchor
  /** Where it would stand if it were alone. */
  at: Anchor
}

const apart = 2 * balloonRadius + 4
const offInk = balloonRadius + 7
const rounds = 80

/**
 * Stands balloons clear of each other and of the ink, as near as may be to where they are wanted,
 * within a circle. The same in gives the same out.
 */
export function placeBalloons(
  wanted: readonly WantedBalloon[],
  ink: readonly Anchor[],
  centre: Anchor,
  radius: number,
): Anchor[] {
  const places = wanted.map(({ at }) => ({ ...at }))
  for (let round = 0; round < rounds; round++)
    places.forEach((place, index) => {
      const want = wanted[index]
      if (!want) return
      place.x += 0.04 * (want.at.x - place.x)
      place.y += 0.04 * (want.at.y - place.y)
      places.forEach((other, otherIndex) => {
        if (otherIndex !== index) push(place, other, apart, 0.5, index < otherIndex ? 1 : -1)
      })
      for (const point of ink) push(place, point, offInk, 0.35, 1)
      const [dx, dy] = [place.x - centre.x, place.y - centre.y]
      const away = Math.hypot(dx, dy)
      if (away > radius) {
        place.x = centre.x + (dx * radius) / away
        place.y = centre.y + (dy * radius) / away
      }
    })
  return places
}

/** Moves a place away from another that is nearer than it may be. */
function push(place: Anchor, from: Anchor, least: number, part: number, side: 1 | -1) {
  const [dx, dy] = [place.x - from.x, place.y - from.y]
  const gap = Math.hypot(dx, dy)
  if (gap >= least) return
  const move = part * (least - gap)
  if (gap < 0.01) place.y += side * move
  else {
    place.x += (dx / gap) * move
    place.y += (dy / gap) * move
  }
}

/** Points along a drawn line, close enough that no balloon slips between them. */
export function alongInk(from: Anchor, to: Anchor): Anchor[] {
  const count = Math.max(1, Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / 12))
  return Array.from({ length: count + 1 }, (_, index) => ({
    x: from.x + ((to.x - from.x) * index) / count,
    y: from.y + ((to.y - from.y) * index) / count,
  }))
}
