import type { TestProject } from 'vitest/node'
import { startServer } from '../../scripts/lib/server.mjs'

declare module 'vitest' {
  interface ProvidedContext {
    baseUrl: string
  }
}

/** The built application, served on a free port for all browser tests. */
export default async function setup(project: TestProject) {
  const { BUILD_FOLDER: folder, DATABASE_URL: databaseUrl } = process.env
  if (!folder || !databaseUrl) throw new Error('Browser tests need a build: run npm test')
  const place = { host: '127.0.0.1', port: 0 }
  const server = await startServer('build', place, {
    BUILD_FOLDER: folder,
    DATABASE_URL: databaseUrl,
  })
  project.provide('baseUrl', `http://127.0.0.1:${server.port}`)
  return () => server.stop()
}
