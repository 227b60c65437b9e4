import { boats } from 'db/schema/boats'
import { setups } from 'db/schema/setups'
import { asc, eq, sql } from 'drizzle-orm'
import { setupSchema } from 'sim/plan/schema'
import type { Plan, Setup } from 'sim/plan/types'
import { database } from '~/server/database'
import { boatOf } from '../boats/queries.server'
import { type SetupEntry, setupEntrySchema } from './schema'

/** The demo setups: by boat, those that are wrong on purpose last, then from close-hauled to running. */
export async function listSetups(): Promise<SetupEntry[]> {
  const rows = await database
    .select({
      id: setups.id,
      name: setups.name,
      summary: setups.summary,
      source: setups.source,
      boat: { id: boats.id, name: boats.name, type: boats.type },
      conditions: sql`${setups.document} -> 'conditions'`,
      pull: sql`${setups.document} -> 'line' ->> 'pull'`,
      flaw: sql`${setups.document} -> 'flaw'`,
    })
    .from(setups)
    .innerJoin(boats, eq(boats.id, setups.boatId))
    .where(eq(setups.demo, true))
    .orderBy(
      asc(boats.name),
      asc(setups.wrongOnPurpose),
      asc(setups.courseOffWindDeg),
      asc(setups.trueWindSpeedKn),
      asc(setups.id),
    )
  return rows.map((row) => setupEntrySchema.parse({ ...row, flaw: row.flaw ?? undefined }))
}

export async function getSetup(id: string): Promise<Setup | undefined> {
  if (!isSetupId(id)) return undefined
  const [row] = await database.select().from(setups).where(eq(setups.id, id))
  return row && setupOf(row)
}

/** A setup with its boat. */
export async function getPlan(setupId: string): Promise<Plan | undefined> {
  if (!isSetupId(setupId)) return undefined
  const [row] = await database
    .select()
    .from(setups)
    .innerJoin(boats, eq(boats.id, setups.boatId))
    .where(eq(setups.id, setupId))
  return row && { boat: boatOf(row.boats), setup: setupOf(row.setups) }
}

function isSetupId(id: string): boolean {
  return setupSchema.shape.id.safeParse(id).success
}

function setupOf({ id, boatId, document }: typeof setups.$inferSelect): Setup {
  return setupSchema.parse({ ...(document as object), id, boatId })
}
