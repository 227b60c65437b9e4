import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { host } from '../lib/hosting.mjs'

/** Serves the build in BUILD_FOLDER. */

await host(async () => {
  const folder = process.env.BUILD_FOLDER ?? ''
  const { createApp } = await import(pathToFileURL(join(folder, 'server', 'index.js')).href)
  return createApp({ clientFolder: join(folder, 'client') })
})
