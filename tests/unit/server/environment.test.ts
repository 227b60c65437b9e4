import { beforeAll, expect, test, vi } from 'vitest'

const complete = { DATABASE_URL: 'postgres://sailor@127.0.0.1:5432/boats' }

let readEnvironment: typeof import('~/server/environment').readEnvironment
beforeAll(async () => {
  vi.stubEnv('DATABASE_URL', complete.DATABASE_URL)
  ;({ readEnvironment } = await import('~/server/environment'))
})

test('only the database must be named; the rest has defaults', () => {
  const read = readEnvironment(complete)
  expect(read.DATABASE_URL).toBe(complete.DATABASE_URL)
  expect(read.TRIAL_THREADS).toBeGreaterThanOrEqual(1)
})

test('numbers are read from their text', () => {
  expect(readEnvironment({ ...complete, TRIAL_TIMEOUT_S: '5' }).TRIAL_TIMEOUT_S).toBe(5)
})

test('every variable that is missing or wrong is named in one line', () => {
  const wrong = { DATABASE_URL: 'mysql://elsewhere', TRIAL_THREADS: '0', TRIAL_QUEUE: 'many' }
  expect(() => readEnvironment(wrong)).toThrow(
    /^The environment is not complete: DATABASE_URL must [^\n]*TRIAL_THREADS must [^\n]*TRIAL_QUEUE must [^\n]*$/,
  )
  expect(() => readEnvironment({})).toThrow(/DATABASE_URL must/)
})
