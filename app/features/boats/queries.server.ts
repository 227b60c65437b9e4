import { boats } from 'db/schema/boats'
import { asc, eq } from 'drizzle-orm'
import { boatSchema } from 'sim/plan/schema'
import type { Boat } from 'sim/plan/types'
import { database } from '~/server/database'
import type { BoatEntry } from './schema'

/** The demo boats, by name. */
export function listBoats(): Promise<BoatEntry[]> {
  const { id, name, type, summary } = boats
  return database
    .select({ id, name, type, summary })
    .from(boats)
    .where(eq(boats.demo, true))
    .orderBy(asc(boats.name), asc(boats.id))
}

export async function getBoat(id: string): Promise<Boat | undefined> {
  if (!boatSchema.shape.id.safeParse(id).success) return undefined
  const [row] = await database.select().from(boats).where(eq(boats.id, id))
  return row && boatOf(row)
}

/** The boat that a row describes. */
export function boatOf(row: Pick<typeof boats.$inferSelect, 'id' | 'document'>): Boat {
  return boatSchema.parse({ ...(row.document as object), id: row.id })
}
