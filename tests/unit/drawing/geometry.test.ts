import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { type DeckPoint, distance } from '~/drawing/frame'
import {
  clewPoint,
  lengthOf,
  offSquareDeg,
  type RigGeometry,
  rigGeometry,
} from '~/drawing/geometry'
import { momentAt } from '~/drawing/moment'
import { boats, rigged, sailed } from './rigged'

const moments = fc.record({
  boom: fc.double({ min: -85, max: 85, noNaN: true }),
  tillerDeg: fc.double({ min: -35, max: 35, noNaN: true }),
  hitchOutM: fc.double({ min: 0, max: 0.5, noNaN: true }),
  elasticStretchM: fc.double({ min: -0.2, max: 0.6, noNaN: true }),
})
const anyBoat = fc.constantFrom(...boats)
const pulls = fc.constantFrom('deflected' as const, 'tail' as const)

function rigOf(plan: ReturnType<typeof rigged>, moment: Parameters<typeof rigGeometry>[1]) {
  const rig = rigGeometry(plan, moment)
  if (!rig) throw new Error('The rig has no geometry')
  return rig
}

function mirrored(point: DeckPoint): DeckPoint {
  return { x: point.x, y: -point.y, z: point.z }
}

function pointsOf(rig: RigGeometry): DeckPoint[] {
  return [
    rig.sheetDeck,
    rig.sheetBoom,
    rig.hitch,
    ...rig.line,
    rig.tillerTip,
    rig.tillerElastic,
    rig.elasticAnchor,
    rig.cordFrom,
  ]
}

