import { randomBytes } from 'node:crypto'
import { migrateDatabase } from 'db/prepare'
import pg from 'pg'

export interface ScratchDatabase {
  url: string
  drop(): Promise<void>
}

/** A database that only the test at hand uses, on the server that the tests were given. */
export async function scratchDatabase({ migrated = true } = {}): Promise<ScratchDatabase> {
  const given = process.env.TEST_SERVER_URL ?? process.env.DATABASE_URL
  if (!given) throw new Error('DATABASE_URL names no server to test on; run npm test')
  const name = `${new URL(given).pathname.slice(1)}_${randomBytes(6).toString('hex')}`
  await runOn(given, `create database ${name}`)
  const url = new URL(given)
  url.pathname = `/${name}`
  if (migrated) await migrateDatabase(url.href, 'drizzle/migrations')
  return { url: url.href, drop: () => runOn(given, `drop database ${name} with (force)`) }
}

/** Makes a scratch database the one that the server's modules open when they are imported. */
export async function openedScratchDatabase(): Promise<ScratchDatabase> {
  const scratch = await scratchDatabase()
  process.env.TEST_SERVER_URL ??= process.env.DATABASE_URL
  process.env.DATABASE_URL = scratch.url
  return scratch
}

export async function rowsOf<Row>(url: string, query: string): Promise<Row[]> {
  const client = new pg.Client({ connectionString: url })
  await client.connect()
  try {
    const { rows } = await client.query(query)
    return rows
  } finally {
    await client.end()
  }
}

async function runOn(url: string, statement: string): Promise<void> {
  await rowsOf(url, statement)
}
