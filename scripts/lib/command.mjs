import { leaveCluster } from './postgres/cluster.mjs'
import { root } from './root.mjs'
import { forgetRun, noteRun } from './runs.mjs'
import { checkNode } from './settings.mjs'
import { listenForSignals } from './signals.mjs'
import { inOneLine, Stopped, systemCode, Trouble } from './trouble.mjs'

const codeAfter = { SIGHUP: 129, SIGINT: 130, SIGTERM: 143 }

/**
 * Runs one of the npm commands: what goes wrong is told in one line, and however it ends, what
 * it started is stopped.
 * @param {() => Promise<number>} work gives the exit code
 */
export async function command(work) {
  listenForSignals()
  let code = await guarded(async () => {
    checkNode(process.versions.node)
    noteRun({})
    return work()
  })
  const left = await guarded(async () => {
    await leaveCluster()
    forgetRun()
    return 0
  })
  code ||= left
  process.exit(code)
}

/**
 * @param {() => Promise<number>} work
 * @returns {Promise<number>}
 */
async function guarded(work) {
  try {
    return await work()
  } catch (error) {
    if (error instanceof Stopped) return codeAfter[error.signal] ?? 1
    tell(error)
    return 1
  }
}

/**
 * Says in one line what went wrong; only a fault of the commands themselves shows its stack.
 * @param {unknown} error
 */
export function tell(error) {
  process.stderr.write(`${inOneLine(error, root)}\n`)
  const known = error instanceof Trouble || systemCode(error) !== ''
  if (!known && error instanceof Error) process.stderr.write(`${error.stack}\n`)
}
