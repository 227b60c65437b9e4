import { describe, expect, test } from 'vitest'
import { momentAt, sampleAt } from '~/drawing/moment'
import { readings } from '~/drawing/readings'
import { flagsOf, spread } from '~/drawing/strip-labels'
import { courseOnTack, stripLayout, timeAt } from '~/drawing/strip-scales'
import { keptSamples, straight, tracePath } from '~/drawing/trace-path'
import type { Run } from '~/drawing/types'
import { boatWith, measures, rigged, sailed } from './rigged'

function run(trueWindAngleDeg = 70): Run {
  return sailed(rigged(boatWith('long'), { trueWindAngleDeg }))
}

/** A run whose course is written out by hand. */
function steered(courses: readonly number[], trueWindAngleDeg: number): Run {
  const sailedRun = run(trueWindAngleDeg)
  const { series } = sailedRun.result
  return {
    request: sailedRun.request,
    result: {
      ...sailedRun.result,
      series: {
        ...series,
        timeS: Float64Array.from(courses, (_, index) => 60 + index),
        courseToWindDeg: Float64Array.from(courses),
      },
    },
  }
}

describe('Moment of a run', () => {
  test('lies between its samples', () => {
    const sailedRun = run()
    const { series } = sailedRun.result
    const [before = 0, after = 0] = series.heelDeg.slice(4, 6)
    expect(momentAt(sailedRun, 4.25).heelDeg).toBeCloseTo(before + 0.25 * (after - before), 9)
  })

  test('turns the short way round the compass', () => {
    expect(Math.abs(momentAt(steered([178, -178], 170), 60.5).courseToWindDeg)).toBeCloseTo(180, 9)
  })

  test('stays on the run before its start and after its end, whatever the spacing of its samples', () => {
    const times = Float64Array.from([0, 5, 10, 12])
    expect(sampleAt(times, -3)).toEqual({ index: 0, part: 0 })
    expect(sampleAt(times, 11)).toEqual({ index: 2, part: 0.5 })
    expect(sampleAt(times, 99)).toEqual({ index: 2, part: 1 })
    expect(sampleAt(Float64Array.from([0]), 5)).toEqual({ index: 0, part: 0 })
  })

  test('knows the reefs taken by then', () => {
    const plan = rigged(boatWith('long'))
    const reefed = sailed(plan, { events: [{ kind: 'reef', atS: 10, sail: 'main', percent: 30 }] })
    expect(momentAt(reefed, 9).reef.main).toBe(0)
    expect(momentAt(reefed, 11).reef.main).toBe(30)
  })
})

describe('Strip', () => {
  const size = { width: 900, height: 400 }

  test('has windward up: heading up raises the course trace on either tack', () => {
    for (const side of [1, -1]) {
      const panel = stripLayout(run(side * 70), measures, size).panels[0]
      const closer = courseOnTack(run(side * 70), side * 55)
      const wider = courseOnTack(run(side * 70), side * 80)
      expect(closer).toBeCloseTo(55, 9)
      expect(panel?.y(closer)).toBeLessThan(panel?.y(wider) ?? 0)
    }
  })

  test('shows the whole band and the whole run', () => {
    const sailedRun = run()
    const layout = stripLayout(sailedRun, measures, size)
    const [course] = layout.panels
    const { centreDeg, halfWidthDeg } = sailedRun.result.band
    for (const edge of [centreDeg - halfWidthDeg, centreDeg + halfWidthDeg]) {
      expect(course?.y(edge)).toBeGreaterThanOrEqual(course?.top ?? 0)
      expect(course?.y(edge)).toBeLessThanOrEqual(course?.bottom ?? 0)
    }
    expect(timeAt(layout, layout.left, 30)).toBe(0)
    expect(timeAt(layout, layout.right, 30)).toBe(30)
    expect(timeAt(layout, 2000, 30)).toBe(30)
    expect(timeAt(layout, -50, 30)).toBe(0)
  })

  test('keeps each plot in its own row, with few ticks that have room for their figures', () => {
    const { panels } = stripLayout(run(), measures, size)
    panels.forEach((panel, index) => {
      expect(panel.bottom).toBeGreaterThan(panel.top)
      const next = panels[index + 1]
      if (next) expect(next.top).toBeGreaterThan(panel.bottom)
      expect(panel.ticks.length).toBeGreaterThan(0)
      const heights = panel.ticks.map((tick) => panel.y(tick)).sort((a, b) => a - b)
      heights.slice(1).forEach((height, order) => {
        expect(height - (heights[order] ?? 0)).toBeGreaterThanOrEqual(14.9)
      })
    })
  })

  test('reads loads in the visitor’s unit', () => {
    const inPounds = { ...measures, force: { ...measures.force, unit: 'lbf', factor: 0.2248 } }
    const newtons = stripLayout(run(), measures, size).panels[3]
    const pounds = stripLayout(run(), inPounds, size).panels[3]
    const [sheet] = newtons?.traces ?? []
    const [inLbf] = pounds?.traces ?? []
    expect(inLbf?.values[5]).toBeCloseTo((sheet?.values[5] ?? 0) * 0.2248, 9)
    expect(pounds?.title).toBe('Loads, lbf')
  })
})

