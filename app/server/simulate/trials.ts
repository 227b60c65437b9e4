import { Worker } from 'node:worker_threads'
import type { TrialRequest, TrialResult } from 'sim/trial/types'
import { environment } from '../environment'
import { onePerProcess } from '../one-per-process'
import type { Task } from './messages'
import { TrialPool } from './pool'
import source from './thread?thread'

function openPool(): TrialPool {
  return new TrialPool(
    () => new Worker(source, { eval: true, resourceLimits: { maxOldGenerationSizeMb: 512 } }),
    {
      threads: environment.TRIAL_THREADS,
      queue: environment.TRIAL_QUEUE,
      timeoutMs: environment.TRIAL_TIMEOUT_S * 1000,
    },
  )
}

const pool = onePerProcess('trials', openPool, (earlier) => earlier.close())

/** A run, computed on another thread. */
export async function computeTrial(
  request: TrialRequest,
  signal?: AbortSignal,
): Promise<TrialResult> {
  const { result } = await computeTrials(request, 1, signal)
  return result
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
  const [first, ...others] = await pool.run(tasks, signal)
  if (!first || !('result' in first)) throw new Error('the first run came back without its traces')
  const otherHeld = others.filter((answer) => 'held' in answer && answer.held).length
  return { result: first.result, held: otherHeld + (first.result.metrics.holds ? 1 : 0) }
}
