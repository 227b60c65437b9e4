import { demoBoats } from 'db/demo/boats'
import { BOOM, HEADING, SURGE } from 'sim/boat/state'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE, KNOT } from 'sim/constants'
import { genoaSheetBound, mainsheetBound, sheetAcross } from 'sim/sails/sheet'
import { describe, expect, test } from 'vitest'
import { calm, planWith } from '../demo-plans'
import { bareVessel, forcesOn } from './bare-vessel'

const FOOT = 0.3048
const POUND = 4.4482216
const KILO = 9.80665

describe('statics of a boom', () => {
  // N x/(a sin theta), computed: 600 N at 1.5 m, sheet made fast 3 m aft.
  test.each([
    [90, 300],
    [60, 346.41],
  ])('sheet at %d degrees to the boom', (degrees, tension) => {
    // Boom along the centreline, deck lead abeam of its end and, for 60 degrees, further forward.
    const ahead = 1 / Math.tan(degrees * DEGREE)
    const across = sheetAcross(3, 3, 1, 0, ahead, -1, 1)
    expect((600 * 1.5) / (3 * across)).toBeCloseTo(tension, 2)
  })

  test('a part that leads straight down holds nothing sideways', () => {
    expect(sheetAcross(3, 3, 2, 0, 0, 0, 1)).toBeCloseTo(0, 12)
  })

  test('shares of a leading part follow its direction in three dimensions', () => {
    // Down, forward and inboard in equal measure: 1/sqrt 3 of it works across the boom.
    expect(sheetAcross(3, 3, 2, 0, 1, -1, 1)).toBeCloseTo(1 / Math.sqrt(3), 12)
  })
})

describe('handbook sheet loads', () => {
  // Rigging handbooks (read): genoa .02104 A V^2 kg; main E^2 P^2 .00431 V^2/(sqrt(P^2 + E^2)(E - D)) lb, feet and knots.
  test.each([
    [20, 15, 94.7],
    [30, 20, 252.5],
  ])('genoa of %d m2 in %d knots', (area, knots, kilos) => {
    expect(genoaSheetBound(area, knots * KNOT) / KILO).toBeCloseTo(kilos, 1)
  })

  test.each([
    [0, 490.7],
    [3, 700.9],
  ])('main of 30 by 10 ft in 20 knots, sheet %d ft from the end', (from, pounds) => {
    const load = mainsheetBound(30 * FOOT, 10 * FOOT, from * FOOT, 20 * KNOT)
    expect(load / POUND).toBeCloseTo(pounds, 1)
  })
})

describe('a drawing sail of a demo boat pulls no more than the handbook says', () => {
  /** Whole sheet load of one sail on the assembled boat, N, and the wind at the sail, m/s. */
  function loadOf(
    boat: (typeof demoBoats)[number],
    id: string,
    knots: number,
    wind: number,
    boom: number,
  ) {
    const plan = planWith(boat, {
      trim: { [id]: { sheetAngleDeg: boom } },
      conditions: { ...calm, trueWindSpeedKn: 20, trueWindAngleDeg: 90 },
    })
    const { sails } = vesselOf(plan)
    const [sail] = sails
    if (!sail) throw new Error('no sail set')
    const vessel = bareVessel({ sails: [{ ...sail, profile: knots / 20 }] }, plan)
    const places = { [HEADING]: -wind * DEGREE, [BOOM]: -boom * DEGREE, [SURGE]: 0 }
    const { observed } = forcesOn(vessel, places)
    return { tension: (observed.sheet[0] as number) * sail.parts, speed: observed.apparentSpeed }
  }

  const angles = Array.from({ length: 30 }, (_, i) => 3 + 3 * i)

  test.each(demoBoats)(
    'main of $id, 6 to 25 knots, any incidence, boom from 5 degrees out',
    (boat) => {
      const main = boat.sails.main
      if (!main) throw new Error('no main')
      for (const knots of [6, 15, 25]) {
        for (const boom of [5, 10, 20, 40, 60, 80]) {
          for (const incidence of angles) {
            const { tension, speed } = loadOf(boat, 'main', knots, boom + incidence, boom)
            const fromEnd = Math.max(main.footLength - main.sheetReach, 0)
            const bound = mainsheetBound(main.luffLength, main.footLength, fromEnd, speed)
            expect(tension).toBeLessThan(bound)
            expect(speed).toBeCloseTo(knots * KNOT, 6)
          }
        }
      }
    },
  )

  test.each(demoBoats)('genoa of $id, 6 to 25 knots, any incidence', (boat) => {
    const genoa = boat.sails.genoa
    if (!genoa) throw new Error('no genoa')
    let most = 0
    for (const knots of [6, 15, 25]) {
      for (const boom of [8, 12, 20, 40, 60]) {
        for (const incidence of angles) {
          const { tension, speed } = loadOf(boat, 'genoa', knots, boom + incidence, boom)
          most = Math.max(most, tension / genoaSheetBound(genoa.area, speed))
        }
      }
    }
    expect(most).toBeLessThan(1)
    // Not so far below that the sheet could not steer: a fifth of the bound is ours.
    expect(most).toBeGreaterThan(0.2)
  })
})
