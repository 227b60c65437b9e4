import { describe, expect, test } from 'vitest'
import { addressTrouble } from '../../../scripts/lib/addresses.mjs'
import { ProgramFailed } from '../../../scripts/lib/programs.mjs'
import { inOneLine, Trouble } from '../../../scripts/lib/trouble.mjs'

const withCode = (code: string, message = code) => Object.assign(new Error(message), { code })

describe('a fault in one line', () => {
  test.each([
    ['a system error', withCode('ENOSPC', 'write failed')],
    ['a message', new Error('could not write: No space left on device')],
    [
      'what a program wrote',
      new Trouble('The database was not made: child ended', {
        cause: new ProgramFailed('initdb', 1, 'fsync: No space left on device\nchild ended'),
      }),
    ],
  ])('a full disk is told from %s', (_where, error) => {
    expect(inOneLine(error, '/srv/boat')).toBe(
      'The disk that holds /srv/boat is full. Free some space and start again.',
    )
  })

  test('never has more than one line', () => {
    const error = new Error('first\n   second\n\nthird')
    expect(inOneLine(error, '/')).toBe('first second third')
    expect(inOneLine(new Trouble('a\nb'), '/')).toBe('a b')
  })

  test('says who may write where this user may not', () => {
    expect(inOneLine(withCode('EACCES', 'permission denied, open x'), '/')).toMatch(
      /may not write here: permission denied, open x/,
    )
  })
})

describe('an address that cannot be listened on', () => {
  test('a port in use names the next one', () => {
    expect(addressTrouble(withCode('EADDRINUSE'), '127.0.0.1', 3000)).toMatchObject({
      message: expect.stringMatching(/^Port 3000 on 127.0.0.1 is in use.*PORT=3001 npm start$/),
    })
  })

  test('the last port of all has no next one', () => {
    expect(addressTrouble(withCode('EADDRINUSE'), '127.0.0.1', 65_535)).toMatchObject({
      message: expect.stringContaining('PORT=3000 npm start'),
    })
  })

  test('another fault stays what it is', () => {
    const error = withCode('EIO')
    expect(addressTrouble(error, '127.0.0.1', 3000)).toBe(error)
  })
})

describe('the reason a program failed', () => {
  test('is its first telling line, without the mark', () => {
    const failed = new ProgramFailed('p', 1, 'starting\nE: no such package\nE: giving up\n')
    expect(failed.reason(/^E: /)).toBe('no such package')
  })

  test('is its last line when none tells more, and its code when it was silent', () => {
    expect(new ProgramFailed('p', 1, 'one\ntwo\n\n').reason(/^E: /)).toBe('two')
    expect(new ProgramFailed('p', 3, '').reason(/^E: /)).toBe('p ended with code 3')
  })
})
