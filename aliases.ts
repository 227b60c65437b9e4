import { fileURLToPath } from 'node:url'

const folder = (name: string) => fileURLToPath(new URL(name, import.meta.url))

/** The import aliases of tsconfig.json; the bundler's dev server does not take them from there. */
export const aliases = [
  { find: /^~\//, replacement: folder('app/') },
  { find: /^sim\//, replacement: folder('sim/') },
  { find: /^db\//, replacement: folder('drizzle/') },
]
