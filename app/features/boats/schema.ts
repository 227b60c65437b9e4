import { boatSchema } from 'sim/plan/schema'
import type { z } from 'zod'

/** A boat as a list shows her. */
export const boatEntrySchema = boatSchema.pick({ id: true, name: true, type: true, summary: true })

export type BoatEntry = z.infer<typeof boatEntrySchema>
