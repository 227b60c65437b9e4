import { setupSchema } from 'sim/plan/schema'
import type { z } from 'zod'
import { boatEntrySchema } from '../boats/schema'

/** A setup as a list shows it: what it is meant for and, if wrong on purpose, what is wrong. */
export const setupEntrySchema = setupSchema
  .pick({ id: true, name: true, summary: true, source: true, conditions: true, flaw: true })
  .extend({
    boat: boatEntrySchema.pick({ id: true, name: true, type: true }),
    pull: setupSchema.shape.line.shape.pull,
  })

export type SetupEntry = z.infer<typeof setupEntrySchema>
