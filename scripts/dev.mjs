import { createServer } from 'node:http'
import { addressTrouble, checkAddress, urlOf } from './lib/addresses.mjs'
import { command } from './lib/command.mjs'
import { prepareDependencies, prepareServedDatabase } from './lib/preparation.mjs'
import { root } from './lib/root.mjs'
import { readSettings } from './lib/settings.mjs'
import { untilStopRequested } from './lib/signals.mjs'
import { step } from './lib/steps.mjs'

/** `npm run dev`: serves the sources themselves, and what is edited changes in the open page. */

await command(async () => {
  const { host, port, databaseUrl } = readSettings(process.env)
  await checkAddress(host, port)
  await prepareDependencies()
  process.env.DATABASE_URL = await prepareServedDatabase(databaseUrl)
  process.env.NODE_ENV = 'development'
  const server = createServer()
  const vite = await step(
    'Vite',
    () => startVite(server),
    () => 'started',
  )
  server.on('request', (request, response) => {
    vite.middlewares(request, response, async () => {
      try {
        const { createApp } = await vite.ssrLoadModule('./app/server/app.ts')
        createApp()(request, response)
      } catch (error) {
        if (error instanceof Error) vite.ssrFixStacktrace(error)
        process.stderr.write(`${error instanceof Error ? error.stack : error}\n`)
        response.writeHead(500).end('The sources do not load; the terminal says why.')
      }
    })
  })
  await new Promise((resolve, reject) => {
    server.on('error', (error) => reject(addressTrouble(error, host, port)))
    server.listen({ host, port }, () => resolve(undefined))
  })
  process.stdout.write(`Counterhelm is at ${urlOf(host, port)}. Ctrl-C stops it.\n`)
  await untilStopRequested()
  server.closeAllConnections()
  await vite.close()
  process.stdout.write('Stopped.\n')
  return 0
})

/** @param {import('node:http').Server} server */
async function startVite(server) {
  const { createServer: createVite } = await import('vite')
  return createVite({ root, server: { middlewareMode: true, hmr: { server } } })
}
