import { drizzle } from 'drizzle-orm/node-postgres'
import { Pool } from 'pg'
import { environment } from './environment'
import { log } from './log'
import { onePerProcess } from './one-per-process'

function openPool(): Pool {
  const pool = new Pool({
    connectionString: environment.DATABASE_URL,
    connectionTimeoutMillis: 3000,
    statement_timeout: 10_000,
    query_timeout: 10_000,
  })
  // Without a listener, a database that goes away while a connection idles ends the process.
  pool.on('error', (error) => log.error({ err: error }, 'a database connection was lost'))
  return pool
}

const pool = onePerProcess('database', openPool, (earlier) => {
  earlier.end().catch((error: unknown) => log.error({ err: error }, 'connections did not close'))
})

export const database = drizzle(pool)
