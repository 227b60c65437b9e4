import { command } from './lib/command.mjs'
import { prepareBuild, prepareDependencies } from './lib/preparation.mjs'

/** `npm run build`: what `npm start` would build, without starting it. */

await command(async () => {
  await prepareDependencies()
  process.stdout.write(`${await prepareBuild()}\n`)
  return 0
})
