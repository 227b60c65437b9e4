import { mkdirSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { alone } from './lock.mjs'
import { ProgramFailed, run } from './programs.mjs'
import { root } from './root.mjs'
import { step } from './steps.mjs'
import { systemCode } from './trouble.mjs'

/** @typedef {{ passed: number, failed: number }} Tally */

const bin = (/** @type {string} */ name) => join(root, 'node_modules', '.bin', name)

const colours = process.stdout.isTTY ? { FORCE_COLOR: '1' } : { NO_COLOR: '1' }

/** @returns {Promise<Tally>} */
export function checkTypes() {
  // Two runs would write the generated route types over each other.
  return check('Types', () =>
    alone('types', async () => {
      await run(bin('react-router'), ['typegen'])
      await run(bin('tsc'), ['--noEmit'])
      await run(bin('tsc'), ['--noEmit', '--project', 'sim'])
    }),
  )
}

/** @returns {Promise<Tally>} */
export function lint() {
  return check('Lint', () => run(bin('biome'), ['check', '--error-on-warnings', '.']))
}

/**
 * @param {string} title
 * @param {() => Promise<unknown>} work
 * @returns {Promise<Tally>}
 */
async function check(title, work) {
  /** @type {ProgramFailed | null} */
  const fault = await step(
    title,
    async () => {
      try {
        await work()
        return null
      } catch (error) {
        if (error instanceof ProgramFailed) return error
        throw error
      }
    },
    (failure) => (failure ? 'failed' : 'passed'),
  )
  if (fault) process.stdout.write(`${fault.output.trimEnd()}\n`)
  return fault ? { passed: 0, failed: 1 } : { passed: 1, failed: 0 }
}

/**
 * @param {string[]} args file names or options for vitest
 * @param {NodeJS.ProcessEnv} env what the tests need to know
 * @returns {Promise<Tally>}
 */
export async function runTests(args, env) {
  const folder = join(root, '.local', 'tests')
  const report = join(folder, `${process.pid}.json`)
  mkdirSync(folder, { recursive: true })
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  let completed = true
  try {
    await run(bin('vitest'), ['run', ...reporters, ...args], {
      env: { ...process.env, ...colours, ...env },
      show: true,
    })
  } catch (error) {
    if (!(error instanceof ProgramFailed)) throw error
    completed = false
  }
  const tally = tallyOf(readReport(report), completed)
  rmSync(report, { force: true })
  return tally
}

/**
 * @param {string[]} args file names or options for vitest
 * @returns {Promise<number>} the exit code
 */
export async function benchmark(args) {
  const options = ['bench', '--run', '--project=node', ...args]
  try {
    await run(bin('vitest'), options, { env: { ...process.env, ...colours }, show: true })
    return 0
  } catch (error) {
    if (error instanceof ProgramFailed) return 1
    throw error
  }
}

/**
 * @typedef {object} Report
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults
 */

/**
 * @param {string} file
 * @returns {Report | null} null when vitest ended before it could write one
 */
function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch (error) {
    if (systemCode(error) === 'ENOENT') return null
    throw error
  }
}

/**
 * Counts tests, and as one failure each file that could not even be read; a run that failed for
 * another reason, such as an error outside a test, is a failure too.
 * @param {Report | null} report
 * @param {boolean} completed
 * @returns {Tally}
 */
export function tallyOf(report, completed) {
  if (report === null) return { passed: 0, failed: 1 }
  const brokenFiles = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  )
  const failed = report.numFailedTests + brokenFiles.length
  return { passed: report.numPassedTests, failed: completed ? failed : Math.max(failed, 1) }
}
