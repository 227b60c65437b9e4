import { and, eq, notInArray, sql } from 'drizzle-orm'
import { drizzle } from 'drizzle-orm/node-postgres'
import { boatSchema, setupSchema } from 'sim/plan/schema'
import type { Boat, Setup } from 'sim/plan/types'
import { boats } from '../schema/boats'
import { setups } from '../schema/setups'
import { demoBoats } from './boats'
import { demoSetups } from './setups'

export interface Demo {
  boats: readonly Boat[]
  setups: readonly Setup[]
}

/**
 * Makes the demo boats and setups in the database the ones given: adds and corrects them, and
 * removes those that are gone. Running it again changes nothing.
 */
export async function loadDemo(
  databaseUrl: string,
  demo: Demo = { boats: demoBoats, setups: demoSetups },
): Promise<void> {
  const boatRows = demo.boats.map((boat) => {
    const { id, ...document } = boatSchema.parse(boat)
    return { id, document, demo: true }
  })
  const setupRows = demo.setups.map((setup) => {
    const { id, boatId, ...document } = setupSchema.parse(setup)
    return { id, boatId, document, demo: true }
  })
  const database = drizzle(databaseUrl)
  try {
    await database.transaction(async (transaction) => {
      for (const row of boatRows) {
        await transaction
          .insert(boats)
          .values(row)
          .onConflictDoUpdate({
            target: boats.id,
            set: { document: row.document, demo: true, updatedAt: sql`now()` },
            setWhere: sql`(${boats.document}, ${boats.demo}) is distinct from (excluded.document, true)`,
          })
      }
      for (const row of setupRows) {
        await transaction
          .insert(setups)
          .values(row)
          .onConflictDoUpdate({
            target: setups.id,
            set: {
              boatId: row.boatId,
              document: row.document,
              demo: true,
              updatedAt: sql`now()`,
            },
            setWhere: sql`(${setups.boatId}, ${setups.document}, ${setups.demo}) is distinct from (excluded.boat_id, excluded.document, true)`,
          })
      }
      const kept = (rows: { id: string }[]) => rows.map((row) => row.id)
      await transaction
        .delete(setups)
        .where(and(eq(setups.demo, true), notInArray(setups.id, kept(setupRows))))
      await transaction
        .delete(boats)
        .where(and(eq(boats.demo, true), notInArray(boats.id, kept(boatRows))))
    })
  } finally {
    await database.$client.end()
  }
}
