import { parentPort } from 'node:worker_threads'
import { runTrial } from 'sim/trial/run'
import type { TrialResult } from 'sim/trial/types'
import type { Answer, Task } from './messages'

parentPort?.on('message', (task: Task) => {
  let answer: Answer
  const moved: ArrayBufferLike[] = []
  try {
    const result = runTrial(task.request)
    if (task.want === 'result') moved.push(...buffersOf(result))
    answer = task.want === 'result' ? { result } : { held: result.metrics.holds }
  } catch (error) {
    answer = { fault: error instanceof Error ? (error.stack ?? error.message) : String(error) }
  }
  parentPort?.postMessage(answer, moved as ArrayBuffer[])
})

function buffersOf(result: TrialResult): Set<ArrayBufferLike> {
  const columns = [result.series, result.boomDeg, result.drawing].flatMap(Object.values)
  return new Set(columns.map((column: Float64Array) => column.buffer))
}
