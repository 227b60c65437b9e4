import { accessSync, constants, existsSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { installPackage } from '../debian.mjs'
import { Trouble } from '../trouble.mjs'

const debianFolder = '/usr/lib/postgresql'
const needed = ['initdb', 'pg_ctl', 'postgres']

/** @param {(what: string) => void} say */
export async function ensureInstalled(say) {
  if (pick(null)) return
  await installPackage('postgresql', 'PostgreSQL', say)
  if (pick(null)) return
  throw new Trouble(`PostgreSQL was installed, yet its programs are not in ${debianFolder}.`)
}

/**
 * The folder of PostgreSQL's programs: of the version that made the data there are, else of the
 * newest version.
 * @param {string | null} version such as 15
 */
export function binariesFor(version) {
  const folder = pick(version)
  if (folder) return folder
  throw new Trouble(
    `The database was made by PostgreSQL ${version}, whose programs are gone. ` +
      `Install them with: sudo apt-get install postgresql-${version}`,
  )
}

/** @param {string | null} version */
function pick(version) {
  const versions = existsSync(debianFolder) ? readdirSync(debianFolder) : []
  return (
    versions
      .filter((each) => version === null || each === version)
      .sort((a, b) => Number(b) - Number(a))
      .map((each) => join(debianFolder, each, 'bin'))
      .find(hasAll) ?? null
  )
}

/** @param {string} folder */
function hasAll(folder) {
  return needed.every((name) => isExecutable(join(folder, name)))
}

/** @param {string} file */
function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK)
    return true
  } catch {
    return false
  }
}
