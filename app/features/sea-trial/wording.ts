import { parameterAt } from 'sim/plan/keys'
import type { Problem } from 'sim/plan/problems'
import type { Conditions, Plan, TrialEvent } from 'sim/plan/types'
import { inWords, reading, rounded, type Units } from '~/features/units/units'

/** "12 kn, 60° starboard tack". */
export function weatherInWords(conditions: Conditions, units: Units): string {
  const wind = inWords(rounded('kn', conditions.trueWindSpeedKn, units, 1))
  return `${wind}, ${courseInWords(conditions.trueWindAngleDeg)}`
}

/** A course to the wind, with the side the wind comes over. */
export function courseInWords(angleDeg: number): string {
  const side = angleDeg < 0 ? 'port' : 'starboard'
  return `${Math.round(Math.abs(angleDeg))}° ${side} tack`
}

export const eventNames: Record<TrialEvent['kind'], string> = {
  gust: 'Gust',
  'wind-shift': 'Wind shift',
  'wave-set': 'Wave set',
  reef: 'Reef',
}

/** "Gust of 6 kn for 20 s". */
export function eventInWords(event: TrialEvent, plan: Plan, units: Units): string {
  switch (event.kind) {
    case 'gust': {
      const strength = inWords(rounded('kn', Math.abs(event.strengthKn), units, 0.5))
      const what = event.strengthKn < 0 ? 'Lull' : 'Gust'
      return `${what} of ${strength} for ${event.durationS} s`
    }
    case 'wind-shift': {
      const way = event.angleDeg < 0 ? 'backs' : 'veers'
      return `Wind ${way} ${Math.abs(event.angleDeg)}° within ${event.durationS} s`
    }
    case 'wave-set':
      return `Wave set of ${inWords(rounded('m', event.heightM, units, 0.1))} for ${event.durationS} s`
    case 'reef': {
      const sail = plan.boat.sails[event.sail]?.name ?? event.sail
      return `${sail} reefed, ${event.percent} % of it taken in`
    }
  }
}

/** Why a run got its verdict; the model gives loads in newtons, the visitor reads his own unit. */
export function reasonInWords(reason: string, units: Units): string {
  return reason.replace(/(\d+(?:\.\d+)?) N\b/g, (_, newtons) =>
    inWords(rounded('N', Number(newtons), units, 1)),
  )
}

/** Refusals by parameter key, each naming the control and its range in the visitor's units. */
export type Refusals = Readonly<Record<string, string>>

export function refusalsInWords(problems: readonly Problem[], plan: Plan, units: Units): Refusals {
  return Object.fromEntries(
    problems.map((problem) => [problem.key, refusalInWords(problem, plan, units)]),
  )
}

function refusalInWords({ key, message, min, max }: Problem, plan: Plan, units: Units): string {
  const parameter = parameterAt(plan, key)
  if (!parameter) return sentence(message)
  if (parameter.type === 'choice' || min === undefined || max === undefined) {
    return `${parameter.label}: ${message.replace(`${key} `, '')}.`
  }
  const { label, unit, step } = parameter
  const [, why] = message.split(': ')
  const shown = (value: number) => reading(unit, value, units, step)
  const range = `between ${shown(min).figure} and ${inWords(shown(max))}`
  return `${label}: ${range}${why ? `, ${why}` : ''}.`
}

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`
}
