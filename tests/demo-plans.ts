/** The demo boats under trims and conditions that a test chooses itself. */
import { demoBoats } from 'db/demo/boats'
import { demoSetups } from 'db/demo/setups'
import { conditionParameters } from 'sim/parameters/conditions'
import { defaultsOf } from 'sim/parameters/define'
import { trimParameters } from 'sim/parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from 'sim/parameters/steering'
import type { Boat, Conditions, Plan, Setup, Trim } from 'sim/plan/types'

export function boatCalled(id: string): Boat {
  const boat = demoBoats.find((candidate) => candidate.id === id)
  if (!boat) throw new Error(`no demo boat called ${id}`)
  return boat
}

/** A demo setup with its boat. */
export function demoPlan(setup: Setup): Plan {
  return { boat: boatCalled(setup.boatId), setup }
}

export const demoPlans: Plan[] = demoSetups.map(demoPlan)

/** Those that are meant to hold. */
export const soundPlans = demoPlans.filter((plan) => plan.setup.flaw === undefined)

export const calm = { turbulenceIntensity: 0, significantWaveHeightM: 0 } as const

interface Choices {
  trim: Record<string, Partial<Trim>>
  source?: string
  line?: Partial<Setup['line']>
  leads?: Partial<Setup['leads'][number]>[]
  elastic?: Partial<Setup['elastic']>
  conditions?: Partial<Conditions>
}

/** A boat with the sails named in `trim` set, all else at the tables' defaults unless it is given. */
export function planWith(boat: Boat, choices: Choices): Plan {
  const trim = Object.fromEntries(
    Object.entries(choices.trim).map(([id, values]) => [
      id,
      { ...defaultsOf(trimParameters), ...values },
    ]),
  )
  return {
    boat,
    setup: {
      id: 'tried',
      name: 'Tried',
      summary: '',
      boatId: boat.id,
      trim,
      source: choices.source ?? (Object.keys(trim)[0] as string),
      line: { ...defaultsOf(lineParameters), ...choices.line },
      leads: (choices.leads ?? [{}]).map((lead) => ({ ...defaultsOf(leadParameters), ...lead })),
      elastic: { ...defaultsOf(elasticParameters), ...choices.elastic },
      conditions: { ...defaultsOf(conditionParameters), ...choices.conditions },
    },
  }
}
