import { build, type Plugin, type Rolldown } from 'vite'
import { aliases } from './aliases.ts'

const suffix = '?thread'

/**
 * `import source from './thread?thread'` gives a module, bundled with all it imports, as the
 * text of a script for a Node worker thread: the same in development, build and tests.
 */
export function nodeThreads(): Plugin {
  return {
    name: 'node-threads',
    resolveId: {
      filter: { id: /\?thread$/ },
      async handler(id, importer) {
        const resolved = await this.resolve(id.slice(0, -suffix.length), importer)
        return resolved && resolved.id + suffix
      },
    },
    load: {
      filter: { id: /\?thread$/ },
      async handler(id) {
        const output = await build({
          configFile: false,
          logLevel: 'error',
          resolve: { alias: aliases },
          ssr: { noExternal: true },
          build: {
            ssr: id.slice(0, -suffix.length),
            write: false,
            target: 'node20',
            rolldownOptions: { output: { format: 'cjs', codeSplitting: false } },
          },
        })
        const [chunk] = (output as Rolldown.RolldownOutput).output
        for (const file of chunk.moduleIds) this.addWatchFile(file)
        return `export default ${JSON.stringify(chunk.code)}`
      },
    },
  }
}
