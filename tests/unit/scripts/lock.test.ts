import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { setTimeout as delay } from 'node:timers/promises'
import { expect, test } from 'vitest'
import { alone } from '../../../scripts/lib/lock.mjs'

test('work under one name never overlaps, and each gives its own outcome', async () => {
  let inside = 0
  let most = 0
  const work = (outcome: number) =>
    alone('overlap', async () => {
      inside += 1
      most = Math.max(most, inside)
      await delay(20)
      inside -= 1
      return outcome
    })
  expect(await Promise.all([work(1), work(2), work(3)])).toEqual([1, 2, 3])
  expect(most).toBe(1)
})

test('work that fails frees the lock', async () => {
  const failing = alone('failing', async () => {
    throw new Error('no')
  })
  await expect(failing).rejects.toThrow('no')
  expect(await alone('failing', async () => 'free')).toBe('free')
})

test('a killed process holds nothing', async () => {
  const script = `
    import { alone } from './scripts/lib/lock.mjs'
    await alone('killed', () => { console.log('held'); return new Promise(() => setInterval(() => {}, 1000)) })`
  const child = spawn(process.execPath, ['--input-type=module', '--eval', script])
  await once(child.stdout, 'data')
  let taken = false
  const waiting = alone('killed', async () => {
    taken = true
  })
  await delay(250)
  expect(taken).toBe(false)
  child.kill('SIGKILL')
  await waiting
  expect(taken).toBe(true)
})
