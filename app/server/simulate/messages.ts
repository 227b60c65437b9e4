import type { TrialRequest, TrialResult } from 'sim/trial/types'

/** What a thread is asked: one run, and whether its traces are wanted or only whether it held. */
export interface Task {
  request: TrialRequest
  want: 'result' | 'held'
}

export type Answer = { result: TrialResult } | { held: boolean } | { fault: string }
