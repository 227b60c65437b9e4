import { randomBytes } from 'node:crypto'
import { systemCode, Trouble } from '../trouble.mjs'

/**
 * Does something over one connection, and tells in one line when the database does not answer.
 * @template Outcome
 * @param {string} address
 * @param {(client: import('pg').Client) => Promise<Outcome>} work
 * @returns {Promise<Outcome>}
 */
export async function connected(address, work) {
  const { Client } = (await import('pg')).default
  const client = new Client({ connectionString: address, connectionTimeoutMillis: 10_000 })
  // A server that goes away ends a waiting connection; the query under way then fails by itself.
  client.on('error', () => {})
  try {
    await client.connect()
  } catch (error) {
    throw new Trouble(`The database ${withoutPassword(address)} does not answer: ${why(error)}.`, {
      cause: error,
    })
  }
  try {
    return await work(client)
  } finally {
    await client.end()
  }
}

/** @param {unknown} error */
function why(error) {
  const code = systemCode(error)
  if (code === 'ECONNREFUSED') return 'nothing listens there'
  if (code === 'ENOTFOUND' || code === 'EAI_AGAIN') return 'there is no such host'
  return error instanceof Error ? error.message : String(error)
}

/** @param {string} address */
export function withoutPassword(address) {
  const url = new URL(address)
  url.password = ''
  url.search = ''
  return url.href
}

/**
 * The same server's database of another name.
 * @param {string} address
 * @param {string} database
 */
export function siblingAddress(address, database) {
  const url = new URL(address)
  url.pathname = `/${encodeURIComponent(database)}`
  return url.href
}

const nameOf = (/** @type {string} */ address) =>
  decodeURIComponent(new URL(address).pathname.slice(1))

/**
 * @param {string} server the address of another database there
 * @param {string} address
 */
export function createIfMissing(server, address) {
  const name = nameOf(address)
  return connected(server, async (client) => {
    const { rowCount } = await client.query('select from pg_database where datname = $1', [name])
    if (rowCount) return false
    await client.query(`create database ${client.escapeIdentifier(name)}`)
    return true
  })
}

/**
 * @param {string} server the address of another database there
 * @param {string} address
 */
export function drop(server, address) {
  return connected(server, (client) => dropNow(client, nameOf(address)))
}

/**
 * @param {import('pg').Client} client
 * @param {string} name
 */
function dropNow(client, name) {
  return client.query(`drop database if exists ${client.escapeIdentifier(name)} with (force)`)
}

const testPrefix = 'counterhelm_test_'

/**
 * The name of a database that the tests of one process have for themselves, on a server that
 * other machines may use as well.
 */
export const testDatabaseName = () =>
  `${testPrefix}${process.pid}_${randomBytes(4).toString('hex')}`

/**
 * Drops what killed test runs left behind on the clone's own server.
 * @param {string} server the address of another database there
 * @param {(pid: number) => boolean} isAlive
 */
export function dropAbandonedTests(server, isAlive) {
  return connected(server, async (client) => {
    const { rows } = await client.query('select datname from pg_database where datname like $1', [
      `${testPrefix}%`,
    ])
    for (const { datname } of rows) {
      if (isAlive(Number.parseInt(datname.slice(testPrefix.length), 10))) continue
      await dropNow(client, datname)
    }
  })
}
