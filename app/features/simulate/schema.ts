import { boatSchema, conditionsSchema, setupSchema, trialEventSchema } from 'sim/plan/schema'
import { TICK } from 'sim/trial/run'
import { z } from 'zod'
import { bounds } from './bounds'

const { durationS, outputIntervalS, seeds } = bounds

/** A setup that need not be stored: with its boat written out, or with the id of a demo boat. */
export const wholeSetupSchema = setupSchema
  .partial({ id: true, name: true, summary: true, boatId: true })
  .extend({
    boat: boatSchema.optional().describe('The boat, written out; else boatId names a demo boat'),
  })

export const askedConditionsSchema = conditionsSchema
  .partial()
  .extend({
    events: z
      .array(trialEventSchema)
      .max(bounds.events, { error: `at most ${bounds.events} events` })
      .optional()
      .describe('What happens during the run, at times from its start'),
  })
  .describe("Wind and sea; what is left out is the setup's own")

export const simulateRequestSchema = z.strictObject({
  setup: z
    .union([z.string(), wholeSetupSchema], {
      error: 'must be the id of a setup or a whole setup',
    })
    .describe('The id of a setup, or a whole setup'),
  conditions: askedConditionsSchema.default({}),
  changes: z
    .record(z.string(), z.union([z.number(), z.string()], { error: 'must be a number or a word' }))
    .default({})
    .describe('Values by parameter key, in the unit of the parameter; applied last'),
  seeds: z
    .int()
    .min(seeds.min)
    .max(seeds.max)
    .default(seeds.default)
    .describe(
      'Runs that decide the hold rate: seed, seed + 1 and so on; the series is of the first',
    ),
  solver: z.enum(['fixed-step', 'adaptive']).default('fixed-step'),
  helm: z.enum(['sheet-to-tiller', 'lashed', 'free']).default('sheet-to-tiller'),
  durationS: z
    .number()
    .min(durationS.min)
    .max(durationS.max)
    .multipleOf(TICK)
    .default(durationS.default)
    .describe(`A multiple of ${TICK} s, the clock of a run`),
  outputIntervalS: z
    .number()
    .min(outputIntervalS.min)
    .max(outputIntervalS.max)
    .multipleOf(TICK)
    .default(outputIntervalS.default)
    .describe(`At most the duration, and at least the duration / ${bounds.samples}`),
})

/** A request as it is sent. */
export type SimulateBody = z.input<typeof simulateRequestSchema>

/** A request as it is read, with what was left out filled in. */
export type SimulateRequest = z.output<typeof simulateRequestSchema>
