import { readFileSync, readlinkSync, realpathSync } from 'node:fs'
import { systemCode } from './trouble.mjs'

/**
 * What the kernel says of a living process. When it started, in the kernel's ticks, tells it from
 * a later process with the same id.
 * @param {number} pid
 * @returns {{ name: string, parent: number, startedAt: string } | null}
 */
export function processStat(pid) {
  const stat = unlessGone(() => readFileSync(`/proc/${pid}/stat`, 'utf8'))
  if (stat === null) return null
  const nameEnd = stat.lastIndexOf(')')
  const fields = stat.slice(nameEnd + 2).split(' ')
  return {
    name: stat.slice(stat.indexOf('(') + 1, nameEnd),
    parent: Number(fields[1]),
    startedAt: fields[19] ?? '',
  }
}

/**
 * Whether a process lives whose working folder is this one, as a database server's is its data.
 * @param {number} pid
 * @param {string} folder
 */
export function worksIn(pid, folder) {
  return unlessGone(() => readlinkSync(`/proc/${pid}/cwd`)) === realpathSync(folder)
}

/**
 * @template Outcome
 * @param {() => Outcome} read
 * @returns {Outcome | null} null when the process is gone or is another user's
 */
function unlessGone(read) {
  try {
    return read()
  } catch (error) {
    if (['ENOENT', 'ESRCH', 'EACCES'].includes(systemCode(error))) return null
    throw error
  }
}
