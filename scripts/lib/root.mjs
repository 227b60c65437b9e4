import { realpathSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

/** The folder of this clone. */
export const root = realpathSync(fileURLToPath(new URL('../..', import.meta.url)))
