import { withValue } from 'sim/plan/keys'
import { problemsOf } from 'sim/plan/problems'
import { expect, test } from 'vitest'
import { clock } from '~/drawing/clock'
import {
  courseInWords,
  eventInWords,
  refusalsInWords,
  weatherInWords,
} from '~/features/sea-trial/wording'
import type { Units } from '~/features/units/units'
import { plan } from './plan'

const metric: Units = { speed: 'kn', length: 'metric', force: 'N' }
const other: Units = { speed: 'm/s', length: 'imperial', force: 'lbf' }

test('a moment reads as minutes and seconds', () => {
  expect([0, 59.4, 60, 605].map(clock)).toEqual(['0:00', '0:59', '1:00', '10:05'])
})

test('a course has the tack the wind makes it', () => {
  expect(courseInWords(62.4)).toBe('62° starboard tack')
  expect(courseInWords(-130)).toBe('130° port tack')
})

test('weather and events read in the units chosen', () => {
  expect(weatherInWords(plan.setup.conditions, metric)).toBe('12 kn, 90° starboard tack')
  expect(weatherInWords(plan.setup.conditions, other)).toBe('6.2 m/s, 90° starboard tack')
  const gust = { kind: 'gust', atS: 0, strengthKn: -4, durationS: 20 } as const
  expect(eventInWords(gust, plan, metric)).toBe('Lull of 4.0 kn for 20 s')
  const reef = { kind: 'reef', atS: 0, sail: 'main', percent: 30 } as const
  expect(eventInWords(reef, plan, metric)).toBe('Mainsail reefed, 30 % of it taken in')
})

test('a refusal names the control and its range in the units chosen', () => {
  const long = withValue(plan, 'line.tillerRadius', 2)
  const [key] = problemsOf(long).map((problem) => problem.key)
  expect(key).toBe('line.tillerRadius')
  expect(refusalsInWords(problemsOf(long), long, metric)['line.tillerRadius']).toBe(
    'Line on the tiller, from the stock: between 10 and 115 cm, the tiller is no longer than that.',
  )
  expect(refusalsInWords(problemsOf(long), long, other)['line.tillerRadius']).toMatch(
    /between 3\.9 and 45\.3 in/,
  )
})

test('a refusal of a choice names the control', () => {
  const stowed = withValue(plan, 'trim.main.set', 'no')
  expect(refusalsInWords(problemsOf(stowed), stowed, metric).source).toBe(
    'Pull taken from: must be a sail that is set: storm-jib.',
  )
})
