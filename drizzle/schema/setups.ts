import { type SQL, sql } from 'drizzle-orm'
import {
  boolean,
  doublePrecision,
  index,
  jsonb,
  pgTable,
  text,
  timestamp,
} from 'drizzle-orm/pg-core'
import { boats } from './boats'

/** A setup of one boat: trims, control line, leads, elastic and the conditions it is meant for. */
export const setups = pgTable(
  'setups',
  {
    id: text().primaryKey(),
    boatId: text('boat_id')
      .notNull()
      .references(() => boats.id, { onDelete: 'cascade', onUpdate: 'cascade' }),
    document: jsonb().notNull(),
    demo: boolean().notNull().default(false),
    name: text()
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${setups.document} ->> 'name')`),
    summary: text()
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${setups.document} ->> 'summary')`),
    source: text()
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${setups.document} ->> 'source')`),
    courseOffWindDeg: doublePrecision('course_off_wind_deg')
      .notNull()
      .generatedAlwaysAs(
        (): SQL =>
          sql`abs((${setups.document} -> 'conditions' ->> 'trueWindAngleDeg')::double precision)`,
      ),
    trueWindSpeedKn: doublePrecision('true_wind_speed_kn')
      .notNull()
      .generatedAlwaysAs(
        (): SQL =>
          sql`((${setups.document} -> 'conditions' ->> 'trueWindSpeedKn')::double precision)`,
      ),
    wrongOnPurpose: boolean('wrong_on_purpose')
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${setups.document} ? 'flaw')`),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [
    index('setups_boat_course_index').on(
      table.boatId,
      table.wrongOnPurpose,
      table.courseOffWindDeg,
      table.trueWindSpeedKn,
    ),
    index('setups_demo_index').on(table.demo),
  ],
)
