import { expose, transfer } from 'comlink'
import { holdRate } from 'sim/trial/hold-rate'
import { runTrial } from 'sim/trial/run'
import type { TrialRequest, TrialResult } from 'sim/trial/types'

const trials = {
  run(request: TrialRequest): TrialResult {
    const result = runTrial(request)
    return transfer(result, buffersOf(result))
  },
  holdRate,
}

export type Trials = typeof trials

function buffersOf({ series, boomDeg, drawing }: TrialResult): ArrayBuffer[] {
  const columns = [series, boomDeg, drawing].flatMap((group) => Object.values(group))
  return [...new Set(columns.map((column) => column.buffer as ArrayBuffer))]
}

expose(trials)
