import { fork } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { addressTrouble } from './addresses.mjs'
import { Trouble } from './trouble.mjs'

/** The web server, in a process of its own so that it can be stopped even when it is too busy. */

const script = fileURLToPath(new URL('../serve.mjs', import.meta.url))
const patienceMs = 8000

/**
 * @typedef {{ listening: number } | { failed: string, code: string }} Report
 * @typedef {object} Server
 * @property {number} port
 * @property {Promise<string | null>} ended with what ended it, when that was not a request
 * @property {() => Promise<void>} stop
 */

/**
 * @param {{ folder: string, host: string, port: number, databaseUrl: string }} settings
 * @returns {Promise<Server>}
 */
export async function startServer({ folder, host, port, databaseUrl }) {
  const child = fork(script, {
    detached: true,
    env: {
      ...process.env,
      NODE_ENV: 'production',
      HOST: host,
      PORT: String(port),
      DATABASE_URL: databaseUrl,
      BUILD_FOLDER: folder,
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
