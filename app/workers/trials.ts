import { type Remote, wrap } from 'comlink'
import type { Trials } from './trials.worker'

export interface TrialThread {
  /** Calls the model in the thread; fails when the thread itself could not be started. */
  call<Answer>(ask: (trials: Remote<Trials>) => Promise<Answer>): Promise<Answer>
  /** Ends the thread, and with it whatever it is computing. */
  end(): void
}

/** A thread of the browser that runs the model. */
export function startTrialThread(): TrialThread {
  const worker = new Worker(new URL('./trials.worker.ts', import.meta.url), { type: 'module' })
  const trials = wrap<Trials>(worker)
  const lost = new Promise<Error>((resolve) => {
    worker.addEventListener('error', (event) => {
      resolve(new Error(event.message || 'The thread that computes the runs could not be started.'))
    })
  })
  return {
    async call(ask) {
      const answer = await Promise.race([ask(trials), lost])
      if (answer instanceof Error) throw answer
      return answer
    },
    end: () => worker.terminate(),
  }
}
