import type { Worker } from 'node:worker_threads'
import type { Answer, Task } from './messages'

export interface PoolLimits {
  threads: number
  /** Requests that may wait beyond those that have a thread. */
  queue: number
  /** From a request's arrival to the moment it is given up. */
  timeoutMs: number
}

export class PoolFull extends Error {}
export class PoolTimeout extends Error {}
export class PoolFault extends Error {}

/** The tasks of one request; they take turns with those of the other requests. */
interface Batch {
  readonly tasks: readonly Task[]
  readonly answers: Answer[]
  started: number
  answered: number
  settle(outcome: { answers: Answer[] } | { error: unknown }): void
}

/** Worker threads that compute trials, started when first needed and replaced when they end. */
export class TrialPool {
  readonly #spawn: () => Worker
  readonly #limits: PoolLimits
  readonly #idle = new Set<Worker>()
  readonly #busy = new Map<Worker, { batch: Batch; index: number }>()
  readonly #open = new Set<Batch>()
  #waiting: Batch[] = []

  constructor(spawn: () => Worker, limits: PoolLimits) {
    this.#spawn = spawn
    this.#limits = limits
  }

  /** Answers in the order of the tasks, or the first error; an aborted request frees its threads. */
  run(tasks: readonly Task[], signal?: AbortSignal): Promise<Answer[]> {
    const { threads, queue, timeoutMs } = this.#limits
    if (signal?.aborted) return Promise.reject(signal.reason)
    if (this.#open.size >= threads + queue) {
      return Promise.reject(new PoolFull(`${this.#open.size} requests are being computed`))
    }
    return new Promise((resolve, reject) => {
      const giveUp = () =>
        this.#drop(batch, new PoolTimeout(`not done within ${timeoutMs / 1000} s`))
      const leave = () => this.#drop(batch, signal?.reason)
      const timer = setTimeout(giveUp, timeoutMs)
      const batch: Batch = {
        tasks,
        answers: [],
        started: 0,
        answered: 0,
        settle: (outcome) => {
          clearTimeout(timer)
          signal?.removeEventListener('abort', leave)
          this.#open.delete(batch)
          if ('error' in outcome) reject(outcome.error)
          else resolve(outcome.answers)
        },
      }
      signal?.addEventListener('abort', leave, { once: true })
      this.#open.add(batch)
      this.#waiting.push(batch)
      this.#dispatch()
    })
  }

  close(): void {
    this.#waiting = []
    for (const batch of this.#open) this.#drop(batch, new PoolFault('the threads were closed'))
    for (const worker of this.#idle) worker.terminate()
    this.#idle.clear()
  }

  #dispatch(): void {
    for (let batch = this.#waiting[0]; batch; batch = this.#waiting[0]) {
      const worker = this.#freeWorker()
      if (!worker) return
      this.#waiting.shift()
      const index = batch.started++
      if (batch.started < batch.tasks.length) this.#waiting.push(batch)
      this.#busy.set(worker, { batch, index })
      worker.ref()
      worker.postMessage(batch.tasks[index])
    }
  }

  #freeWorker(): Worker | undefined {
    const [idle] = this.#idle
    if (idle) {
      this.#idle.delete(idle)
      return idle
    }
    if (this.#busy.size >= this.#limits.threads) return undefined
    const worker = this.#spawn()
    worker.on('message', (answer: Answer) => this.#take(worker, answer))
    worker.on('error', (error) => this.#lose(worker, error))
    worker.on('messageerror', (error) => this.#lose(worker, error))
    worker.on('exit', (code) => this.#lose(worker, new Error(`thread ended with code ${code}`)))
    return worker
  }

  #take(worker: Worker, answer: Answer): void {
    const job = this.#busy.get(worker)
    if (!job) return
    this.#busy.delete(worker)
    this.#idle.add(worker)
    worker.unref()
    const { batch, index } = job
    if ('fault' in answer) {
      this.#drop(batch, new PoolFault(answer.fault))
      return
    }
    batch.answers[index] = answer
    batch.answered++
    if (batch.answered === batch.tasks.length) batch.settle({ answers: batch.answers })
    this.#dispatch()
  }

  #lose(worker: Worker, cause: Error): void {
    const job = this.#busy.get(worker)
    this.#idle.delete(worker)
    this.#busy.delete(worker)
    if (job) this.#drop(job.batch, new PoolFault(`a thread was lost: ${cause.message}`, { cause }))
  }

  /** Ends a batch early; a running model cannot be interrupted, so its threads go with it. */
  #drop(batch: Batch, error: unknown): void {
    this.#waiting = this.#waiting.filter((other) => other !== batch)
    for (const [worker, job] of this.#busy) {
      if (job.batch !== batch) continue
      this.#busy.delete(worker)
      worker.terminate()
    }
    batch.settle({ error })
    this.#dispatch()
  }
}
