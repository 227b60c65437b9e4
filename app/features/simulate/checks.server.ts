import { conditionParameters } from 'sim/parameters/conditions'
import { problemsOf } from 'sim/plan/problems'
import type { Plan } from 'sim/plan/types'
import { givenIn } from '~/server/field-errors'
import type { FieldError } from '~/server/problem'
import { bounds } from './bounds'
import type { SimulateRequest } from './schema'

/** Refusals that need more than one value of the request. */
export function refusalsOf(asked: SimulateRequest, plan: Plan): FieldError[] {
  return [
    ...planErrors(asked, plan),
    ...eventErrors(asked, plan),
    ...outputErrors(asked),
    ...seedErrors(asked, plan),
  ]
}

function planErrors(asked: SimulateRequest, plan: Plan): FieldError[] {
  return problemsOf(plan).map(({ key, given, ...rest }) => ({
    field: whereGiven(asked, key),
    given: givenIn(given),
    ...rest,
  }))
}

/** A parameter's key as a field of the request: where the request set it, else in its setup. */
function whereGiven(asked: SimulateRequest, key: string): string {
  if (Object.hasOwn(asked.changes, key)) return `changes.${key}`
  const [group, name] = key.split('.')
  if (group === 'conditions' && name && Object.hasOwn(asked.conditions, name)) return key
  const ofBoat = ['hull', 'keel', 'rudder', 'tiller', 'sails'].includes(group ?? '')
  return ofBoat ? `setup.boat.${key}` : `setup.${key}`
}

function eventErrors(asked: SimulateRequest, plan: Plan): FieldError[] {
  const sails = Object.keys(plan.boat.sails).filter((id) => plan.setup.trim[id]?.set === 'yes')
  return (asked.conditions.events ?? []).flatMap((event, place) => {
    if (event.kind !== 'reef' || sails.includes(event.sail)) return []
    return {
      field: `conditions.events.${place}.sail`,
      given: event.sail,
      message: `must be a sail that is set: ${sails.join(', ')}`,
      allowed: sails,
    }
  })
}

function outputErrors({ durationS, outputIntervalS }: SimulateRequest): FieldError[] {
  const min = Math.max(bounds.outputIntervalS.min, durationS / bounds.samples)
  const max = Math.min(bounds.outputIntervalS.max, durationS)
  if (outputIntervalS >= min && outputIntervalS <= max) return []
  const message = `must be a number from ${min} to ${max} for a run of ${durationS} s`
  return [{ field: 'outputIntervalS', given: outputIntervalS, message, min, max }]
}

function seedErrors({ seeds, solver, durationS }: SimulateRequest, plan: Plan): FieldError[] {
  const { seed } = plan.setup.conditions
  const errors: FieldError[] = []
  const limit = (max: number, why: string) => {
    if (seeds <= max) return
    const message = `must be a whole number from 1 to ${max}, ${why}`
    errors.push({ field: 'seeds', given: seeds, message, min: 1, max })
  }
  limit(conditionParameters.seed.max - seed + 1, `counted from seed ${seed}`)
  if (solver === 'adaptive') {
    limit(Math.floor(bounds.adaptiveS / durationS), `for adaptive runs of ${durationS} s`)
  }
  return errors
}
