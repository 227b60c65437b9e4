import { type SQL, sql } from 'drizzle-orm'
import { boolean, index, jsonb, pgTable, text, timestamp } from 'drizzle-orm/pg-core'

/**
 * A boat's description is one document, read through the model's schema; what lists sort and
 * show is generated from it, so that it cannot disagree.
 */
export const boats = pgTable(
  'boats',
  {
    id: text().primaryKey(),
    document: jsonb().notNull(),
    demo: boolean().notNull().default(false),
    name: text()
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${boats.document} ->> 'name')`),
    type: text()
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${boats.document} ->> 'type')`),
    summary: text()
      .notNull()
      .generatedAlwaysAs((): SQL => sql`(${boats.document} ->> 'summary')`),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [index('boats_demo_name_index').on(table.demo, table.name)],
)
