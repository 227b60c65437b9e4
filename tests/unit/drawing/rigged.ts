import { demoBoats } from 'db/demo/boats'
import { conditionParameters } from 'sim/parameters/conditions'
import { defaultsOf } from 'sim/parameters/define'
import { trimParameters } from 'sim/parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from 'sim/parameters/steering'
import type { Boat, Lead, Plan, Setup } from 'sim/plan/types'
import { runTrial } from 'sim/trial/run'
import type { TrialRequest } from 'sim/trial/types'
import type { Measure, Measures, Run } from '~/drawing/types'

export const boats: readonly Boat[] = demoBoats

export function boatWith(kind: Boat['keel']['kind']): Boat {
  const boat = boats.find((candidate) => candidate.keel.kind === kind)
  if (!boat) throw new Error(`No demo boat with a ${kind} keel`)
  return boat
}

interface Rigging {
  trueWindAngleDeg?: number
  source?: string
  setup?: Partial<Setup>
  leads?: Partial<Lead>[]
}

/** A boat under main and her first headsail, rigged with the table defaults. */
export function rigged(boat: Boat, rigging: Rigging = {}): Plan {
  const {
    trueWindAngleDeg = 70,
    source = 'main',
    setup = {},
    leads = [{ x: 0.9, y: 0.8 }],
  } = rigging
  const headsail = Object.entries(boat.sails).find(([, sail]) => sail.kind === 'headsail')?.[0]
  const trim: Setup['trim'] = {}
  for (const [id, sail] of Object.entries(boat.sails)) {
    const set = sail.kind === 'main' || sail.kind === 'mizzen' || id === headsail || id === source
    trim[id] = { ...defaultsOf(trimParameters), set: set ? 'yes' : 'no', sheetAngleDeg: 20 }
  }
  return {
    boat,
    setup: {
      id: 'trial',
      name: 'Trial',
      summary: '',
      boatId: boat.id,
      trim,
      source,
      line: defaultsOf(lineParameters),
      leads: leads.map((lead) => ({ ...defaultsOf(leadParameters), ...lead })),
      elastic: defaultsOf(elasticParameters),
      conditions: { ...defaultsOf(conditionParameters), trueWindAngleDeg },
      ...setup,
    },
  }
}

export function sailed(plan: Plan, request: Partial<TrialRequest> = {}): Run {
  const full: TrialRequest = {
    plan,
    conditions: plan.setup.conditions,
    events: [],
    helm: 'sheet-to-tiller',
    solver: 'fixed-step',
    durationS: 30,
    outputIntervalS: 1,
    ...request,
  }
  return { request: full, result: runTrial(full) }
}

function measure(unit: string, factor = 1, digits = 0): Measure {
  return { unit, factor, format: (stored) => (stored * factor).toFixed(digits) }
}

export const measures: Measures = {
  windSpeed: measure('kn', 1, 1),
  boatSpeed: measure('kn', 1, 1),
  angle: measure('°'),
  force: measure('N'),
  length: measure('m', 1, 1),
  travel: measure('cm', 100),
}
