import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { processStat } from './processes.mjs'
import { root } from './root.mjs'
import { systemCode } from './trouble.mjs'

/**
 * The commands of this clone that run now, each with what it uses, so that the last one to end
 * stops the database and nobody's build is cleared away.
 * @typedef {{ pid: number, startedAt: string, usesCluster: boolean, builds: string[] }} Run
 */

const folder = join(root, '.local', 'runs')
const fileOf = (/** @type {number} */ pid) => join(folder, `${pid}.json`)

/** @param {{ usesCluster?: boolean, build?: string }} use that this command now makes */
export function noteRun({ usesCluster, build }) {
  const earlier = readRun(process.pid)
  const startedAt = processStat(process.pid)?.startedAt ?? ''
  const same = earlier?.startedAt === startedAt ? earlier : { usesCluster: false, builds: [] }
  /** @type {Run} */
  const run = {
    pid: process.pid,
    startedAt,
    usesCluster: usesCluster ?? same.usesCluster,
    builds: build === undefined ? same.builds : [...same.builds, build],
  }
  mkdirSync(folder, { recursive: true })
  writeFileSync(fileOf(process.pid), JSON.stringify(run))
}

export function forgetRun() {
  rmSync(fileOf(process.pid), { force: true })
}

/**
 * The runs that are alive; what a killed one left behind is cleared away.
 * @returns {Run[]}
 */
export function liveRuns() {
  const alive = []
  for (const pid of noted()) {
    const run = readRun(pid)
    if (run && processStat(pid)?.startedAt === run.startedAt) alive.push(run)
    else rmSync(fileOf(pid), { force: true })
  }
  return alive
}

/** @returns {number[]} */
function noted() {
  try {
    return readdirSync(folder).map((name) => Number.parseInt(name, 10))
  } catch (error) {
    if (systemCode(error) === 'ENOENT') return []
    throw error
  }
}

/**
 * @param {number} pid
 * @returns {Run | null} null also for a note that was cut short
 */
function readRun(pid) {
  try {
    return JSON.parse(readFileSync(fileOf(pid), 'utf8'))
  } catch (error) {
    if (error instanceof SyntaxError || systemCode(error) === 'ENOENT') return null
    throw error
  }
}
