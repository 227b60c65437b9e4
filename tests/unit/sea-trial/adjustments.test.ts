import { keysOf, parameterAt, withValue } from 'sim/plan/keys'
import { expect, test } from 'vitest'
import {
  adjustable,
  furtherWeatherKeys,
  keysOfPart,
  mainKeyOf,
  weatherKeys,
} from '~/features/sea-trial/adjustments'
import { plan } from './plan'

const ofTheSetup = keysOf(plan).filter((key) =>
  /^(source|conditions|trim|line|leads|elastic)(\.|$)/.test(key),
)

test('every value of a setup can be adjusted on exactly one part or in the weather', () => {
  const { parts } = adjustable(plan)
  const reachable = [
    ...parts.flatMap((part) => keysOfPart(part.key)),
    ...weatherKeys,
    ...furtherWeatherKeys,
  ]
  expect([...reachable].sort()).toEqual([...ofTheSetup].sort())
})

test('a stowed sail can be set again', () => {
  const { parts, stowed } = adjustable(withValue(plan, 'trim.storm-jib.set', 'no'))
  expect(parts.some((part) => part.key === 'sail.storm-jib')).toBe(false)
  expect(stowed).toEqual([{ sail: 'storm-jib', name: 'Storm jib', key: 'trim.storm-jib.set' }])
})

test('what a note shows while closed is one of its part’s own values', () => {
  for (const { key } of adjustable(plan).parts) {
    const main = mainKeyOf(key)
    expect(keysOfPart(key)).toContain(main)
    expect(parameterAt(plan, main ?? '')).toBeDefined()
  }
})
