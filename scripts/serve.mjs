import { createServer } from 'node:http'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { readSettings } from './lib/settings.mjs'
import { systemCode } from './lib/trouble.mjs'

/** Serves a build until the command that started it, or a signal, asks it to end. */

const graceMs = 3000

try {
  const { host, port } = readSettings(process.env)
  const folder = process.env.BUILD_FOLDER ?? ''
  const { createApp } = await import(pathToFileURL(join(folder, 'server', 'index.js')).href)
  const server = createServer(createApp({ clientFolder: join(folder, 'client') }))
  await new Promise((resolve, reject) => {
    server.on('error', reject)
    server.listen({ host, port }, () => resolve(undefined))
  })
  const stop = () => {
    server.close(() => process.exit(0))
    server.closeIdleConnections()
    setTimeout(() => server.closeAllConnections(), graceMs)
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.once(signal, stop)
  process.once('disconnect', stop)
  const address = server.address()
  process.send?.({ listening: typeof address === 'object' ? address?.port : port })
} catch (error) {
  const failed = error instanceof Error ? error.message : String(error)
  if (!process.send) throw error
  process.send({ failed, code: systemCode(error) }, () => process.exit(1))
}
