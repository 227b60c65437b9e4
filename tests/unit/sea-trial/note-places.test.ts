import fc from 'fast-check'
import { expect, test } from 'vitest'
import type { PartAnchors, PartKey } from '~/drawing/types'
import { NOTE, notePlaces } from '~/features/sea-trial/note-places'

const drawing = { width: 400, height: 420 }
const parts: PartKey[] = [
  'sheet',
  'hitch',
  'line',
  'lead.0',
  'lead.1',
  'tiller',
  'elastic',
  'elastic-anchor',
]

const anchors: fc.Arbitrary<PartAnchors> = fc
  .tuple(...parts.map(() => fc.record({ x: fc.nat(400), y: fc.nat(420) })))
  .map((points) => Object.fromEntries(parts.map((part, n) => [part, points[n]])))

test('every part of the drawing has one note, within its height and clear of the others', () => {
  fc.assert(
    fc.property(anchors, (at) => {
      const places = notePlaces(parts, at, drawing)
      expect(places.map(({ part }) => part).sort()).toEqual([...parts].sort())
      for (const side of ['left', 'right']) {
        const tops = places.filter((place) => place.side === side).map(({ top }) => top)
        tops.forEach((top, n) => {
          expect(top).toBeGreaterThanOrEqual(0)
          expect(top + NOTE.height).toBeLessThanOrEqual(drawing.height)
          if (n > 0) expect(top - (tops[n - 1] ?? 0)).toBeGreaterThanOrEqual(NOTE.height)
        })
      }
    }),
  )
})

test('notes of one side stand in the order of their parts', () => {
  fc.assert(
    fc.property(anchors, (at) => {
      for (const side of ['left', 'right']) {
        const heights = notePlaces(parts, at, drawing)
          .filter((place) => place.side === side)
          .map(({ part }) => at[part]?.y ?? 0)
        expect(heights).toEqual([...heights].sort((a, b) => a - b))
      }
    }),
  )
})

test('a part that the drawing does not show has no note', () => {
  expect(notePlaces(['hitch', 'sail.main'], { hitch: { x: 10, y: 10 } }, drawing)).toHaveLength(1)
})
