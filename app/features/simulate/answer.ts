import { conditionsSchema, trialEventSchema } from 'sim/plan/schema'
import { type Channel, channels } from 'sim/trial/channels'
import type { Happening, Metrics, TrialResult, VerdictCode } from 'sim/trial/types'
import { z } from 'zod'
import { boatEntrySchema } from '../boats/schema'
import { simulateRequestSchema } from './schema'

/** The channels that leave the house; the others are for the drawing. */
const reported = [
  'timeS',
  'courseToWindDeg',
  'headingDeg',
  'heelDeg',
  'speedKn',
  'leewayDeg',
  'rollRateDegS',
  'yawRateDegS',
  'tillerDeg',
  'controlLineN',
  'elasticN',
  'sheetN',
] as const satisfies Channel[]

/** Decimals of every number in an answer: far finer than the model, and short to send. */
const decimals = 6

const measured = z.number().nullable()
const namesOf = <Name extends string>(names: Record<Name, true>) => Object.keys(names) as Name[]

const verdictCodes = namesOf<VerdictCode>({
  holds: true,
  'holds-other-course': true,
  'creeps-to-windward': true,
  'sags-to-leeward': true,
  hunts: true,
  luffs: true,
  tacks: true,
  gybes: true,
  broaches: true,
  'too-slow': true,
  'not-judged': true,
  stopped: true,
})

const happeningCodes = namesOf<Happening['code']>({
  tacked: true,
  gybed: true,
  broached: true,
  'line-slack': true,
  'elastic-slack': true,
  'tiller-on-stop': true,
  'left-valid-range': true,
  gust: true,
  'wind-shift': true,
  'wave-set': true,
  reef: true,
})

const metricNames = [
  'meanCourseToWindDeg',
  'rmsCourseErrorDeg',
  'maxCourseErrorDeg',
  'withinBandFraction',
  'meanSpeedKn',
  'maxHeelDeg',
  'peakControlLineN',
  'peakElasticN',
  'peakSheetN',
] as const satisfies Exclude<keyof Metrics, 'holds'>[]

export const holdRateSchema = z
  .strictObject({
    held: z.int(),
    of: z.int(),
    interval: z.tuple([z.number(), z.number()]).describe('95 % confidence interval of the rate'),
  })
  .describe('How many of the seeds held; only when more than one was asked for')

export type HoldRate = z.infer<typeof holdRateSchema>

const { helm, solver, durationS, outputIntervalS, seeds, changes } = simulateRequestSchema.shape

export const simulateAnswerSchema = z.strictObject({
  modelVersion: z.string(),
  setup: z.strictObject({
    id: z.string(),
    name: z.string(),
    boat: boatEntrySchema.pick({ id: true, name: true, type: true }),
    changes: changes.unwrap(),
    conditions: conditionsSchema.extend({ events: z.array(trialEventSchema) }),
  }),
  helm: helm.unwrap(),
  solver: solver.unwrap(),
  durationS: durationS.unwrap(),
  outputIntervalS: outputIntervalS.unwrap(),
  seeds: seeds.unwrap(),
  verdict: z.strictObject({ code: z.enum(verdictCodes), text: z.string(), reason: z.string() }),
  metrics: z.strictObject({
    holds: z.boolean().describe('Whether this run holds'),
    holdRate: holdRateSchema.optional(),
    ...columnsOf(metricNames, () => measured),
  }),
  events: z.array(
    z.strictObject({ atS: z.number(), code: z.enum(happeningCodes), text: z.string() }),
  ),
  series: z.strictObject(
    columnsOf(reported, (name) =>
      z.array(measured).describe(`${channels[name].label} (${channels[name].unit})`),
    ),
  ),
})

export type SimulateAnswer = z.infer<typeof simulateAnswerSchema>

/** Traces and metrics as JSON can carry them: rounded, and null where the model has no number. */
export function measurementsOf(
  result: TrialResult,
): Pick<SimulateAnswer, 'metrics' | 'events' | 'series'> {
  const { metrics, happenings, series } = result
  return {
    metrics: {
      holds: metrics.holds,
      ...columnsOf(metricNames, (name) => rounded(metrics[name])),
    },
    events: happenings.map(({ atS, code, text }) => ({ atS: rounded(atS) ?? 0, code, text })),
    series: columnsOf(reported, (name) => Array.from(series[name], rounded)),
  }
}

function rounded(value: number): number | null {
  if (!Number.isFinite(value)) return null
  const scale = 10 ** decimals
  return Math.round(value * scale) / scale
}

function columnsOf<Name extends string, Value>(
  names: readonly Name[],
  make: (name: Name) => Value,
): Record<Name, Value> {
  return Object.fromEntries(names.map((name) => [name, make(name)])) as Record<Name, Value>
}
