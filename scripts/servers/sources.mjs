import { createServer } from 'vite'
import { host } from '../lib/hosting.mjs'
import { root } from '../lib/root.mjs'

/** Serves the sources as they are, and keeps open pages up to date with them. */

await host(async (server) => {
  const vite = await createServer({ root, server: { middlewareMode: true, hmr: { server } } })
  return (request, response) => {
    vite.middlewares(request, response, async () => {
      try {
        const { createApp } = await vite.ssrLoadModule('./app/server/app.ts')
        const app = await createApp()
        app(request, response)
      } catch (error) {
        if (error instanceof Error) vite.ssrFixStacktrace(error)
        process.stderr.write(`${error instanceof Error ? error.stack : error}\n`)
        response.writeHead(500).end('The sources do not load; the terminal says why.')
      }
    })
  }
})
