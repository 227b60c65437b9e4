import { expect, test } from 'vitest'
import {
  siblingAddress,
  testDatabaseName,
  withoutPassword,
} from '../../../scripts/lib/postgres/databases.mjs'
import { homeFor } from '../../../scripts/lib/postgres/home.mjs'

test('each clone has a database folder of its own outside', () => {
  expect(homeFor('/root/boats')).toMatch(/^\/var\/lib\/counterhelm\/boats-[0-9a-f]{12}$/)
  expect(homeFor('/root/boats')).not.toBe(homeFor('/home/boats'))
  expect(homeFor('/root/my boats; rm')).toMatch(/^\/var\/lib\/counterhelm\/my-boats-rm-[0-9a-f]+$/)
})

test('a shown address has no password', () => {
  const shown = withoutPassword('postgres://sailor:secret@db:5432/boats?password=secret')
  expect(shown).toBe('postgres://sailor@db:5432/boats')
})

test('a database beside another keeps server, user and options', () => {
  expect(siblingAddress('postgres://u:p@db:5433/boats?sslmode=require', 'tests')).toBe(
    'postgres://u:p@db:5433/tests?sslmode=require',
  )
})

test('test databases are named after the process that owns them, each anew', () => {
  expect(testDatabaseName()).toMatch(new RegExp(`^counterhelm_test_${process.pid}_`))
  expect(testDatabaseName()).not.toBe(testDatabaseName())
})
