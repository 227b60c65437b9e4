import { parentPort } from 'node:worker_threads'
import { runHolds, runTrial } from 'sim/trial/run'
import type { TrialResult } from 'sim/trial/types'
import type { Answer, Task } from './messages'

parentPort?.on('message', (task: Task) => {
  let answer: Answer
  const moved: ArrayBufferLike[] = []
  try {
    answer = answerTo(task)
    if ('result' in answer) moved.push(...buffersOf(answer.result))
  } catch (error) {
    answer = { fault: error instanceof Error ? (error.stack ?? error.message) : String(error) }
  }
  parentPort?.postMessage(answer, moved as ArrayBuffer[])
})

function answerTo({ request, want }: Task): Answer {
  return want === 'result' ? { result: runTrial(request) } : { held: runHolds(request).holds }
}

function buffersOf(result: TrialResult): Set<ArrayBufferLike> {
  const columns = [result.series, result.boomDeg, result.drawing].flatMap(Object.values)
  return new Set(columns.map((column: Float64Array) => column.buffer))
}
