import { describe, expect, test } from 'vitest'
import { checkNode, readSettings } from '../../../scripts/lib/settings.mjs'

describe('settings', () => {
  test('nothing given means loopback, port 3000 and a database of its own', () => {
    expect(readSettings({})).toEqual({ host: '127.0.0.1', port: 3000, databaseUrl: null })
    expect(readSettings({ HOST: '', PORT: '', DATABASE_URL: '' })).toEqual(readSettings({}))
  })

  test('what is given is taken', () => {
    const databaseUrl = 'postgres://sailor:pw@db.example:5433/boats?sslmode=require'
    expect(readSettings({ HOST: '::1', PORT: '8080', DATABASE_URL: databaseUrl })).toEqual({
      host: '::1',
      port: 8080,
      databaseUrl,
    })
  })

  test.each(['abc', '-1', '65536', '80.5', '1e3', ' 80', '0x50'])(
    'the port %j is refused with the allowed range',
    (PORT) => {
      expect(() => readSettings({ PORT })).toThrow(/whole number from 0 .* to 65535/)
    },
  )

  test.each([
    ['boats', /address of a PostgreSQL database/],
    ['mysql://127.0.0.1/boats', /must begin with postgres:\/\//],
    ['postgres://127.0.0.1', /names no database/],
    ['postgres://127.0.0.1/', /names no database/],
  ])('the database address %j is refused with an example', (DATABASE_URL, message) => {
    expect(() => readSettings({ DATABASE_URL })).toThrow(message)
    expect(() => readSettings({ DATABASE_URL })).toThrow(/such as postgres:/)
  })
})

describe('the version of Node', () => {
  test.each(['20.20.0', '20.20.2', '20.21.0', '22.0.0', '100.1.1'])('%s will do', (version) => {
    expect(() => checkNode(version)).not.toThrow()
  })

  test.each(['20.19.9', '18.99.99', '9.0.0'])('%s is too old', (version) => {
    expect(() => checkNode(version)).toThrow(`this is ${version}`)
  })
})
