import { Worker } from 'node:worker_threads'
import { afterEach, expect, test } from 'vitest'
import type { Task } from '~/server/simulate/messages'
import { type PoolLimits, TrialPool } from '~/server/simulate/pool'

/** A thread whose behaviour is the request itself. */
const script = `
const { parentPort } = require('node:worker_threads')
parentPort.on('message', ({ request }) => {
  if (request === 'crash') process.exit(3)
  if (request === 'throw') throw new Error('thrown in the thread')
  if (request === 'hang') for (;;) {}
  if (request === 'fault') return parentPort.postMessage({ fault: 'the model failed' })
  const until = Date.now() + 30
  while (Date.now() < until) {}
  parentPort.postMessage({ held: request === 'holds' })
})`

const task = (behaviour: string) => ({ request: behaviour, want: 'held' }) as unknown as Task

let spawned = 0
let pool: TrialPool
function open(limits: Partial<PoolLimits> = {}) {
  spawned = 0
  const spawn = () => {
    spawned++
    return new Worker(script, { eval: true })
  }
  pool = new TrialPool(spawn, { threads: 1, queue: 4, timeoutMs: 5000, ...limits })
  return pool
}
afterEach(() => pool.close())

test('answers come in the order of the tasks, and one thread serves one request after another', async () => {
  open()
  expect(await pool.run(['holds', 'loses', 'holds'].map(task))).toEqual([
    { held: true },
    { held: false },
    { held: true },
  ])
  expect(await pool.run([task('loses')])).toEqual([{ held: false }])
  expect(spawned).toBe(1)
})

test('two threads share the tasks of one request', async () => {
  open({ threads: 2 })
  await pool.run(['holds', 'holds', 'holds', 'holds'].map(task))
  expect(spawned).toBe(2)
})

test.each(['crash', 'throw'])(
  'a thread that ends by %s fails its own request and is replaced',
  async (end) => {
    open()
    const waiting = pool.run([task('holds')]).then(() => pool.run([task('holds')]))
    await expect(pool.run([task(end)])).rejects.toThrow('a thread was lost')
    expect(await waiting).toEqual([{ held: true }])
    expect(await pool.run([task('holds')])).toEqual([{ held: true }])
    expect(spawned).toBe(2)
  },
)

test('a fault of the model fails the request and keeps the thread', async () => {
  open()
  await expect(pool.run([task('fault'), task('holds')])).rejects.toThrow('the model failed')
  expect(await pool.run([task('holds')])).toEqual([{ held: true }])
  expect(spawned).toBe(1)
})

test('a run that takes too long is given up, and the next one is computed', async () => {
  open({ timeoutMs: 300 })
  await expect(pool.run([task('hang')])).rejects.toThrow('not done within 0.3 s')
  expect(await pool.run([task('holds')])).toEqual([{ held: true }])
  expect(spawned).toBe(2)
})

test('time spent waiting counts', async () => {
  open({ timeoutMs: 300 })
  const hanging = pool.run([task('hang')])
  const behind = pool.run([task('hang')])
  await expect(hanging).rejects.toThrow('not done')
  await expect(behind).rejects.toThrow('not done')
})

test('a full queue turns further requests away, and takes them again when it has emptied', async () => {
  open({ queue: 1 })
  const taken = [pool.run([task('holds')]), pool.run([task('holds')])]
  await expect(pool.run([task('holds')])).rejects.toThrow('2 requests are being computed')
  await Promise.all(taken)
  expect(await pool.run([task('holds')])).toEqual([{ held: true }])
})

test('a request whose sender leaves frees its thread', async () => {
  open()
  const sender = new AbortController()
  const left = pool.run([task('hang')], sender.signal)
  const waiting = pool.run([task('holds')])
  sender.abort(new Error('gone'))
  await expect(left).rejects.toThrow('gone')
  expect(await waiting).toEqual([{ held: true }])
})

test('a request whose sender has already left is not begun', async () => {
  open()
  await expect(pool.run([task('holds')], AbortSignal.abort(new Error('gone')))).rejects.toThrow(
    'gone',
  )
  expect(spawned).toBe(0)
})

test('a short request does not wait for all the runs of a long one', async () => {
  open()
  const order: string[] = []
  await Promise.all([
    pool.run(Array(10).fill(task('holds'))).then(() => order.push('long')),
    pool.run([task('holds')]).then(() => order.push('short')),
  ])
  expect(order).toEqual(['short', 'long'])
})

test('closing refuses what is being computed', async () => {
  open()
  const running = pool.run([task('hang')])
  pool.close()
  await expect(running).rejects.toThrow('closed')
})
