import { fork } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { addressTrouble, checkAddress, urlOf } from './addresses.mjs'
import { untilStopRequested } from './signals.mjs'
import { seconds, step } from './steps.mjs'
import { Trouble } from './trouble.mjs'

/** The web server, in a process of its own so that it can be stopped even when it is too busy. */

const patienceMs = 8000

/**
 * @typedef {'build' | 'sources'} Kind what is served, by the script of that name
 * @typedef {{ host: string, port: number }} Place
 * @typedef {{ listening: number } | { failed: string, code: string }} Report
 * @typedef {object} Server
 * @property {number} port
 * @property {Promise<string | null>} ended with what ended it, when that was not a request
 * @property {() => Promise<void>} stop
 */

/**
 * Prepares, serves, and goes on until it is asked to stop.
 * @param {Kind} kind
 * @param {Place} place
 * @param {() => Promise<NodeJS.ProcessEnv>} prepare gives what the server needs to know
 * @returns {Promise<number>} the exit code
 */
export async function serve(kind, { host, port }, prepare) {
  const began = performance.now()
  if (port !== 0) await checkAddress(host, port)
  const env = await prepare()
  const server = await step(
    'Server',
    () => startServer(kind, { host, port }, env),
    () => 'started',
  )
  const url = urlOf(host, server.port)
  process.stdout.write(`Counterhelm is at ${url} after ${seconds(began)}. Ctrl-C stops it.\n`)
  const end = await Promise.race([untilStopRequested(), server.ended])
  if (end === undefined) await server.stop()
  else if (end !== null) throw new Trouble(`The server was ended by ${end}.`)
  process.stdout.write('Stopped.\n')
  return 0
}

/**
 * @param {Kind} kind
 * @param {Place} place
 * @param {NodeJS.ProcessEnv} env
 * @returns {Promise<Server>}
 */
export async function startServer(kind, { host, port }, env) {
  const script = fileURLToPath(new URL(`../servers/${kind}.mjs`, import.meta.url))
  const child = fork(script, {
    detached: true,
    env: {
      ...process.env,
      NODE_ENV: kind === 'build' ? 'production' : 'development',
      HOST: host,
      PORT: String(port),
      ...env,
    },
  })
  /** @type {Promise<string | null>} */
  const ended = new Promise((resolve) => {
    child.on('exit', (code, signal) => resolve(code === 0 ? null : (signal ?? `code ${code}`)))
  })
  /** @type {Promise<Report>} */
  const reported = new Promise((resolve) => child.once('message', resolve))
  const report = await Promise.race([reported, ended])
  if (report === null || typeof report === 'string') {
    throw new Trouble(`The server ended before it could serve${report ? `, by ${report}` : ''}.`)
  }
  if ('failed' in report) {
    await ended
    const error = Object.assign(new Error(report.failed), report.code && { code: report.code })
    const known = addressTrouble(error, host, port)
    throw known instanceof Trouble
      ? known
      : new Trouble(`The server cannot start: ${report.failed}`)
  }
  return {
    port: report.listening,
    ended,
    stop: async () => {
      if (child.connected) child.disconnect()
      const tooLong = setTimeout(() => child.kill('SIGKILL'), patienceMs)
      await ended
      clearTimeout(tooLong)
    },
  }
}
