import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { command } from './lib/command.mjs'
import { prepareDependencies } from './lib/preparation.mjs'
import { root } from './lib/root.mjs'
import { step } from './lib/steps.mjs'

/** `npm run docs`: writes into docs/model.md what the parameter tables say now. */

const page = join(root, 'docs', 'model.md')

await command(async () => {
  await prepareDependencies()
  await step(
    'Parameters',
    async () => {
      const { withParameters } = await bundled('scripts/docs/parameters.ts')
      const before = readFileSync(page, 'utf8')
      const after = withParameters(before)
      if (after !== before) writeFileSync(page, after)
      return after !== before
    },
    (changed) => (changed ? 'written' : 'as before'),
  )
  return 0
})

/**
 * A module of the project's TypeScript, bundled with what it imports.
 * @param {string} path
 */
async function bundled(path) {
  const { build } = await import('vite')
  const output = await build({
    root,
    configFile: false,
    logLevel: 'error',
    build: { ssr: path, write: false, target: 'node20' },
  })
  const [result] = Array.isArray(output) ? output : [output]
  if (!result || !('output' in result)) throw new Error(`${path} gave no bundle`)
  const { code } = result.output[0]
  return import(`data:text/javascript;base64,${Buffer.from(code).toString('base64')}`)
}