describe('Rig on deck', () => {
  test('port tack is the mirror image of starboard tack', () => {
    fc.assert(
      fc.property(anyBoat, pulls, moments, (boat, pull, { boom, tillerDeg, ...rest }) => {
        const onTack = (tack: 1 | -1) => {
          const plan = rigged(boat, { trueWindAngleDeg: tack * 80 })
          plan.setup.line.pull = pull
          return rigOf(plan, {
            ...rest,
            boomDeg: { main: tack * boom },
            tillerDeg: tack * tillerDeg,
          })
        }
        const starboard = pointsOf(onTack(1))
        const port = pointsOf(onTack(-1))
        starboard.forEach((point, index) => {
          expect(distance(mirrored(point), port[index] as DeckPoint)).toBeLessThan(1e-9)
        })
      }),
    )
  })

  test('the hitch rests on the straight part of the sheet, as far from the deck block as asked', () => {
    fc.assert(
      fc.property(
        anyBoat,
        moments,
        fc.double({ min: 0.05, max: 0.6, noNaN: true }),
        (boat, at, hitch) => {
          const plan = rigged(boat)
          plan.setup.line.hitchDistance = hitch
          const rig = rigOf(plan, { ...at, boomDeg: { main: -20 } })
          const part = distance(rig.sheetDeck, rig.sheetBoom)
          const viaHitch =
            distance(rig.sheetDeck, rig.hitchAtRest) + distance(rig.hitchAtRest, rig.sheetBoom)
          expect(viaHitch).toBeCloseTo(part, 9)
          expect(distance(rig.sheetDeck, rig.hitchAtRest)).toBeCloseTo(hitch, 9)
          expect(distance(rig.hitchAtRest, rig.hitch)).toBeCloseTo(at.hitchOutM, 9)
        },
      ),
    )
  })

  test('a hitch farther out than the part is long stays on the part', () => {
    const plan = rigged(boats[0] as (typeof boats)[number])
    plan.setup.line.hitchDistance = 4
    const rig = rigOf(plan, {
      boomDeg: { main: -20 },
      tillerDeg: 0,
      hitchOutM: 0,
      elasticStretchM: 0,
    })
    expect(distance(rig.sheetDeck, rig.hitch)).toBeLessThan(distance(rig.sheetDeck, rig.sheetBoom))
  })

  test('line and elastic are made fast on the tiller, which keeps its length', () => {
    fc.assert(
      fc.property(anyBoat, moments, (boat, { boom, ...at }) => {
        const plan = rigged(boat)
        const rig = rigOf(plan, { ...at, boomDeg: { main: boom } })
        expect(distance(rig.stock, rig.tillerTip)).toBeCloseTo(boat.tiller.length, 9)
        expect(distance(rig.stock, rig.tillerLine)).toBeCloseTo(plan.setup.line.tillerRadius, 9)
        expect(distance(rig.stock, rig.tillerElastic)).toBeCloseTo(
          plan.setup.elastic.tillerRadius,
          9,
        )
        expect(rig.line[rig.line.length - 1]).toEqual(rig.tillerLine)
      }),
    )
  })

  test('on starboard tack the line leads to windward of the tiller and the elastic to leeward', () => {
    const rig = rigOf(rigged(boats[0] as (typeof boats)[number]), {
      boomDeg: { main: -20 },
      tillerDeg: 0,
      hitchOutM: 0.2,
      elasticStretchM: 0.3,
    })
    expect(rig.leads[0]?.y).toBeGreaterThan(rig.tillerLine.y)
    expect(rig.elasticAnchor.y).toBeLessThan(rig.tillerElastic.y)
    expect(rig.sheetBoom.y).toBeLessThan(0)
  })

  test('a clew held to windward has its sheet on the windward side', () => {
    const plan = rigged(boats[0] as (typeof boats)[number], { source: 'genoa' })
    plan.setup.trim.genoa = { ...plan.setup.trim.genoa, held: 'pole' } as never
    const rig = rigOf(plan, {
      boomDeg: { genoa: 60 },
      tillerDeg: 0,
      hitchOutM: 0,
      elasticStretchM: 0,
    })
    expect(rig.sheetDeck.y).toBeGreaterThan(0)
    expect(rig.sheetBoom.y).toBeGreaterThan(0)
  })

  test('lanyard and cord together reach from the anchor to the tiller', () => {
    fc.assert(
      fc.property(anyBoat, moments, (boat, { boom, ...at }) => {
        const rig = rigOf(rigged(boat), { ...at, boomDeg: { main: boom } })
        const whole = distance(rig.elasticAnchor, rig.tillerElastic)
        expect(lengthOf([rig.elasticAnchor, rig.cordFrom, rig.tillerElastic])).toBeCloseTo(whole, 9)
      }),
    )
  })

  test('the elastic drawn gives and takes as much as the model says it stretches', () => {
    const plan = rigged(boats[0] as (typeof boats)[number])
    const run = sailed(plan)
    const lengthAt = (tillerDeg: number) => {
      const rig = rigOf(plan, { boomDeg: {}, tillerDeg, hitchOutM: 0, elasticStretchM: 0 })
      return distance(rig.elasticAnchor, rig.tillerElastic)
    }
    for (const timeS of [2, 9, 17, 28]) {
      const moment = momentAt(run, timeS)
      const drawn = plan.setup.elastic.stretch + lengthAt(moment.tillerDeg) - lengthAt(0)
      expect(moment.elasticStretchM).toBeCloseTo(drawn, 6)
    }
  })

  test('a pull across the tiller is square, one along it is 90 degrees off', () => {
    const rig = rigOf(rigged(boats[0] as (typeof boats)[number]), {
      boomDeg: {},
      tillerDeg: 25,
      hitchOutM: 0,
      elasticStretchM: 0,
    })
    const turn = (25 * Math.PI) / 180
    const on = rig.tillerLine
    const across = { x: on.x - Math.sin(turn), y: on.y + Math.cos(turn), z: on.z }
    const along = { x: on.x + Math.cos(turn), y: on.y + Math.sin(turn), z: on.z }
    expect(offSquareDeg(rig, on, across)).toBeCloseTo(0, 9)
    expect(offSquareDeg(rig, on, along)).toBeCloseTo(90, 9)
  })

  test('a positive boom angle puts the clew to starboard, aft of the luff', () => {
    const main = boats[0]?.sails.main as NonNullable<(typeof boats)[number]['sails'][string]>
    const clew = clewPoint(main, 30, 2)
    expect(clew.y).toBeCloseTo(1, 9)
    expect(main.luffX - clew.x).toBeCloseTo(2 * Math.cos(Math.PI / 6), 9)
  })
})
