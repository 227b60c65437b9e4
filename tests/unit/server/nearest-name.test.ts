import { expect, test } from 'vitest'
import { nearestName } from '~/server/nearest-name'

const names = ['line.takeUp', 'line.tillerRadius', 'elastic.stretch', 'hull.displacement']

test.each([
  ['line.takeup', 'line.takeUp'],
  ['line.takUp', 'line.takeUp'],
  ['elastic.strech', 'elastic.stretch'],
  ['hull.displacment', 'hull.displacement'],
])('%s was probably meant as %s', (typed, meant) => {
  expect(nearestName(typed, names)).toBe(meant)
})

test('nothing is proposed for what resembles no name, or is too long to be one', () => {
  expect(nearestName('weather', names)).toBeUndefined()
  expect(nearestName('', names)).toBeUndefined()
  expect(nearestName('line.takeUp'.repeat(1000), names)).toBeUndefined()
})
