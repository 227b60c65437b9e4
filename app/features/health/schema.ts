import { z } from 'zod'

export const healthSchema = z.strictObject({
  status: z.enum(['ready', 'unavailable']),
  database: z.enum(['reachable', 'unreachable']),
  modelVersion: z.string(),
})

export type Health = z.infer<typeof healthSchema>
