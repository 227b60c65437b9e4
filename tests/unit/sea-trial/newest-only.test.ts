import { expect, test } from 'vitest'
import { newestOnly } from '~/workers/newest-only'

function byHand() {
  const begun: string[] = []
  const finish = new Map<string, { done: (answer: string) => void; fail: (error: Error) => void }>()
  const ask = newestOnly(
    (job: string) =>
      new Promise<string>((done, fail) => {
        begun.push(job)
        finish.set(job, { done, fail })
      }),
  )
  return { ask, begun, finish: (job: string) => finish.get(job) }
}

test('a job is begun at once when nothing is being done', async () => {
  const { ask, begun, finish } = byHand()
  const answer = ask('a')
  expect(begun).toEqual(['a'])
  finish('a')?.done('A')
  expect(await answer).toBe('A')
})

test('of those asked for meanwhile only the newest is done', async () => {
  const { ask, begun, finish } = byHand()
  const first = ask('a')
  const second = ask('b')
  const third = ask('c')
  expect(await second).toBeNull()
  expect(begun).toEqual(['a'])
  finish('a')?.done('A')
  expect(await first).toBe('A')
  expect(begun).toEqual(['a', 'c'])
  finish('c')?.done('C')
  expect(await third).toBe('C')
})

test('a job that fails is reported and does not hold up the next', async () => {
  const { ask, finish } = byHand()
  const first = ask('a')
  const second = ask('b')
  finish('a')?.fail(new Error('aground'))
  await expect(first).rejects.toThrow('aground')
  finish('b')?.done('B')
  expect(await second).toBe('B')
  const third = ask('c')
  finish('c')?.done('C')
  expect(await third).toBe('C')
})
