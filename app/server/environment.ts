import { availableParallelism } from 'node:os'
import { z } from 'zod'

const whole = (min: number, max: number) =>
  z.coerce
    .number({ error: `must be a whole number from ${min} to ${max}` })
    .int()
    .min(min)
    .max(max)

/** What the server reads from its environment. The README lists these for whoever runs it. */
const environmentSchema = z.object({
  DATABASE_URL: z.url({
    protocol: /^postgres(ql)?$/,
    error: 'must be the address of a PostgreSQL database, such as postgres://user@host:5432/name',
  }),
  /** Runs asked for over HTTP that are computed at the same time. */
  TRIAL_THREADS: whole(1, 64).default(availableParallelism()),
  /** Runs that may wait for a free thread before further ones are turned away. */
  TRIAL_QUEUE: whole(0, 1000).default(16),
  /** From a request's arrival to the moment its run is given up. */
  TRIAL_TIMEOUT_S: whole(1, 600).default(180),
})

export type Environment = z.infer<typeof environmentSchema>

/** Throws one line that names every variable that is missing or wrong. */
export function readEnvironment(variables: Record<string, string | undefined>): Environment {
  const read = environmentSchema.safeParse(variables)
  if (read.success) return read.data
  const faults = read.error.issues.map((issue) => `${issue.path.join('.')} ${issue.message}`)
  throw new Error(`The environment is not complete: ${faults.join('; ')}`)
}

export const environment = readEnvironment(process.env)
