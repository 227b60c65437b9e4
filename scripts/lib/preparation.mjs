import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { ensureBuild } from './build.mjs'
import { installPackage } from './debian.mjs'
import { ensureDependencies } from './dependencies.mjs'
import { alone } from './lock.mjs'
import { joinCluster } from './postgres/cluster.mjs'
import { connected, createIfMissing } from './postgres/databases.mjs'
import { root } from './root.mjs'
import { step } from './steps.mjs'
import { systemCode, Trouble } from './trouble.mjs'

/** The steps of the set-up that the commands share. */

const chromiumPath = process.env.CHROMIUM || '/usr/bin/chromium'

export function prepareDependencies() {
  return step(
    'Dependencies',
    (say) => alone('dependencies', () => ensureDependencies(say)),
    (outcome) => outcome,
  )
}

/** @returns {Promise<string>} the folder of the built application */
export async function prepareBuild() {
  const { folder } = await step(
    'Build',
    (say) => ensureBuild('application', say),
    ({ fresh }) => (fresh ? 'done' : 'as before'),
  )
  return folder
}

/**
 * The database to serve: the given one, or one on the clone's own server.
 * @param {string | null} given
 * @returns {Promise<string>} its address
 */
export async function prepareServedDatabase(given) {
  if (given !== null) {
    await prepareDatabase(given)
    return given
  }
  const cluster = await prepareCluster()
  const address = cluster.addressOf('counterhelm')
  await prepareDatabase(address, { madeFrom: cluster.addressOf('postgres') })
  return address
}

/** Makes sure that there is a browser to test with, on a path that CHROMIUM may give. */
export function prepareBrowser() {
  return step(
    'Chromium',
    async (say) => {
      if (existsSync(chromiumPath)) return false
      await installPackage('chromium', 'Chromium', say)
      return true
    },
    (installed) => (installed ? 'installed' : 'there'),
  )
}

export function prepareCluster() {
  return step('PostgreSQL', joinCluster, ({ state }) => state)
}

/**
 * Makes the database when a server of which it is to be made is given, and brings its tables and
 * demo data up to date.
 * @param {string} address
 * @param {{ madeFrom?: string }} [options] the address of another database on the same server
 */
export function prepareDatabase(address, { madeFrom } = {}) {
  return step(
    'Database',
    (say) =>
      alone('tables', async () => {
        const made = madeFrom !== undefined && (await createIfMissing(madeFrom, address))
        await connected(address, (client) => client.query('select'))
        const { migrateDatabase, loadDemo } = await loadPrograms(say)
        await attempt('Its tables were not brought up to date', () =>
          migrateDatabase(address, join(root, 'drizzle', 'migrations')),
        )
        await attempt('The demo boats and setups were not loaded', () => loadDemo(address))
        return made
      }),
    (made) => (made ? 'made, with demo data' : 'up to date'),
  )
}

/**
 * @param {(what: string) => void} say
 * @returns {Promise<typeof import('../../drizzle/prepare')>}
 */
async function loadPrograms(say) {
  const { folder } = await ensureBuild('programs', (what) => say(`${what} what loads it`))
  return import(pathToFileURL(join(folder, 'prepare-database.js')).href)
}

/**
 * @param {string} what went wrong, if it does
 * @param {() => Promise<void>} work
 */
async function attempt(what, work) {
  try {
    await work()
  } catch (error) {
    // The query builder's own message is the whole query; its cause says what the server answered.
    const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error
    if (systemCode(cause) === '') throw error
    throw new Trouble(`${what}: ${cause instanceof Error ? cause.message : cause}.`, { cause })
  }
}
