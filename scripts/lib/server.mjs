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
 * @property {Promise<number>} ended with its exit code
 * @property {() => Promise<number>} stop
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
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => child.on('exit', (code) => resolve(code ?? 1)))
  /** @type {Promise<Report>} */
  const reported = new Promise((resolve) => child.once('message', resolve))
  const report = await Promise.race([reported, ended])
  if (typeof report === 'number') {
    throw new Trouble(`The server ended with code ${report} before it could serve.`)
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
      const code = await ended
      clearTimeout(tooLong)
      return code
    },
  }
}
