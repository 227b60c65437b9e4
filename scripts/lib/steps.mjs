import { stopRequested } from './signals.mjs'
import { Stopped } from './trouble.mjs'

const titleWidth = 14

/**
 * Runs one step of the set-up with a line that names it, says how it went and how long it took.
 * The work is given `say`, for what takes long, and returns a few words on the outcome.
 * @template Outcome
 * @param {string} title
 * @param {(say: (what: string) => void) => Promise<Outcome> | Outcome} work
 * @param {(outcome: Outcome) => string} describe
 * @returns {Promise<Outcome>}
 */
export async function step(title, work, describe) {
  if (stopRequested.aborted) throw new Stopped(stopRequested.reason)
  const began = performance.now()
  process.stdout.write(`${title.padEnd(titleWidth)}`)
  try {
    const outcome = await work((what) => process.stdout.write(`${what} ... `))
    process.stdout.write(`${describe(outcome)}, ${seconds(began)}\n`)
    return outcome
  } catch (error) {
    process.stdout.write(`${error instanceof Stopped ? 'stopped' : 'failed'}, ${seconds(began)}\n`)
    throw error
  }
}

/** @param {number} began */
export function seconds(began) {
  return `${((performance.now() - began) / 1000).toFixed(1)} s`
}
