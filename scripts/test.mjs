import { checkTypes, lint, runTests } from './lib/checks.mjs'
import { command, tell } from './lib/command.mjs'
import {
  drop,
  dropAbandonedTests,
  siblingAddress,
  testDatabaseName,
} from './lib/postgres/databases.mjs'
import {
  prepareBrowser,
  prepareBuild,
  prepareCluster,
  prepareDatabase,
  prepareDependencies,
} from './lib/preparation.mjs'
import { liveRuns } from './lib/runs.mjs'
import { readSettings } from './lib/settings.mjs'
import { Stopped } from './lib/trouble.mjs'

/**
 * `npm test`: sets up what is not set up yet, then checks everything on a database of its own.
 * `npm test -- <words>` runs only the tests that vitest finds for these words, and no other check.
 */

const words = process.argv.slice(2)
const tally = { passed: 0, failed: 0 }

await command(async () => {
  try {
    await prepareDependencies()
    const { server, address } = await addresses()
    try {
      await checkAll(server, address)
    } finally {
      await drop(server, address)
    }
  } catch (error) {
    if (error instanceof Stopped) throw error
    tell(error)
    tally.failed += 1
  }
  process.stdout.write(`${tally.passed} passed, ${tally.failed} failed\n`)
  return tally.failed === 0 ? 0 : 1
})

/** A server to test on, and on it a database that only this run uses. */
async function addresses() {
  const { databaseUrl } = readSettings(process.env)
  const name = testDatabaseName()
  if (databaseUrl !== null) {
    return { server: databaseUrl, address: siblingAddress(databaseUrl, name) }
  }
  const cluster = await prepareCluster()
  const server = cluster.addressOf('postgres')
  const alive = new Set(liveRuns().map(({ pid }) => pid))
  await dropAbandonedTests(server, (pid) => alive.has(pid))
  return { server, address: cluster.addressOf(name) }
}

/**
 * @param {string} server
 * @param {string} address
 */
async function checkAll(server, address) {
  await prepareDatabase(address, { madeFrom: server })
  await prepareBrowser()
  const folder = await prepareBuild()
  if (words.length === 0) {
    count(await checkTypes())
    count(await lint())
  }
  count(await runTests(words, { DATABASE_URL: address, BUILD_FOLDER: folder }))
}

/** @param {import('./lib/checks.mjs').Tally} part */
function count(part) {
  tally.passed += part.passed
  tally.failed += part.failed
}
