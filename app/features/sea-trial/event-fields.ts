import type { StoredUnit } from 'sim/parameters/define'
import { trialEventSchema } from 'sim/plan/schema'
import type { Plan, TrialEvent } from 'sim/plan/types'
import { z } from 'zod'

export interface EventField {
  name: string
  label: string
  unit: StoredUnit
  step: number
  min: number
  max: number
}

type Described = Omit<EventField, 'min' | 'max'>

const when: Described = { name: 'atS', label: 'After', unit: 's', step: 1 }

const described: Record<TrialEvent['kind'], Described[]> = {
  gust: [
    when,
    { name: 'strengthKn', label: 'Stronger by', unit: 'kn', step: 0.5 },
    { name: 'durationS', label: 'Lasting', unit: 's', step: 1 },
  ],
  'wind-shift': [
    when,
    { name: 'angleDeg', label: 'Veering by', unit: 'deg', step: 1 },
    { name: 'durationS', label: 'Within', unit: 's', step: 1 },
  ],
  'wave-set': [
    when,
    { name: 'heightM', label: 'Higher by', unit: 'm', step: 0.1 },
    { name: 'durationS', label: 'Lasting', unit: 's', step: 1 },
  ],
  reef: [when, { name: 'percent', label: 'Taken in', unit: '%', step: 1 }],
}

/** The numbers of one kind of event, with the ranges its schema allows within a run. */
export function fieldsOf(kind: TrialEvent['kind'], durationS: number): EventField[] {
  const schema = trialEventSchema.options.find((option) => option.shape.kind.value === kind)
  if (!schema) throw new Error(`no schema for the event ${kind}`)
  const shape: Record<string, z.ZodType> = schema.shape
  return described[kind].map((field) => {
    const { minValue, maxValue } = z.instanceof(z.ZodNumber).parse(shape[field.name])
    const max = maxValue ?? Number.POSITIVE_INFINITY
    return {
      ...field,
      min: minValue ?? Number.NEGATIVE_INFINITY,
      max: field.name === 'atS' ? Math.min(max, durationS) : max,
    }
  })
}

/** What is dropped before anything about it is set. */
export function freshEvent(kind: TrialEvent['kind'], atS: number, plan: Plan): TrialEvent {
  switch (kind) {
    case 'gust':
      return { kind, atS, strengthKn: 6, durationS: 20 }
    case 'wind-shift':
      return { kind, atS, angleDeg: 15, durationS: 30 }
    case 'wave-set':
      return { kind, atS, heightM: 0.5, durationS: 60 }
    case 'reef': {
      const sail = reefable(plan)[0]?.id ?? plan.setup.source
      return { kind, atS, sail, percent: 30 }
    }
  }
}

/** Sails that are set and can be made smaller, the mainsail first. */
export function reefable(plan: Plan): { id: string; name: string }[] {
  return Object.entries(plan.boat.sails)
    .filter(([id]) => plan.setup.trim[id]?.set === 'yes')
    .map(([id, { name, kind }]) => ({ id, name, kind }))
    .sort((a, b) => Number(b.kind === 'main') - Number(a.kind === 'main'))
}
