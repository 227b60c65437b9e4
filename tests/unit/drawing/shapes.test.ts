import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { halfBreadthAt, hullOutline } from '~/drawing/hull-outline'
import { type SailMoment, sailShape } from '~/drawing/sail-shape'
import { onRing } from '~/drawing/wind-ring'
import { boats, boatWith, rigged } from './rigged'

describe('Hull from above', () => {
  test.each(boats)('$type is as long and as broad as her figures say', (boat) => {
    const outline = hullOutline(boat)
    expect(outline.stem.x - outline.sternX).toBeCloseTo(boat.hull.lengthOverall, 9)
    const stations = Array.from({ length: 201 }, (_, index) =>
      halfBreadthAt(outline, outline.sternX + (index / 200) * boat.hull.lengthOverall),
    )
    const broadest = Math.max(...stations)
    expect(broadest).toBeLessThanOrEqual(boat.hull.beamOverall / 2 + 1e-9)
    expect(broadest).toBeGreaterThan(0.99 * (boat.hull.beamOverall / 2))
  })

  test.each(boats)('$type has a fair deck line: it widens once and narrows once', (boat) => {
    const outline = hullOutline(boat)
    let turns = 0
    let rising = true
    for (let step = 1; step < 200; step++) {
      const at = (index: number) =>
        halfBreadthAt(outline, outline.sternX + (index / 200) * boat.hull.lengthOverall)
      const up = at(step) >= at(step - 1) - 1e-7
      if (up !== rising) turns++
      rising = up
    }
    expect(turns).toBe(1)
  })
})

const close: SailMoment = {
  timeS: 0,
  boomDeg: { main: -15 },
  drawing: { main: 1 },
  reef: {},
  apparentWindAngleDeg: 35,
}

function foot(moment: SailMoment) {
  const shape = sailShape(rigged(boatWith('long')), 'main', moment)
  const section = shape?.sections[0]
  if (!shape || !section) throw new Error('The main has no shape')
  return { shape, section }
}

/** Farthest that a section lies off its own chord, positive to starboard of it going aft. */
function belly(section: readonly { x: number; y: number }[]) {
  const [luff] = section
  const leech = section[section.length - 1]
  if (!luff || !leech) return 0
  const length = Math.hypot(leech.x - luff.x, leech.y - luff.y)
  return section.reduce((most, point) => {
    const off =
      ((leech.x - luff.x) * (point.y - luff.y) - (leech.y - luff.y) * (point.x - luff.x)) / length
    return Math.abs(off) > Math.abs(most) ? off : most
  }, 0)
}

describe('Sail from above', () => {
  test('the belly lies to leeward, and changes side with the wind', () => {
    const starboardTack = foot(close).section
    const portTack = foot({
      ...close,
      boomDeg: { main: 15 },
      apparentWindAngleDeg: -35,
    }).section
    expect(starboardTack[7]?.y).toBeLessThan(((starboardTack[14]?.y ?? 0) * 7) / 14)
    expect(belly(portTack)).toBeCloseTo(-belly(starboardTack), 9)
  })

  test('a drawing sail is as full as its camber says', () => {
    const { section } = foot(close)
    const main = boatWith('long').sails.main
    expect(Math.abs(belly(section))).toBeCloseTo(
      1.05 * (main?.camber ?? 0) * (main?.footLength ?? 0),
      1,
    )
  })

  test('port tack is the mirror image of starboard tack', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -80, max: 80, noNaN: true }),
        fc.double({ min: -170, max: 170, noNaN: true }),
        fc.double({ min: 0.31, max: 1, noNaN: true }),
        (boom, wind, drawing) => {
          const on = (tack: 1 | -1) =>
            foot({
              ...close,
              boomDeg: { main: tack * boom },
              apparentWindAngleDeg: tack * wind,
              drawing: { main: drawing },
            }).shape.cloth
          const port = on(-1)
          on(1).forEach((point, index) => {
            expect(port[index]?.x).toBeCloseTo(point.x, 9)
            expect(port[index]?.y).toBeCloseTo(-point.y, 9)
          })
        },
      ),
    )
  })

  test('a flogging sail ripples on both sides of its chord, a drawing one on one side only', () => {
    const sides = (drawing: number) => {
      const { section } = foot({ ...close, timeS: 0.3, drawing: { main: drawing } })
      const [luff] = section
      const leech = section[section.length - 1]
      const signs = section.slice(1, -1).map((point) => {
        if (!luff || !leech) return 0
        const off =
          (leech.x - luff.x) * (point.y - luff.y) - (leech.y - luff.y) * (point.x - luff.x)
        return Math.sign(off)
      })
      return new Set(signs).size
    }
    expect(sides(1)).toBe(1)
    expect(sides(0)).toBeGreaterThan(1)
  })

  test('taking in a reef brings the leech forward', () => {
    const whole = foot(close).shape.clew
    const reefed = foot({ ...close, reef: { main: 40 } }).shape.clew
    expect(reefed.x).toBeGreaterThan(whole.x)
  })
})

describe('Ring of courses', () => {
  const ring = { centre: { x: 100, y: 100 }, radius: 50 }
  test('with the wind from the top, starboard tack sails to the left and port tack to the right', () => {
    expect(onRing(ring, 0)).toEqual({ x: 100, y: 50 })
    expect(onRing(ring, 90)).toEqual({ x: 50, y: 100 })
    expect(onRing(ring, -90)).toEqual({ x: 150, y: 100 })
    expect(onRing(ring, 180)).toEqual({ x: 100, y: 150 })
  })
})
