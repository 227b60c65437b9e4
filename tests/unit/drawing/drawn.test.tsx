import type { ReactElement } from 'react'
import { renderToStaticMarkup } from 'react-dom/server'
import type { Plan } from 'sim/plan/types'
import { describe, expect, test } from 'vitest'
import { placeBalloons } from '~/drawing/balloon-places'
import { momentAt } from '~/drawing/moment'
import { partsOf } from '~/drawing/parts'
import { coilPath, ropePath } from '~/drawing/rope'
import { SeaTrialSheet } from '~/drawing/sea-trial-sheet'
import { SternView } from '~/drawing/stern-view'
import { Strip } from '~/drawing/strip'
import { partAnchors, TillerDetail } from '~/drawing/tiller-detail'
import { TrackChart } from '~/drawing/track-chart'
import type { Run } from '~/drawing/types'
import { boats, boatWith, measures, rigged, sailed } from './rigged'

function drawings(run: Run, timeS: number): ReactElement[] {
  const { plan } = run.request
  const moment = momentAt(run, timeS)
  const common = { moment, measures, label: 'Drawing', width: 600, height: 480 }
  const ghosts = [{ helm: 'lashed' as const, label: 'lashed', run }]
  return [
    <SeaTrialSheet key="sheet" {...common} run={run} ghosts={ghosts} />,
    <TillerDetail key="detail" {...common} plan={plan} />,
    <SternView key="stern" {...common} plan={plan} />,
    <TrackChart key="track" {...common} run={run} ghosts={ghosts} />,
    <Strip key="strip" {...common} run={run} ghosts={ghosts} cursorS={timeS} />,
  ]
}

const plans = boats.flatMap((boat): [string, Plan][] =>
  [
    { name: 'starboard tack', trueWindAngleDeg: 60, source: 'main' },
    { name: 'port tack, headsail sheet', trueWindAngleDeg: -120, source: 'genoa' },
    { name: 'steering sail', trueWindAngleDeg: 170, source: 'steering' },
  ]
    .filter(({ source }) => source in boat.sails)
    .map(({ name, ...rigging }) => [`${boat.type}, ${name}`, rigged(boat, rigging)]),
)

describe('Every drawing', () => {
  test.each(plans)('of %s has a label and no broken figure', (_, plan) => {
    const run = sailed(plan, { durationS: 8 })
    for (const drawing of drawings(run, 3.5)) {
      const markup = renderToStaticMarkup(drawing)
      expect(markup).toContain('aria-label="Drawing"')
      expect(markup).not.toMatch(/NaN|Infinity|undefined/)
    }
  })

  test('can be drawn of a run that ended at its first sample', () => {
    const run = sailed(rigged(boatWith('fin')))
    const first = (columns: Record<string, Float64Array>) =>
      Object.fromEntries(
        Object.entries(columns).map(([name, values]) => [name, values.slice(0, 1)]),
      )
    const { series, boomDeg, drawing } = run.result
    const ended: Run = {
      request: run.request,
      result: {
        ...run.result,
        series: first(series) as typeof series,
        boomDeg: first(boomDeg),
        drawing: first(drawing),
      },
    }
    for (const drawn of drawings(ended, 20))
      expect(renderToStaticMarkup(drawn)).not.toMatch(/NaN|Infinity|undefined/)
  })

  test('of the detail has every number within its ring', () => {
    for (const [, plan] of plans) {
      const anchors = partAnchors({ plan, width: 400, height: 450 })
      expect(Object.keys(anchors)).toEqual(
        expect.arrayContaining(['sheet', 'line', 'lead.0', 'tiller', 'elastic-anchor']),
      )
      for (const at of Object.values(anchors))
        expect(
          Math.hypot((at?.x ?? Number.NaN) - 200, (at?.y ?? Number.NaN) - 228),
        ).toBeLessThanOrEqual(188)
    }
  })
})

test('A setup that names a sheet the boat does not have is drawn without its gear', () => {
  const plan = rigged(boatWith('long'))
  const run = sailed(plan, { durationS: 4 })
  const unrigged = { ...plan, setup: { ...plan.setup, source: 'spanker' } }
  for (const drawing of drawings({ ...run, request: { ...run.request, plan: unrigged } }, 1))
    expect(renderToStaticMarkup(drawing)).not.toMatch(/NaN|Infinity|undefined/)
})

describe('Numbered parts', () => {
  test('run on from the foremost sail to the elastic, each number once', () => {
    const parts = partsOf(rigged(boatWith('long')))
    expect(parts.map(({ number }) => number)).toEqual(parts.map((_, index) => index + 1))
    expect(parts[0]?.key).toBe('sail.genoa')
    expect(parts[parts.length - 1]?.key).toBe('elastic-anchor')
  })

  test('have no hitch where the sheet’s own tail is led to the tiller', () => {
    const plan = rigged(boatWith('long'))
    plan.setup.line.pull = 'tail'
    expect(partsOf(plan).some(({ key }) => key === 'hitch')).toBe(false)
  })

  test('stand clear of each other even where they are wanted in one place', () => {
    const wanted = Array.from({ length: 5 }, () => ({ part: { x: 0, y: 0 }, at: { x: 10, y: 10 } }))
    const places = placeBalloons(wanted, [{ x: 0, y: 0 }], { x: 0, y: 0 }, 200)
    places.forEach((place, index) => {
      for (const other of places.slice(index + 1))
        expect(Math.hypot(place.x - other.x, place.y - other.y)).toBeGreaterThan(20)
    })
  })
})

describe('Rope', () => {
  const from = { x: 0, y: 0 }

  test('is straight under load and hangs when slack', () => {
    const to = { x: 100, y: 0 }
    expect(ropePath([from, to], 0)).toBe('M0 0L100 0')
    expect(ropePath([from, to], 1)).toMatch(/^M0 0Q50 16 100 0$/)
  })

  test('an elastic keeps its turns and opens its pitch as it stretches', () => {
    const crossings = (path: string) => {
      const heights = [...path.matchAll(/[ML][-\d.]+ ([-\d.]+)/g)].map((match) => Number(match[1]))
      return heights.filter((y, index) => index > 0 && y * (heights[index - 1] ?? 0) < 0).length
    }
    const short = coilPath(from, { x: 60, y: 0 }, 8, 5)
    const long = coilPath(from, { x: 140, y: 0 }, 8, 5)
    expect(crossings(short)).toBe(crossings(long))
    expect(crossings(short)).toBeGreaterThanOrEqual(14)
  })
})
