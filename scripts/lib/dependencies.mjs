import { existsSync, readFileSync, statfsSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { logPath, ProgramFailed, run } from './programs.mjs'
import { root } from './root.mjs'
import { Trouble } from './trouble.mjs'

/** @typedef {Record<string, { version?: string, integrity?: string, optional?: boolean }>} Packages */

const neededMegabytes = 500
const modules = join(root, 'node_modules')
const platformFile = join(modules, '.platform')
const platform = `node ${process.versions.modules} ${process.platform} ${process.arch}`

/**
 * Installs what the lock says, when that is not what is there.
 * @param {(what: string) => void} say
 * @returns {Promise<'installed' | 'as locked'>}
 */
export async function ensureDependencies(say) {
  if (areInstalled()) return 'as locked'
  checkSpace(statfsSync(root))
  say('installing from the lock')
  try {
    await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
      log: 'dependencies',
    })
  } catch (error) {
    if (!(error instanceof ProgramFailed)) throw error
    const reason = error.reason(/^npm (error|ERR!) (?!code|syscall|errno|path|dest|A complete|\/)/)
    throw new Trouble(
      `The dependencies were not installed: ${reason}. All npm wrote: ${logPath('dependencies')}`,
      { cause: error },
    )
  }
  writeFileSync(platformFile, platform)
  return 'installed'
}

/**
 * npm that runs out of space gives up without a word.
 * @param {{ bavail: number, bsize: number }} disk
 */
export function checkSpace({ bavail, bsize }) {
  const free = Math.floor((bavail * bsize) / 1e6)
  if (free >= neededMegabytes) return
  throw new Trouble(
    `The disk that holds ${root} is too full: the dependencies take ${neededMegabytes} MB and ` +
      `${free} MB are free.`,
  )
}

function areInstalled() {
  const installedLock = join(modules, '.package-lock.json')
  if (!existsSync(installedLock)) return false
  if (existsSync(platformFile) && readFileSync(platformFile, 'utf8') !== platform) return false
  return sameAsLock(packagesIn(join(root, 'package-lock.json')), packagesIn(installedLock))
}

/**
 * @param {string} file
 * @returns {Packages}
 */
function packagesIn(file) {
  return JSON.parse(readFileSync(file, 'utf8')).packages
}

/**
 * Whether what npm notes as installed is what the lock asks for; optional packages, made for
 * other machines, may be absent.
 * @param {Packages} locked
 * @param {Packages} installed
 */
export function sameAsLock(locked, installed) {
  for (const [path, wanted] of Object.entries(locked)) {
    if (path === '') continue
    const found = installed[path]
    if (found === undefined && wanted.optional) continue
    if (found?.version !== wanted.version || found?.integrity !== wanted.integrity) return false
  }
  return Object.keys(installed).every((path) => path in locked)
}
