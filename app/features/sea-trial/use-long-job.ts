import type { Remote } from 'comlink'
import { useEffect, useRef, useState } from 'react'
import { startTrialThread, type TrialThread } from '~/workers/trials'
import type { Trials } from '~/workers/trials.worker'

export type LongJob<Answer> =
  | { stage: 'idle' }
  | { stage: 'running' }
  | { stage: 'done'; answer: Answer }
  | { stage: 'failed'; message: string }

/** Work for a thread of its own, so that it holds up no slider and can be broken off. */
export function useLongJob<Answer>() {
  const [job, setJob] = useState<LongJob<Answer>>({ stage: 'idle' })
  const thread = useRef<TrialThread | null>(null)

  function end() {
    thread.current?.end()
    thread.current = null
  }
  useEffect(
    () => () => {
      thread.current?.end()
      thread.current = null
    },
    [],
  )

  async function start(ask: (trials: Remote<Trials>) => Promise<Answer>) {
    end()
    const own = startTrialThread()
    thread.current = own
    setJob({ stage: 'running' })
    try {
      const answer = await own.call(ask)
      if (thread.current === own) setJob({ stage: 'done', answer })
    } catch (error) {
      if (thread.current !== own) return
      setJob({ stage: 'failed', message: error instanceof Error ? error.message : String(error) })
    } finally {
      if (thread.current === own) end()
    }
  }

  function stop() {
    end()
    setJob({ stage: 'idle' })
  }

  return { job, start, stop }
}
