import { type Channel, channels, type Series } from 'sim/trial/channels'
import { expect, test } from 'vitest'
import type { Run } from '~/drawing/types'
import { momentAt } from '~/features/sea-trial/moment'
import { plan } from './plan'

function runOf(columns: Partial<Record<Channel, number[]>>): Run {
  const length = columns.timeS?.length ?? 0
  const series = Object.fromEntries(
    Object.keys(channels).map((name) => [
      name,
      Float64Array.from(columns[name as Channel] ?? Array<number>(length).fill(0)),
    ]),
  ) as Series
  return {
    request: {
      plan,
      conditions: plan.setup.conditions,
      events: [
        { atS: 5, kind: 'reef', sail: 'main', percent: 20 },
        { atS: 2, kind: 'gust', strengthKn: 5, durationS: 10 },
      ],
      helm: 'sheet-to-tiller',
      solver: 'fixed-step',
      durationS: 10,
      outputIntervalS: 1,
    },
    result: {
      modelVersion: '',
      verdict: { code: 'holds', text: '', reason: '' },
      metrics: {
        holds: true,
        meanCourseToWindDeg: 0,
        rmsCourseErrorDeg: 0,
        maxCourseErrorDeg: 0,
        withinBandFraction: 1,
        meanSpeedKn: 0,
        balanceSpeedKn: 0,
        maxHeelDeg: 0,
        peakControlLineN: 0,
        peakElasticN: 0,
        peakSheetN: 0,
      },
      happenings: [],
      band: { centreDeg: 90, halfWidthDeg: 15 },
      series,
      boomDeg: { main: Float64Array.from({ length }, (_, n) => -10 * n) },
      drawing: { main: Float64Array.from({ length }, () => 1) },
    },
  }
}

const run = runOf({ timeS: [0, 2, 4], heelDeg: [10, 20, 14], headingDeg: [350, 10, 10] })

test('between two outputs a value lies on the straight line between them', () => {
  expect(momentAt(run, 1).heelDeg).toBe(15)
  expect(momentAt(run, 3.5).heelDeg).toBe(15.5)
  expect(momentAt(run, 1).boomDeg.main).toBe(-5)
})

test('an angle takes the short way round', () => {
  expect(momentAt(run, 1).headingDeg).toBe(360)
  expect(momentAt(run, 0.5).headingDeg).toBe(355)
})

test('before the start and after the end it is the first and the last output', () => {
  expect(momentAt(run, -3).heelDeg).toBe(10)
  expect(momentAt(run, 99).heelDeg).toBe(14)
  expect(momentAt(run, 99).timeS).toBe(4)
})

test('a reef taken during the run is in from its moment on', () => {
  expect(momentAt(run, 4.9).reef.main).toBe(0)
  expect(momentAt(run, 5).reef.main).toBe(20)
  expect(momentAt(run, 5).reef['storm-jib']).toBe(0)
})
