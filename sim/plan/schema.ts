/** Zod schemas derived from the parameter tables; used on both sides of every boundary. */
import { z } from 'zod'
import { conditionParameters } from '../parameters/conditions'
import type { ParameterTable, ValuesOf } from '../parameters/define'
import {
  hullParameters,
  keelParameters,
  rudderParameters,
  tillerParameters,
} from '../parameters/hull'
import { sailParameters, trimParameters } from '../parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from '../parameters/steering'
import { checkValue } from './keys'

function shapeOf(table: ParameterTable): Record<string, z.ZodType> {
  const shape: Record<string, z.ZodType> = {}
  for (const [key, parameter] of Object.entries(table)) {
    const text = (issue: { input?: unknown }) =>
      checkValue(key, parameter, issue.input) ?? `${key} is not allowed here`
    if (parameter.type === 'choice') {
      shape[key] = z.enum(Object.keys(parameter.options) as [string, ...string[]], { error: text })
    } else {
      const base = parameter.whole ? z.int({ error: text }) : z.number({ error: text })
      shape[key] = base
        .min(parameter.min, { error: text })
        .max(parameter.max, { error: text })
        .describe(`${parameter.label} (${parameter.unit === '1' ? 'no unit' : parameter.unit})`)
    }
  }
  return shape
}

/** Strict object schema of one table's values. */
function valuesSchema<Table extends ParameterTable>(table: Table) {
  return z.strictObject(shapeOf(table)) as unknown as z.ZodObject<{
    [Key in keyof ValuesOf<Table>]: z.ZodType<ValuesOf<Table>[Key]>
  }>
}

const slug = z.string().regex(/^[a-z0-9][a-z0-9-]{0,63}$/, {
  error: 'must be 1 to 64 lower-case letters, digits and hyphens',
})
const title = z.string().trim().min(1).max(120)
const prose = z.string().max(2000)
const sailId = z.string().regex(/^[a-z][a-z0-9-]{0,23}$/, {
  error: 'a sail is named by 1 to 24 lower-case letters, digits and hyphens',
})

const hardwareSchema = z.strictObject({
  name: title,
  kind: z.enum(['block', 'cleat', 'padeye', 'stanchion', 'winch', 'toe-rail']),
  x: z.number().min(-2).max(16),
  y: z.number().min(-2.5).max(2.5),
  z: z.number().min(0).max(4),
})

/** Conditions, leads and trims: every key of their tables, nothing else, each in its range. */
export const conditionsSchema = valuesSchema(conditionParameters)
export const leadSchema = valuesSchema(leadParameters)
export const trimSchema = valuesSchema(trimParameters)

/** A boat; values are refused by key with the allowed range. Whether they fit together is for `problemsOf`. */
export const boatSchema = z.strictObject({
  id: slug,
  name: title,
  type: title,
  summary: prose,
  hull: valuesSchema(hullParameters),
  keel: valuesSchema(keelParameters),
  rudder: valuesSchema(rudderParameters),
  tiller: valuesSchema(tillerParameters),
  sails: z
    .record(sailId, valuesSchema(sailParameters).extend({ name: title }))
    .refine((sails) => Object.keys(sails).length >= 1 && Object.keys(sails).length <= 8, {
      error: 'a boat has 1 to 8 sails',
    }),
  hardware: z.array(hardwareSchema).max(60),
  provenance: z.record(z.string().max(80), z.string().max(400)),
})

/** A setup, refused in the same way. */
export const setupSchema = z.strictObject({
  id: slug,
  name: title,
  summary: prose,
  boatId: slug,
  trim: z.record(sailId, trimSchema),
  source: sailId,
  line: valuesSchema(lineParameters),
  leads: z.array(leadSchema).min(1, { error: 'the control line needs 1 to 6 leads' }).max(6, {
    error: 'the control line needs 1 to 6 leads',
  }),
  elastic: valuesSchema(elasticParameters),
  conditions: conditionsSchema,
  flaw: z.strictObject({ code: slug, text: prose }).optional(),
})

const atS = z.number().min(0).max(3600)
const durationS = z.number().min(1).max(600)

/** An event of a run; times in seconds from its start. */
export const trialEventSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    atS,
    kind: z.literal('gust'),
    strengthKn: z.number().min(-20).max(25),
    durationS,
  }),
  z.strictObject({
    atS,
    kind: z.literal('wind-shift'),
    angleDeg: z.number().min(-90).max(90),
    durationS,
  }),
  z.strictObject({
    atS,
    kind: z.literal('wave-set'),
    heightM: z.number().min(0).max(4),
    durationS,
  }),
  z.strictObject({
    atS,
    kind: z.literal('reef'),
    sail: sailId,
    percent: z.number().min(0).max(70),
  }),
])
