import { readFileSync } from 'node:fs'
import { migrateDatabase } from 'db/prepare'
import { boats } from 'db/schema/boats'
import { setups } from 'db/schema/setups'
import { generateDrizzleJson, generateMigration } from 'drizzle-kit/api'
import { expect, test } from 'vitest'
import { rowsOf, scratchDatabase } from './scratch-database'

test('the migrations give an empty database every table, and running them again changes nothing', async () => {
  const { url, drop } = await scratchDatabase({ migrated: false })
  try {
    const columns = () =>
      rowsOf<{ table_name: string; column_name: string }>(
        url,
        `select table_name, column_name from information_schema.columns
         where table_schema = 'public' order by table_name, ordinal_position`,
      )
    expect(await columns()).toEqual([])
    await migrateDatabase(url, 'drizzle/migrations')
    const first = await columns()
    expect([...new Set(first.map((column) => column.table_name))]).toEqual(['boats', 'setups'])
    await migrateDatabase(url, 'drizzle/migrations')
    expect(await columns()).toEqual(first)
  } finally {
    await drop()
  }
})

test('the migrations lead to the schema as it is written', async () => {
  const folder = 'drizzle/migrations/meta'
  const journal = JSON.parse(readFileSync(`${folder}/_journal.json`, 'utf8'))
  const last = String(journal.entries.at(-1).idx).padStart(4, '0')
  const migrated = JSON.parse(readFileSync(`${folder}/${last}_snapshot.json`, 'utf8'))
  const written = generateDrizzleJson({ boats, setups }, migrated.id)
  expect(await generateMigration(migrated, written)).toEqual([])
})

test('every time is kept with its time zone', async () => {
  const { url, drop } = await scratchDatabase()
  try {
    const times = await rowsOf<{ data_type: string }>(
      url,
      `select data_type from information_schema.columns
       where table_schema = 'public' and column_name like '%\\_at'`,
    )
    expect(times.length).toBeGreaterThan(0)
    for (const { data_type } of times) expect(data_type).toBe('timestamp with time zone')
  } finally {
    await drop()
  }
})
