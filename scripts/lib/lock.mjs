import { createHash } from 'node:crypto'
import { createServer } from 'node:net'
import { setTimeout as delay } from 'node:timers/promises'
import { root } from './root.mjs'
import { stopRequested } from './signals.mjs'
import { Stopped, systemCode } from './trouble.mjs'

/**
 * Does the work while no other command of this clone does work under the same name. The lock is
 * a socket address without a file, which the kernel frees when its holder ends, however it ends.
 * @template Outcome
 * @param {string} name
 * @param {() => Promise<Outcome>} work
 * @param {{ evenWhenStopping?: boolean }} [options]
 * @returns {Promise<Outcome>}
 */
export async function alone(name, work, { evenWhenStopping = false } = {}) {
  const key = createHash('sha256').update(`${root} ${name}`).digest('hex').slice(0, 32)
  for (let tries = 0; ; tries += 1) {
    const release = await take(`\0counterhelm-${key}`)
    if (release) {
      try {
        return await work()
      } finally {
        await release()
      }
    }
    if (tries === 20) process.stdout.write('waiting for another command of this clone ... ')
    if (stopRequested.aborted && !evenWhenStopping) throw new Stopped(stopRequested.reason)
    await delay(100)
  }
}

/**
 * @param {string} address
 * @returns {Promise<(() => Promise<void>) | null>} how to release it, or null when it is taken
 */
function take(address) {
  const server = createServer((socket) => socket.destroy())
  return new Promise((resolve, reject) => {
    server.on('error', (error) => {
      if (systemCode(error) === 'EADDRINUSE') resolve(null)
      else reject(error)
    })
    server.listen(address, () => resolve(() => new Promise((done) => server.close(() => done()))))
  })
}
