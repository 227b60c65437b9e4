import { Worker } from 'node:worker_threads'
import type { TrialRequest, TrialResult } from 'sim/trial/types'
import { environment } from '../environment'
import { onePerProcess } from '../one-per-process'
import type { Answer, Task } from './messages'
import { TrialPool } from './pool'
import source from './thread?thread'

function openPool(name: string, threads: number): TrialPool {
  const limits = {
    threads,
    queue: environment.TRIAL_QUEUE,
    timeoutMs: environment.TRIAL_TIMEOUT_S * 1000,
  }
  const spawn = () =>
    new Worker(source, { eval: true, resourceLimits: { maxOldGenerationSizeMb: 512 } })
  return onePerProcess(
    name,
    () => new TrialPool(spawn, limits),
    (earlier) => earlier.close(),
  )
}

// Pages have a thread of their own, so that none waits for someone's fifty runs.
const forPages = openPool('trials-for-pages', 1)
const forRequests = openPool('trials-for-requests', environment.TRIAL_THREADS)

/** The run a page opens with, computed on another thread. */
export async function computeTrial(
  request: TrialRequest,
  signal?: AbortSignal,
): Promise<TrialResult> {
  const [answer] = await forPages.run([{ request, want: 'result' }], signal)
  return resultOf(answer)
}

/** A run and how many of the runs with this seed and the following ones hold. */
export async function computeTrials(
  request: TrialRequest,
  seeds: number,
  signal?: AbortSignal,
): Promise<{ result: TrialResult; held: number }> {
  const tasks = Array.from({ length: seeds }, (_, nth): Task => {
    const conditions = { ...request.conditions, seed: request.conditions.seed + nth }
    return { request: { ...request, conditions }, want: nth === 0 ? 'result' : 'held' }
  })
  const [first, ...others] = await forRequests.run(tasks, signal)
  const result = resultOf(first)
  const otherHeld = others.filter((answer) => 'held' in answer && answer.held).length
  return { result, held: otherHeld + (result.metrics.holds ? 1 : 0) }
}

function resultOf(answer: Answer | undefined): TrialResult {
  if (answer && 'result' in answer) return answer.result
  throw new Error('a run came back without its traces')
}
