import { sql } from 'drizzle-orm'
import { MODEL_VERSION } from 'sim/version'
import { database } from '~/server/database'
import { log } from '~/server/log'
import type { Health } from './schema'

export async function healthOf(): Promise<Health> {
  try {
    await database.execute(sql`select 1`)
    return { status: 'ready', database: 'reachable', modelVersion: MODEL_VERSION }
  } catch (error) {
    log.warn({ err: error }, 'the database does not answer')
    return { status: 'unavailable', database: 'unreachable', modelVersion: MODEL_VERSION }
  }
}
