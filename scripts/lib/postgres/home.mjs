import { createHash } from 'node:crypto'
import {
  chmodSync,
  chownSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  writeFileSync,
} from 'node:fs'
import { basename, dirname, join } from 'node:path'
import { isRoot } from '../debian.mjs'
import { ProgramFailed, run } from '../programs.mjs'
import { root } from '../root.mjs'
import { Trouble } from '../trouble.mjs'

/**
 * The folder of this clone's database server: its data, its password and its log. A note in it
 * says whose it is; a folder without that note is somebody else's and is left alone.
 */

const markName = 'made-by-counterhelm.json'

/**
 * Runs one of PostgreSQL's programs, which refuse root, as a user that may.
 * @param {string} program
 * @param {string[]} args
 * @param {string} folder to run in
 */
export function runAsServerUser(program, args, folder) {
  const env = { PATH: process.env.PATH, HOME: folder, LC_ALL: 'C.UTF-8', TZ: 'UTC' }
  const options = { cwd: folder, env, shielded: true }
  if (!isRoot) return run(program, args, options)
  const asPostgres = ['--reuid=postgres', '--regid=postgres', '--init-groups']
  return run('setpriv', [...asPostgres, program, ...args], options)
}

/** Where the database lives: in the clone, or else where its user can reach it. */
export async function chooseHome() {
  const inClone = join(root, '.local', 'database')
  const outside = homeFor(root)
  if (!isRoot || existsSync(join(inClone, markName))) return inClone
  if (existsSync(join(outside, markName))) return outside
  return (await serverUserReaches(dirname(inClone))) ? inClone : outside
}

/**
 * @param {string} clone
 * @returns {string}
 */
export function homeFor(clone) {
  const name = basename(clone).replace(/[^A-Za-z0-9]+/g, '-') || 'clone'
  const key = createHash('sha256').update(clone).digest('hex').slice(0, 12)
  return join('/var/lib/counterhelm', `${name}-${key}`)
}

/** @param {string} folder */
async function serverUserReaches(folder) {
  try {
    await runAsServerUser('test', ['-x', folder], '/')
    return true
  } catch (error) {
    if (error instanceof ProgramFailed) return false
    throw error
  }
}

/**
 * Makes the folder ours, or makes sure that it is.
 * @param {string} home
 */
export function claimHome(home) {
  const mark = join(home, markName)
  if (existsSync(mark)) {
    const { clone } = JSON.parse(readFileSync(mark, 'utf8'))
    if (clone === root || home.startsWith(root)) return
    throw new Trouble(`The database in ${home} belongs to another clone, ${clone}.`)
  }
  if (existsSync(home) && readdirSync(home).some((name) => !name.startsWith(markName))) {
    throw new Trouble(`${home} holds files that this project did not make. Move them away.`)
  }
  mkdirSync(home, { recursive: true })
  // Whatever mask this user makes folders with, the server's user must get to his own.
  if (!home.startsWith(root)) chmodSync(dirname(home), 0o755)
  writeFileSync(`${mark}.part`, JSON.stringify({ clone: root }))
  renameSync(`${mark}.part`, mark)
  chmodSync(home, 0o700)
  giveToServerUser(home)
}

/**
 * Lets the user who runs the server have a file or folder.
 * @param {string} path
 */
export function giveToServerUser(path) {
  if (!isRoot) return
  const entry = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'))
    .find(([name]) => name === 'postgres')
  if (!entry) throw new Trouble('There is no user "postgres", who must run the database for root.')
  chownSync(path, Number(entry[2]), Number(entry[3]))
}
