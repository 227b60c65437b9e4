import { mkdirSync, mkdtempSync, renameSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { fingerprint } from '../../../scripts/lib/build.mjs'

let base: string
const of = () => fingerprint(base, ['app', 'package.json', 'absent'])

beforeEach(() => {
  base = mkdtempSync(join(tmpdir(), 'fingerprint-'))
  mkdirSync(join(base, 'app', 'deep'), { recursive: true })
  writeFileSync(join(base, 'app', 'deep', 'a.ts'), 'one')
  writeFileSync(join(base, 'package.json'), '{}')
})
afterEach(() => rmSync(base, { recursive: true }))

test('the same content has the same fingerprint, whenever it was written', () => {
  const before = of()
  utimesSync(join(base, 'app', 'deep', 'a.ts'), 1, 1)
  writeFileSync(join(base, 'elsewhere'), 'not a source')
  expect(of()).toBe(before)
})

test('changed, added, renamed and removed files each change it', () => {
  const seen = new Set([of()])
  writeFileSync(join(base, 'app', 'deep', 'a.ts'), 'two')
  seen.add(of())
  writeFileSync(join(base, 'app', 'b.ts'), 'two')
  seen.add(of())
  renameSync(join(base, 'app', 'b.ts'), join(base, 'app', 'c.ts'))
  seen.add(of())
  rmSync(join(base, 'package.json'))
  seen.add(of())
  expect(seen.size).toBe(5)
})
