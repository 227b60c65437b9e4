import { z } from 'zod'
import { nearestName } from './nearest-name'
import { type FieldError, Problem } from './problem'

type Path = readonly PropertyKey[]
type Range = Pick<FieldError, 'min' | 'max' | 'allowed'>

/** The value as the schema reads it, or a 400 that names each wrong field and what it may be. */
export function parseFields<Schema extends z.ZodType>(
  schema: Schema,
  value: unknown,
): z.output<Schema> {
  const read = schema.safeParse(value, { error: withoutText })
  if (read.success) return read.data
  throw refused(read.error.issues.flatMap((issue) => fieldErrorsOf(issue, [], schema, value)))
}

export function refused(errors: FieldError[]): Problem {
  const names = [...new Set(errors.map((error) => error.field))]
  const more = names.length > 3 ? ` and ${names.length - 3} more` : ''
  return new Problem(400, `Not allowed: ${names.slice(0, 3).join(', ')}${more}.`, { errors })
}

/** What was given, in a form that is safe to send back whatever its size or depth. */
export function givenIn(value: unknown): unknown {
  if (Array.isArray(value)) return `a list of ${value.length}`
  if (typeof value === 'object' && value !== null) return 'an object'
  if (typeof value === 'string') return value.length > 80 ? `${value.slice(0, 80)}…` : value
  return typeof value === 'number' && !Number.isFinite(value) ? String(value) : value
}

function fieldErrorsOf(
  issue: z.core.$ZodIssue,
  above: Path,
  schema: z.ZodType,
  value: unknown,
): FieldError[] {
  const path = [...above, ...issue.path]
  const at = schemaAt(schema, path)
  if (issue.code === 'unrecognized_keys') {
    const known = at instanceof z.ZodObject ? Object.keys(at.shape) : []
    return issue.keys.map((key) => unknownKey([...path, key], key, known, value))
  }
  if (issue.code === 'invalid_union') {
    const fitting = issue.errors.find((branch) => !branch.some(isWrongType))
    if (fitting) return fitting.flatMap((inner) => fieldErrorsOf(inner, path, schema, value))
  }
  const given = valueAt(value, path)
  const range = rangeOf(at, issue)
  const text = issue.code === 'invalid_key' ? issue.issues[0]?.message : issue.message
  return [
    {
      field: nameOf(path),
      given: givenIn(given),
      message: text || textOf(given, range, at),
      ...range,
    },
  ]
}

/** Leaves the text of a missing, mistyped or out-of-range value to `textOf`, which knows what may be. */
function withoutText(issue: z.core.$ZodRawIssue): string | undefined {
  if (issue.input === undefined) return ''
  if (issue.code === 'invalid_type') return ''
  if (issue.code === 'too_small' || issue.code === 'too_big') {
    return issue.origin === 'number' ? '' : undefined
  }
  return issue.code === 'invalid_value' || 'discriminator' in issue ? '' : undefined
}

function textOf(given: unknown, range: Range, schema: z.ZodType | undefined): string {
  const missing = given === undefined ? 'is missing: it ' : ''
  if (range.allowed) return `${missing}must be one of ${range.allowed.join(', ')}`
  if (range.min === undefined) return `${missing}must be ${kindOf(schema)}`
  const whole = schema instanceof z.ZodNumber && schema.format?.includes('int') ? 'whole ' : ''
  return `${missing}must be a ${whole}number from ${range.min} to ${range.max}`
}

function kindOf(schema: z.ZodType | undefined): string {
  if (schema instanceof z.ZodArray) return 'a list'
  if (schema instanceof z.ZodString) return 'a text'
  return 'an object'
}

function unknownKey(path: Path, key: string, known: string[], value: unknown): FieldError {
  const nearest = nearestName(key, known)
  return {
    field: nameOf(path),
    given: givenIn(valueAt(value, path)),
    message: `there is no such field${nearest ? `; did you mean ${nearest}?` : ''}`,
    allowed: known,
  }
}

function isWrongType(issue: z.core.$ZodIssue): boolean {
  return issue.code === 'invalid_type' && issue.path.length === 0
}

function nameOf(path: Path): string {
  const name = path.map(String).join('.')
  if (name === '') return 'body'
  return name.length > 120 ? `${name.slice(0, 120)}…` : name
}

function valueAt(root: unknown, path: Path): unknown {
  let at = root
  for (const step of path) {
    if (typeof at !== 'object' || at === null || !Object.hasOwn(at, step)) return undefined
    at = (at as Record<PropertyKey, unknown>)[step]
  }
  return at
}

function rangeOf(schema: z.ZodType | undefined, issue: z.core.$ZodIssue): Range {
  if (schema instanceof z.ZodNumber) {
    return { min: schema.minValue ?? undefined, max: schema.maxValue ?? undefined }
  }
  if (schema instanceof z.ZodEnum) return { allowed: schema.options.map(String) }
  if (issue.code === 'invalid_union' && 'options' in issue) {
    return { allowed: (issue.options as unknown[]).map(String) }
  }
  return {}
}

/** The schema that judges the value at a path; of alternatives, the first that has such a part. */
function schemaAt(schema: z.ZodType, path: Path): z.ZodType | undefined {
  if (schema instanceof z.ZodOptional || schema instanceof z.ZodDefault) {
    return schemaAt(schema.unwrap() as z.ZodType, path)
  }
  const [step, ...rest] = path
  if (step === undefined) return schema
  if (schema instanceof z.ZodUnion) {
    for (const option of schema.options) {
      const found = schemaAt(option as z.ZodType, path)
      if (found) return found
    }
    return undefined
  }
  let part: unknown
  if (schema instanceof z.ZodObject) part = schema.shape[String(step)]
  else if (schema instanceof z.ZodArray) part = schema.element
  else if (schema instanceof z.ZodRecord) part = schema.valueType
  return part === undefined ? undefined : schemaAt(part as z.ZodType, rest)
}
