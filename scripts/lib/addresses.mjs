import { createServer } from 'node:net'
import { systemCode, Trouble } from './trouble.mjs'

/** @returns {Promise<number>} a port on loopback that nobody listens on now */
export function freePort() {
  return listen('127.0.0.1', 0)
}

/**
 * Says at once, before any work, when the server could not listen there later.
 * @param {string} host
 * @param {number} port
 */
export async function checkAddress(host, port) {
  try {
    await listen(host, port)
  } catch (error) {
    throw addressTrouble(error, host, port)
  }
}

/**
 * @param {unknown} error
 * @param {string} host
 * @param {number} port
 */
export function addressTrouble(error, host, port) {
  switch (systemCode(error)) {
    case 'EADDRINUSE':
      return new Trouble(
        `Port ${port} on ${host} is in use. Stop the program that has it, or choose another port: ` +
          `PORT=${port < 65_535 ? port + 1 : 3000} npm start`,
      )
    case 'EACCES':
      return new Trouble(
        `This user may not listen on port ${port}. Choose one above 1023 with PORT.`,
      )
    case 'EADDRNOTAVAIL':
    case 'ENOTFOUND':
    case 'EAI_AGAIN':
      return new Trouble(`HOST must be an address of this machine, which "${host}" is not.`)
    default:
      return error
  }
}

/**
 * Listens for a moment.
 * @param {string} host
 * @param {number} port
 * @returns {Promise<number>} the port, also when any was asked for
 */
function listen(host, port) {
  const server = createServer()
  return new Promise((resolve, reject) => {
    server.on('error', reject)
    server.listen({ host, port }, () => {
      const address = server.address()
      server.close(() => resolve(address && typeof address === 'object' ? address.port : port))
    })
  })
}

/**
 * @param {string} host
 * @param {number} port
 */
export function urlOf(host, port) {
  return `http://${host.includes(':') ? `[${host}]` : host}:${port}`
}
