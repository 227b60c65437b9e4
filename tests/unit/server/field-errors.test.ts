import { expect, test } from 'vitest'
import { z } from 'zod'
import { parseFields } from '~/server/field-errors'
import { type FieldError, Problem } from '~/server/problem'

const schema = z.strictObject({
  count: z.int().min(1).max(5).optional(),
  share: z.number().min(0).max(1).optional(),
  kind: z.enum(['ball', 'plain']).optional(),
  names: z.array(z.string()).max(2).optional(),
  either: z.union([z.string(), z.strictObject({ x: z.number().min(2).max(3) })]).optional(),
  events: z
    .array(
      z.discriminatedUnion('kind', [
        z.strictObject({ kind: z.literal('gust'), atS: z.number().min(0).max(9) }),
        z.strictObject({ kind: z.literal('reef'), sail: z.string() }),
      ]),
    )
    .optional(),
})

function errorsOf(value: unknown): FieldError[] {
  try {
    parseFields(schema, value)
  } catch (error) {
    if (error instanceof Problem) return error.body().errors ?? []
    throw error
  }
  return []
}

test('a value out of range is named with what was given and both ends of the range', () => {
  const whole = 'must be a whole number from 1 to 5'
  expect(errorsOf({ count: 9, share: -1 })).toEqual([
    { field: 'count', given: 9, message: whole, min: 1, max: 5 },
    { field: 'share', given: -1, message: 'must be a number from 0 to 1', min: 0, max: 1 },
  ])
  expect(errorsOf({ count: 1.5 })).toEqual([
    { field: 'count', given: 1.5, message: whole, min: 1, max: 5 },
  ])
})

test('a value of the wrong type is named with the range it must be from', () => {
  const expected = { message: 'must be a number from 0 to 1', min: 0, max: 1 }
  expect(errorsOf({ share: 'much' })).toEqual([{ field: 'share', given: 'much', ...expected }])
  expect(errorsOf({ share: null })).toEqual([{ field: 'share', given: null, ...expected }])
  expect(errorsOf({ share: Number.POSITIVE_INFINITY })).toEqual([
    { field: 'share', given: 'Infinity', ...expected },
  ])
  expect(errorsOf({ names: 3 })).toMatchObject([{ field: 'names', message: 'must be a list' }])
  expect(errorsOf([])).toMatchObject([{ field: 'body', message: 'must be an object' }])
})

test('an unknown choice is named with those there are', () => {
  const [error] = errorsOf({ kind: 'pulley' })
  expect(error).toMatchObject({ field: 'kind', given: 'pulley', allowed: ['ball', 'plain'] })
})

test('an unknown field is named, with the one that was probably meant', () => {
  expect(errorsOf({ shares: 1 })).toMatchObject([
    { field: 'shares', given: 1, message: 'there is no such field; did you mean share?' },
  ])
  expect(errorsOf({ zzzzzz: 1 })).toMatchObject([{ message: 'there is no such field' }])
})

test('of two ways to write a value the one that was meant is judged', () => {
  expect(errorsOf({ either: { x: 9 } })).toEqual([
    { field: 'either.x', given: 9, message: 'must be a number from 2 to 3', min: 2, max: 3 },
  ])
  expect(errorsOf({ either: 7 })).toMatchObject([{ field: 'either', given: 7 }])
})

test('what is wrong inside a list is named by its place', () => {
  const events = [{ kind: 'gust', atS: 99 }, { kind: 'storm' }, { kind: 'gust' }]
  expect(errorsOf({ events })).toMatchObject([
    { field: 'events.0.atS', given: 99, min: 0, max: 9 },
    { field: 'events.1.kind', given: 'storm', allowed: ['gust', 'reef'] },
    { field: 'events.2.atS', message: 'is missing: it must be a number from 0 to 9' },
  ])
})

test('a thousand errors are told in a short answer that says how many were left out', () => {
  const many = Object.fromEntries(Array.from({ length: 1000 }, (_, i) => [`unknown${i}`, i]))
  try {
    parseFields(schema, many)
    expect.unreachable()
  } catch (error) {
    const body = (error as Problem).body()
    expect(body.errors).toHaveLength(20)
    expect(body.errorsLeftOut).toBe(980)
    expect(body.detail).toBe('Not allowed: unknown0, unknown1, unknown2 and 997 more.')
  }
})

test('large and deep values are described, not sent back', () => {
  let deep: unknown = []
  for (let level = 0; level < 50_000; level++) deep = [deep]
  expect(errorsOf({ share: deep })).toMatchObject([{ given: 'a list of 1' }])
  const [error] = errorsOf({ share: 'x'.repeat(10_000) })
  expect(String(error?.given).length).toBeLessThan(100)
})
