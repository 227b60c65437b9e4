import { type Channel, channels } from 'sim/trial/channels'
import type { Moment, Run } from '~/drawing/types'

const names = Object.keys(channels) as Channel[]
const turning: ReadonlySet<Channel> = new Set<Channel>([
  'courseToWindDeg',
  'headingDeg',
  'windDirectionDeg',
  'apparentWindAngleDeg',
])

/** The run at any time between its outputs; before its start and after its end, those. */
export function momentAt({ request, result }: Run, timeS: number): Moment {
  const times = result.series.timeS
  const before = indexAt(times, timeS)
  const after = Math.min(before + 1, times.length - 1)
  const t0 = times[before] ?? 0
  const t1 = times[after] ?? t0
  const part = t1 > t0 ? Math.min(Math.max((timeS - t0) / (t1 - t0), 0), 1) : 0

  const moment: Record<string, number> = {}
  for (const name of names) {
    const column = result.series[name]
    const a = column[before] ?? 0
    const b = column[after] ?? a
    moment[name] = turning.has(name) ? a + wrapped(b - a) * part : a + (b - a) * part
  }
  return {
    ...(moment as Record<Channel, number>),
    boomDeg: between(result.boomDeg, before, after, part),
    drawing: between(result.drawing, before, after, part),
    reef: reefsAt(request, timeS),
  }
}

/** Last output at or before a time. */
function indexAt(times: Float64Array, timeS: number): number {
  let low = 0
  let high = times.length - 1
  while (low < high) {
    const middle = (low + high + 1) >> 1
    if ((times[middle] ?? 0) <= timeS) low = middle
    else high = middle - 1
  }
  return low
}

function between(
  columns: Record<string, Float64Array>,
  before: number,
  after: number,
  part: number,
): Record<string, number> {
  return Object.fromEntries(
    Object.entries(columns).map(([sail, column]) => {
      const a = column[before] ?? 0
      const b = column[after] ?? a
      return [sail, a + (b - a) * part]
    }),
  )
}

function reefsAt({ plan, events }: Run['request'], timeS: number): Record<string, number> {
  const reefs = Object.fromEntries(
    Object.entries(plan.setup.trim).map(([sail, trim]) => [sail, trim.reef]),
  )
  const taken = events
    .filter((event) => event.kind === 'reef' && event.atS <= timeS)
    .toSorted((a, b) => a.atS - b.atS)
  for (const event of taken) if (event.kind === 'reef') reefs[event.sail] = event.percent
  return reefs
}

/** The same angle within half a turn either way. */
function wrapped(deg: number): number {
  return deg - 360 * Math.round(deg / 360)
}
