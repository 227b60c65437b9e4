import fc from 'fast-check'
import { expect, test } from 'vitest'
import { problemSchema } from '~/server/problem'
import { boatOf, refused, short, simulate, sound } from './interface'

test('an unknown setup is a 404', async () => {
  for (const setup of ['nobody', '', '\u0000', 'x'.repeat(10_000)]) {
    await refused({ setup }, 404)
  }
})

const lineOf = (line: object) => ({ ...sound, line: { ...sound.line, ...line } })
test.each<[string, unknown, string]>([
  ['nothing', {}, 'setup'],
  ['a list', [], 'body'],
  ['a number', 5, 'body'],
  ['a setup that is neither', { setup: 7 }, 'setup'],
  ['a field of no meaning', { ...short, wind: 3 }, 'wind'],
  ['too short a run', { ...short, durationS: 9 }, 'durationS'],
  ['too long a run', { ...short, durationS: 3601 }, 'durationS'],
  ['an endless run', `{"setup":"${sound.id}","durationS":1e999}`, 'durationS'],
  ['output too often', { ...short, outputIntervalS: 0.05 }, 'outputIntervalS'],
  ['output never', { ...short, outputIntervalS: 30 }, 'outputIntervalS'],
  ['too much output', { ...short, durationS: 3600, outputIntervalS: 0.1 }, 'outputIntervalS'],
  ['no seeds', { ...short, seeds: 0 }, 'seeds'],
  ['half a seed', { ...short, seeds: 1.5 }, 'seeds'],
  ['too many seeds', { ...short, seeds: 51 }, 'seeds'],
  ['seeds past the last', { ...short, seeds: 2, conditions: { seed: 2147483647 } }, 'seeds'],
  [
    'more adaptive runs than there is time for',
    { ...short, solver: 'adaptive', durationS: 3600, outputIntervalS: 1, seeds: 3 },
    'seeds',
  ],
  ['an unknown solver', { ...short, solver: 'exact' }, 'solver'],
  ['an unknown helm', { ...short, helm: 'hand' }, 'helm'],
  ['a storm', { ...short, conditions: { trueWindSpeedKn: 90 } }, 'conditions.trueWindSpeedKn'],
  ['an unknown condition', { ...short, conditions: { tide: 1 } }, 'conditions.tide'],
  [
    'an unknown event',
    { ...short, conditions: { events: [{ atS: 1, kind: 'whale' }] } },
    'conditions.events.0.kind',
  ],
  [
    'a reef in a sail she does not have',
    { ...short, conditions: { events: [{ atS: 1, kind: 'reef', sail: 'kite', percent: 9 }] } },
    'conditions.events.0.sail',
  ],
  ['an unknown key', { ...short, changes: { 'line.colour': 1 } }, 'changes.line.colour'],
  ['a change out of range', { ...short, changes: { 'line.takeUp': 9 } }, 'changes.line.takeUp'],
  ['a change of wrong type', { ...short, changes: { 'line.pull': 1 } }, 'changes.line.pull'],
  ['a change to an object', { ...short, changes: { 'line.takeUp': {} } }, 'changes.line.takeUp'],
  ['a lead she does not have', { ...short, changes: { 'leads.9.x': 1 } }, 'changes.leads.9.x'],
  ['a whole setup out of range', { ...short, setup: lineOf({ takeUp: 9 }) }, 'setup.line.takeUp'],
  ['a whole setup with more', { ...short, setup: lineOf({ hue: 9 }) }, 'setup.line.hue'],
  [
    'a whole setup of an unknown boat',
    { ...short, setup: { ...sound, boatId: 'ark' } },
    'setup.boatId',
  ],
  [
    'a whole setup with another boat than it names',
    { ...short, setup: { ...sound, boatId: 'ark', boat: boatOf(sound) } },
    'setup.boatId',
  ],
  [
    'a pull from a sail she does not have',
    { ...short, setup: { ...sound, source: 'kite' } },
    'setup.source',
  ],
  ['a whole setup without trims', { ...short, setup: { ...sound, trim: {} } }, 'setup.trim'],
])('%s is refused by name', async (_, body, field) => {
  const { errors = [] } = await refused(body)
  const error = errors.find((candidate) => candidate.field.startsWith(field))
  expect(error, JSON.stringify(errors)).toBeDefined()
})

test('an error names what was given, the allowed range and the unit', async () => {
  const { errors } = await refused({ ...short, changes: { 'line.takeUp': 9 } })
  expect(errors).toEqual([
    {
      field: 'changes.line.takeUp',
      given: 9,
      message: 'line.takeUp must be from -0.5 to 1.8 m',
      min: -0.5,
      max: 1.8,
    },
  ])
})

test('a request given up by its sender is not computed to the end', async () => {
  const sender = new AbortController()
  const asked = simulate({ setup: sound.id, seeds: 50, durationS: 3600 }, sender.signal)
  const began = performance.now()
  setTimeout(() => sender.abort(), 100)
  expect((await asked).status).toBe(503)
  expect(performance.now() - began).toBeLessThan(2000)
})

test('whatever is put into a field, the answer is a run or a refusal', async () => {
  const whole = { ...short, durationS: 10, setup: { ...sound, boat: boatOf(sound) } }
  const paths = [...pathsIn(whole), ['conditions'], ['changes'], ['seeds'], ['helm']]
  const value = fc.oneof(
    fc.jsonValue(),
    fc.double(),
    fc.constantFrom(0, -1, 1e-300, 1e300, '', 'main', null, [], {}),
  )
  await fc.assert(
    fc.asyncProperty(fc.constantFrom(...paths), value, async (path, replaced) => {
      const response = await simulate(replacedAt(whole, path, replaced))
      const text = await response.text()
      expect([200, 400, 404], text).toContain(response.status)
      expect(text).not.toMatch(/NaN|Infinity(?!")|\.ts:\d/)
      if (response.status !== 200) problemSchema.parse(JSON.parse(text))
    }),
    { numRuns: 150 },
  )
})

test('whatever the body is, the answer is a refusal', async () => {
  await fc.assert(
    fc.asyncProperty(fc.oneof(fc.string(), fc.json()), async (body) => {
      const response = await simulate(body)
      expect([400, 404]).toContain(response.status)
      problemSchema.parse(await response.json())
    }),
    { numRuns: 200 },
  )
})

/** Every place in a document, from its top down. */
function pathsIn(node: unknown, above: string[] = []): string[][] {
  if (typeof node !== 'object' || node === null) return []
  return Object.entries(node).flatMap(([key, value]) => [
    [...above, key],
    ...pathsIn(value, [...above, key]),
  ])
}

function replacedAt(node: unknown, path: string[], value: unknown): unknown {
  const [step, ...rest] = path
  if (step === undefined) return value
  const copy = (Array.isArray(node) ? [...node] : { ...(node as object) }) as Record<
    string,
    unknown
  >
  copy[step] = replacedAt(copy[step], rest, value)
  return copy
}
