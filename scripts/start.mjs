import { checkAddress, urlOf } from './lib/addresses.mjs'
import { command } from './lib/command.mjs'
import { prepareBuild, prepareDependencies, prepareServedDatabase } from './lib/preparation.mjs'
import { startServer } from './lib/server.mjs'
import { readSettings } from './lib/settings.mjs'
import { untilStopRequested } from './lib/signals.mjs'
import { seconds, step } from './lib/steps.mjs'
import { Trouble } from './lib/trouble.mjs'

/** `npm start`: sets up what is not set up yet, then serves. */

await command(async () => {
  const began = performance.now()
  const { host, port, databaseUrl } = readSettings(process.env)
  if (port !== 0) await checkAddress(host, port)
  await prepareDependencies()
  const address = await prepareServedDatabase(databaseUrl)
  const folder = await prepareBuild()
  const server = await step(
    'Server',
    () => startServer({ folder, host, port, databaseUrl: address }),
    () => 'started',
  )
  process.stdout.write(
    `Counterhelm is at ${urlOf(host, server.port)} after ${seconds(began)}. Ctrl-C stops it.\n`,
  )
  const ended = await Promise.race([untilStopRequested(), server.ended])
  if (ended === undefined) await server.stop()
  else if (ended !== null) throw new Trouble(`The server was ended by ${ended}.`)
  process.stdout.write('Stopped.\n')
  return 0
})
