import { drizzle } from 'drizzle-orm/node-postgres'
import { migrate } from 'drizzle-orm/node-postgres/migrator'

export { loadDemo } from './demo/load'

/** Brings the tables of a database to the present schema. */
export async function migrateDatabase(databaseUrl: string, migrationsFolder: string) {
  const database = drizzle(databaseUrl)
  try {
    await migrate(database, { migrationsFolder })
  } finally {
    await database.$client.end()
  }
}
