import { createHash } from 'node:crypto'
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
} from 'node:fs'
import { join } from 'node:path'
import { alone } from './lock.mjs'
import { logPath, ProgramFailed, run } from './programs.mjs'
import { root } from './root.mjs'
import { liveRuns, noteRun } from './runs.mjs'
import { Trouble } from './trouble.mjs'

const shared = [
  'aliases.ts',
  'drizzle',
  'package-lock.json',
  'package.json',
  'sim',
  'tsconfig.json',
]

/** What is built: with what, and of what. Tests and documents change no build. */
const recipes = {
  application: {
    program: 'react-router',
    args: ['build'],
    sources: [
      ...shared,
      'app',
      'node-threads.ts',
      'public',
      'react-router.config.ts',
      'vite.config.ts',
    ],
  },
  /** What the commands themselves run of the project's TypeScript. */
  programs: {
    program: 'vite',
    args: ['build', '--config', 'vite.node.config.ts'],
    sources: [...shared, 'vite.node.config.ts'],
  },
}

const buildsFolder = join(root, 'build')

/**
 * Builds the application, or the programs, unless these very sources are built already. Each
 * state of the sources has a folder of its own, so that a server keeps its files while a newer
 * build is made.
 * @param {keyof typeof recipes} kind
 * @param {(what: string) => void} say
 * @returns {Promise<{ folder: string, fresh: boolean }>}
 */
export function ensureBuild(kind, say) {
  const { program, args, sources } = recipes[kind]
  return alone('build', async () => {
    const name = `${kind}-${fingerprint(root, sources)}`
    const folder = join(buildsFolder, name)
    noteRun({ build: name })
    if (existsSync(folder)) return { folder, fresh: false }
    say('building')
    clearAway()
    const env = {
      ...process.env,
      NODE_ENV: 'production',
      BUILD_FOLDER: `build/${name}.unfinished`,
    }
    try {
      await run(join(root, 'node_modules', '.bin', program), args, { env, log: `build-${kind}` })
    } catch (error) {
      if (!(error instanceof ProgramFailed)) throw error
      throw new Trouble(
        `The build failed: ${error.reason(/^\[[A-Z_]+\] |^\w*Error: /)}. All it wrote: ${logPath(`build-${kind}`)}`,
        { cause: error },
      )
    }
    renameSync(`${folder}.unfinished`, folder)
    return { folder, fresh: true }
  })
}

/** Removes the builds, and what is left of broken off ones, that no running command uses. */
function clearAway() {
  mkdirSync(buildsFolder, { recursive: true })
  const inUse = new Set(liveRuns().flatMap(({ builds }) => builds))
  for (const name of readdirSync(buildsFolder)) {
    if (!inUse.has(name)) rmSync(join(buildsFolder, name), { recursive: true, force: true })
  }
}

/**
 * A name for the content of files and folders: another one as soon as anything in them changes.
 * @param {string} base
 * @param {string[]} paths
 */
export function fingerprint(base, paths) {
  const hash = createHash('sha256')
  for (const file of paths.flatMap((path) => filesIn(base, path)).sort()) {
    const content = readFileSync(join(base, file))
    hash.update(`${file} ${content.length} `).update(content)
  }
  return hash.digest('hex').slice(0, 16)
}

/**
 * @param {string} base
 * @param {string} path
 * @returns {string[]}
 */
function filesIn(base, path) {
  const full = join(base, path)
  if (!existsSync(full)) return []
  if (statSync(full).isFile()) return [path]
  const entries = readdirSync(full, { withFileTypes: true, recursive: true })
  return entries
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(base.length + 1))
}
