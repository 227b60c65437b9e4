import { checkValue, keysOf, parameterAt, withValue } from 'sim/plan/keys'
import type { Plan } from 'sim/plan/types'
import { givenIn, refused } from '~/server/field-errors'
import { nearestName } from '~/server/nearest-name'
import type { FieldError } from '~/server/problem'

/** The plan with values changed by key, or a 400 that names every key that cannot be. */
export function withChanges(stated: Plan, changes: Record<string, number | string>): Plan {
  const errors: FieldError[] = []
  let plan = stated
  for (const [key, value] of Object.entries(changes)) {
    const error = changeError(stated, key, value)
    if (error) errors.push(error)
    else plan = withValue(plan, key, value)
  }
  if (errors.length > 0) throw refused(errors)
  return plan
}

function changeError(plan: Plan, key: string, value: number | string): FieldError | undefined {
  const parameter = parameterAt(plan, key)
  const field = `changes.${givenIn(key)}`
  const given = givenIn(value)
  if (!parameter) {
    const nearest = nearestName(key, keysOf(plan))
    const hint = nearest ? `; did you mean ${nearest}?` : ''
    return { field, given, message: `this boat and setup have no such parameter${hint}` }
  }
  const message = checkValue(key, parameter, value)
  if (message === null) return undefined
  return parameter.type === 'choice'
    ? { field, given, message, allowed: Object.keys(parameter.options) }
    : { field, given, message, min: parameter.min, max: parameter.max }
}
