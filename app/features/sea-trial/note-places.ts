import { spread } from '~/drawing/strip-labels'
import type { Anchor, PartAnchors, PartKey, Size } from '~/drawing/types'

export const NOTE = { width: 184, height: 52 } as const

export type Side = 'left' | 'right'

export interface NotePlace {
  part: PartKey
  side: Side
  /** Upper edge, pixels from the top of the drawing. */
  top: number
}

/**
 * Puts the notes of a drawing into a column on either side of it, about as many on each, beside
 * their parts as far as there is room and in the order of the parts, so that leader lines are short
 * and do not cross.
 */
export function notePlaces(
  parts: readonly PartKey[],
  anchors: PartAnchors,
  drawing: Size,
): NotePlace[] {
  const room = Math.max(1, Math.floor(drawing.height / NOTE.height))
  const anchored = parts
    .flatMap((part) => {
      const at = anchors[part]
      return at ? [{ part, at }] : []
    })
    .sort((a, b) => a.at.x - b.at.x)
  const middle = anchored.filter(({ at }) => at.x < drawing.width / 2).length
  const half = anchored.length / 2
  const even = Math.min(Math.ceil(half), Math.max(Math.floor(half), middle))
  const left = Math.min(room, Math.max(anchored.length - room, even))
  return [
    ...column(anchored.slice(0, left), 'left', drawing),
    ...column(anchored.slice(left), 'right', drawing),
  ]
}

function column(
  notes: readonly { part: PartKey; at: Anchor }[],
  side: Side,
  drawing: Size,
): NotePlace[] {
  const inOrder = notes.toSorted((a, b) => a.at.y - b.at.y)
  const tops = spread(
    inOrder.map(({ at }) => Math.round(at.y - NOTE.height / 2)),
    NOTE.height,
    0,
    Math.floor(drawing.height) - NOTE.height,
  )
  return inOrder.map(({ part }, index) => ({ part, side, top: tops[index] ?? 0 }))
}
