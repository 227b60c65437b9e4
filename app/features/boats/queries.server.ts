import { boats } from 'db/schema/boats'
import { asc, eq } from 'drizzle-orm'
import { sailParameters } from 'sim/parameters/sails'
import { boatSchema } from 'sim/plan/schema'
import type { Boat, Sail } from 'sim/plan/types'
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
  const boat: Boat = boatSchema.parse({ ...(row.document as object), id: row.id })
  return { ...boat, sails: inRigOrder(boat.sails) }
}

/** The database keeps no order of keys: mainsail first, then as the table of kinds has them. */
function inRigOrder(sails: Boat['sails']): Boat['sails'] {
  const kinds = Object.keys(sailParameters.kind.options)
  const place = ([, sail]: [string, Sail]) => kinds.indexOf(sail.kind)
  return Object.fromEntries(Object.entries(sails).sort((a, b) => place(a) - place(b)))
}
