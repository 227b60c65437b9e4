import type { Happening } from 'sim/trial/types'

/** Moves labels apart until none is nearer than `gap`, keeping their order and the room given. */
export function spread(
  wanted: readonly number[],
  gap: number,
  low: number,
  high: number,
): number[] {
  const order = wanted.map((at, index) => ({ at, index })).sort((a, b) => a.at - b.at)
  let least = low
  for (const label of order) {
    label.at = Math.max(label.at, least)
    least = label.at + gap
  }
  let most = high
  for (const label of order.reverse()) {
    label.at = Math.min(label.at, most)
    most = label.at - gap
  }
  const placed = [...wanted]
  for (const { at, index } of order) placed[index] = at
  return placed
}

const words: Record<Happening['code'], string> = {
  gust: 'gust',
  'wind-shift': 'shift',
  'wave-set': 'waves',
  reef: 'reef',
  tacked: 'tacks',
  gybed: 'gybes',
  broached: 'broaches',
  'line-slack': 'line slack',
  'elastic-slack': 'elastic slack',
  'tiller-on-stop': 'tiller on stop',
  'left-valid-range': 'stops',
}

export interface Flag {
  x: number
  atS: number
  code: Happening['code']
  /** Undefined where there is no room for it. */
  word: string | undefined
}

/** Average advance of 14 px type, enough to tell whether two words meet. */
const letterPx = 7.4

/** What was dropped in is named first, then what ended the run's claim to hold, then the rest. */
const rank: Record<Happening['code'], number> = {
  gust: 0,
  'wind-shift': 0,
  'wave-set': 0,
  reef: 0,
  tacked: 1,
  gybed: 1,
  broached: 1,
  'left-valid-range': 1,
  'line-slack': 2,
  'elastic-slack': 2,
  'tiller-on-stop': 2,
}

/** Flags in order of time, a word on each that has room for it and says something new. */
export function flagsOf(
  happenings: readonly Happening[],
  x: (timeS: number) => number,
  right: number,
): Flag[] {
  const taken: { from: number; to: number }[] = []
  const flags = happenings
    .map(({ atS, code }): Flag => ({ x: x(atS), atS, code, word: undefined }))
    .sort((a, b) => a.atS - b.atS)
  for (const flag of flags.toSorted((a, b) => rank[a.code] - rank[b.code])) {
    const word = words[flag.code]
    const place = { from: flag.x, to: flag.x + 18 + word.length * letterPx }
    const free = taken.every(({ from, to }) => place.from > to || place.to < from)
    if (!free || place.to >= right) continue
    taken.push(place)
    flag.word = word
  }
  return flags
}
