import { command } from './lib/command.mjs'
import { prepareBuild, prepareDependencies, prepareServedDatabase } from './lib/preparation.mjs'
import { serve } from './lib/server.mjs'
import { readSettings } from './lib/settings.mjs'

/** `npm start`: sets up what is not set up yet, then serves. */

await command(() => {
  const settings = readSettings(process.env)
  return serve('build', settings, async () => {
    await prepareDependencies()
    const databaseUrl = await prepareServedDatabase(settings.databaseUrl)
    return { DATABASE_URL: databaseUrl, BUILD_FOLDER: await prepareBuild() }
  })
})
