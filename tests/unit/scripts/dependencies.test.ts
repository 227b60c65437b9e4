import { describe, expect, test } from 'vitest'
import { checkSpace, sameAsLock } from '../../../scripts/lib/dependencies.mjs'

const locked = {
  '': { version: '0.1.0' },
  'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
  'node_modules/for-another-system': { version: '2.0.0', integrity: 'sha512-b', optional: true },
}
const installed = { 'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' } }

describe('installed dependencies', () => {
  test('are as locked when only optional ones are absent', () => {
    expect(sameAsLock(locked, installed)).toBe(true)
  })

  test.each([
    ['one is absent', {}],
    ['one has another version', { 'node_modules/a': { version: '1.0.1', integrity: 'sha512-a' } }],
    ['one has other content', { 'node_modules/a': { version: '1.0.0', integrity: 'sha512-x' } }],
    ['one is there that the lock does not name', { ...installed, 'node_modules/b': {} }],
  ])('are not as locked when %s', (_case, found) => {
    expect(sameAsLock(locked, found)).toBe(false)
  })
})

describe('the space for them', () => {
  test('is enough on a disk with a gigabyte free', () => {
    expect(() => checkSpace({ bavail: 250_000, bsize: 4096 })).not.toThrow()
  })

  test('is too little with a few megabytes free, and the message says how many', () => {
    expect(() => checkSpace({ bavail: 2500, bsize: 4096 })).toThrow(/too full: .* 10 MB are free/)
  })
})
