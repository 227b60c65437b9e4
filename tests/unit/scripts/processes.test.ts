import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { tmpdir } from 'node:os'
import { expect, test } from 'vitest'
import { processStat, worksIn } from '../../../scripts/lib/processes.mjs'

test('a living process is told from one that is gone', async () => {
  const child = spawn('sleep', ['60'], { cwd: tmpdir() })
  const pid = child.pid ?? 0
  expect(processStat(pid)).toMatchObject({ parent: process.pid })
  expect(processStat(pid)?.startedAt).toMatch(/^\d+$/)
  expect(worksIn(pid, tmpdir())).toBe(true)
  expect(worksIn(pid, '/')).toBe(false)
  child.kill('SIGKILL')
  await once(child, 'exit')
  expect(processStat(pid)).toBeNull()
  expect(worksIn(pid, tmpdir())).toBe(false)
})
