import { useEffect, useRef, useState } from 'react'
import type { TrialRequest, TrialResult } from 'sim/trial/types'
import type { Ghost as DrawnGhost, Run } from '~/drawing/types'
import { newestOnly } from '~/workers/newest-only'
import { startTrialThread, type TrialThread } from '~/workers/trials'
import type { Ghost } from './state'

export const ghostLabels: Record<Ghost, string> = { lashed: 'lashed', free: 'free' }

export interface Trial {
  /** The newest run there is: the server's at first, then this browser's own. */
  run: Run
  ghosts: readonly DrawnGhost[]
  /** Whether a newer run than the one shown has been asked for. */
  computing: boolean
  /** What kept the newest run from being computed; the one shown is then an earlier one. */
  fault: string | null
}

type Ask = (request: TrialRequest) => Promise<TrialResult | null>

/**
 * Computes a run in a thread of the browser whenever what is asked changes, the ghosts after it.
 * A request of null leaves the last run as it is.
 */
export function useTrial(
  request: TrialRequest | null,
  ghosts: readonly Ghost[],
  first: Run,
): Trial {
  const ask = useRef<Ask | null>(null)
  // In a second thread, so that the next movement of a slider does not wait for them.
  const askBeside = useRef<Ask | null>(null)
  const [shown, setShown] = useState<{ run: Run; ghosts: readonly DrawnGhost[] }>({
    run: first,
    ghosts: [],
  })
  const [settled, setSettled] = useState<TrialRequest | null>(null)
  const [fault, setFault] = useState<string | null>(null)

  useEffect(() => {
    const [own, others] = [startTrialThread(), startTrialThread()]
    const asked = (thread: TrialThread): Ask =>
      newestOnly((job) => thread.call((trials) => trials.run(job)))
    ask.current = asked(own)
    askBeside.current = asked(others)
    return () => {
      ask.current = null
      askBeside.current = null
      own.end()
      others.end()
    }
  }, [])

  useEffect(() => {
    if (!request) return
    let current = true
    async function compute(asked: TrialRequest) {
      const result = await ask.current?.(asked)
      if (!result) return
      setShown(({ ghosts: earlier }) => ({
        run: { request: asked, result },
        ghosts: earlier.filter(({ helm }) => ghosts.includes(helm)),
      }))
      if (!current) return
      setSettled(asked)
      setFault(null)
      for (const helm of ghosts) {
        const beside = { ...asked, helm }
        const ghostResult = current ? await askBeside.current?.(beside) : null
        if (!ghostResult || !current) return
        const ghost = {
          helm,
          label: ghostLabels[helm],
          run: { request: beside, result: ghostResult },
        }
        setShown((earlier) => ({
          ...earlier,
          ghosts: [...earlier.ghosts.filter((other) => other.helm !== helm), ghost],
        }))
      }
    }
    compute(request).catch((error: unknown) => {
      if (!current) return
      setFault(error instanceof Error ? error.message : String(error))
      setSettled(request)
    })
    return () => {
      current = false
    }
  }, [request, ghosts])

  return { ...shown, computing: request !== null && settled !== request, fault }
}
