import { command } from './lib/command.mjs'
import { prepareDependencies, prepareServedDatabase } from './lib/preparation.mjs'
import { serve } from './lib/server.mjs'
import { readSettings } from './lib/settings.mjs'

/** `npm run dev`: like `npm start`, with what is edited changing in the open page. */

await command(() => {
  const settings = readSettings(process.env)
  return serve('sources', settings, async () => {
    await prepareDependencies()
    return { DATABASE_URL: await prepareServedDatabase(settings.databaseUrl) }
  })
})
