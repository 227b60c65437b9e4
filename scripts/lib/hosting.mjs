import { createServer } from 'node:http'
import { readSettings } from './settings.mjs'
import { systemCode } from './trouble.mjs'

/** The inner side of a server process: it listens, reports, and ends when it is asked to. */

const graceMs = 3000

/**
 * @param {(server: import('node:http').Server) => Promise<import('node:http').RequestListener>} prepare
 */
export async function host(prepare) {
  try {
    const { host, port } = readSettings(process.env)
    const server = createServer()
    server.on('request', await prepare(server))
    await new Promise((resolve, reject) => {
      server.on('error', reject)
      server.listen({ host, port }, () => resolve(undefined))
    })
    endWhenAsked(server)
    const address = server.address()
    process.send?.({ listening: typeof address === 'object' ? address?.port : port })
  } catch (error) {
    if (!process.send) throw error
    const failed = error instanceof Error ? error.message : String(error)
    process.send({ failed, code: systemCode(error) }, () => process.exit(1))
  }
}

/**
 * Ends on a signal, and when the command that started this process is gone: answers what was
 * asked already, within reason, and nothing more.
 * @param {import('node:http').Server} server
 */
function endWhenAsked(server) {
  /** @type {Set<import('node:stream').Duplex>} */
  const kept = new Set()
  server.on('upgrade', (_request, socket) => {
    kept.add(socket)
    socket.on('close', () => kept.delete(socket))
  })
  const end = () => {
    server.close(() => process.exit(0))
    server.closeIdleConnections()
    for (const socket of kept) socket.destroy()
    setTimeout(() => process.exit(0), graceMs)
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.once(signal, end)
  process.once('disconnect', end)
}
