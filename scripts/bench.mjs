import { benchmark } from './lib/checks.mjs'
import { command } from './lib/command.mjs'
import { prepareDependencies } from './lib/preparation.mjs'

/** `npm run bench`: how long the model takes, whole and in parts. */

await command(async () => {
  await prepareDependencies()
  return benchmark(process.argv.slice(2))
})