describe('Trace', () => {
  const times = Float64Array.from({ length: 2400 }, (_, index) => index / 4)
  const values = times.map((timeS) => Math.sin(timeS) + (timeS === 300 ? 50 : 0))
  const x = (timeS: number) => timeS / 2

  test('keeps every extreme and both ends of a long run on few points', () => {
    const kept = keptSamples(times, values, x)
    expect(kept.length).toBeLessThanOrEqual(2 * 151 + 2)
    expect(kept[0]).toBe(0)
    expect(kept[kept.length - 1]).toBe(2399)
    expect(kept).toContain(1200)
    expect([...kept].sort((a, b) => a - b)).toEqual(kept)
  })

  test('goes through a straight scale to where the scale itself would put it', () => {
    const { x: scale, panels } = stripLayout(run(), measures, { width: 900, height: 400 })
    for (const value of [-40, 0, 0.3, 61, 600]) {
      expect(straight(scale)(value)).toBeCloseTo(scale(value), 6)
      for (const { y } of panels) expect(straight(y)(value)).toBeCloseTo(y(value), 6)
    }
  })

  test('draws every sample where each has a pixel of its own', () => {
    expect(keptSamples(times, values, (timeS) => timeS * 8)).toHaveLength(2400)
  })

  test('lifts the pen where the course comes round', () => {
    const path = tracePath(
      Float64Array.from([0, 1, 2, 3]),
      Float64Array.from([170, 178, -178, -170]),
      (timeS) => timeS * 10,
      (value) => value,
      180,
    )
    expect(path.match(/M/g)).toHaveLength(2)
  })
})

describe('Labels', () => {
  test('are moved apart in their own order, within the room given', () => {
    const placed = spread([50, 52, 49], 10, 0, 60)
    const [first = 0, second = 0, third = 0] = placed
    expect(third).toBeLessThan(first)
    expect(first).toBeLessThan(second)
    expect(first - third).toBeGreaterThanOrEqual(10)
    expect(second - first).toBeGreaterThanOrEqual(10)
    expect(second).toBeLessThanOrEqual(60)
  })

  test('flags keep their moments, and words only where they have room', () => {
    const happenings = [
      { atS: 100, code: 'gust' as const, text: '' },
      { atS: 103, code: 'line-slack' as const, text: '' },
      { atS: 300, code: 'reef' as const, text: '' },
    ]
    const flags = flagsOf(happenings, (timeS) => timeS, 900)
    expect(flags.map(({ x }) => x)).toEqual([100, 103, 300])
    expect(flags.map(({ word }) => word)).toEqual(['gust', undefined, 'reef'])
  })

  test('what was dropped in has its word before what came of it', () => {
    const happenings = [
      { atS: 100, code: 'line-slack' as const, text: '' },
      { atS: 130, code: 'gust' as const, text: '' },
    ]
    const flags = flagsOf(happenings, (timeS) => timeS, 900)
    expect(flags.map(({ word }) => word)).toEqual([undefined, 'gust'])
  })
})

describe('Strip in words', () => {
  test('says where she is and how long she was in the band', () => {
    const [course] = readings(steered([60, 70, 80, 90], 70), 60, measures)
    expect(course?.atCursor).toBe(
      '60° to the wind, 10° to windward of the course asked, within the band.',
    )
    expect(course?.overRun).toBe(
      'From 60° to 90°, 75° on average; 75 % of the judged time within 15° of the 70° asked.',
    )
  })

  test('reads the same on either tack', () => {
    const starboard = readings(steered([60, 70, 80, 90], 70), 61, measures)[0]
    const port = readings(steered([-60, -70, -80, -90], -70), 61, measures)[0]
    expect(port?.atCursor).toBe(starboard?.atCursor)
    expect(port?.overRun).toBe(starboard?.overRun)
  })

  test('names a tack and a gybe instead of a range', () => {
    expect(readings(steered([20, 5, -10], 20), 60, measures)[0]?.overRun).toMatch(
      /^Goes through the wind/,
    )
    expect(readings(steered([160, 178, -175], 160), 60, measures)[0]?.overRun).toMatch(
      /^Goes round by the stern/,
    )
  })

  test('has a sentence for every plot', () => {
    const all = readings(run(), 12, measures)
    expect(all.map(({ plot }) => plot)).toEqual(['course', 'heel', 'tiller', 'loads'])
    for (const { atCursor, overRun } of all) {
      expect(atCursor).toMatch(/^[^a-z].*\.$/)
      expect(overRun).toMatch(/\.$/)
      expect(`${atCursor}${overRun}`).not.toMatch(/NaN|Infinity|undefined/)
    }
  })
})
