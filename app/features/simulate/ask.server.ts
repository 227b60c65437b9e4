import type { Boat, Plan } from 'sim/plan/types'
import type { TrialRequest } from 'sim/trial/types'
import { givenIn, parseFields, refused } from '~/server/field-errors'
import { Problem } from '~/server/problem'
import { getBoat, listBoats } from '../boats/queries.server'
import { getPlan } from '../setups/queries.server'
import { withChanges } from './changes.server'
import { refusalsOf } from './checks.server'
import { type SimulateRequest, simulateRequestSchema } from './schema'

export interface Asked {
  request: TrialRequest
  changes: SimulateRequest['changes']
  seeds: number
}

/** What a body asks to be computed; refuses it by field before anything is. */
export async function readAsked(body: unknown): Promise<Asked> {
  const asked = parseFields(simulateRequestSchema, body)
  const { events = [], ...conditions } = asked.conditions
  const stated = await statedPlan(asked.setup)
  const setup = { ...stated.setup, conditions: { ...stated.setup.conditions, ...conditions } }
  const plan = withChanges({ boat: stated.boat, setup }, asked.changes)
  const errors = refusalsOf(asked, plan)
  if (errors.length > 0) throw refused(errors)
  const { helm, solver, durationS, outputIntervalS, changes, seeds } = asked
  return {
    request: {
      plan,
      conditions: plan.setup.conditions,
      events,
      helm,
      solver,
      durationS,
      outputIntervalS,
    },
    changes,
    seeds,
  }
}

async function statedPlan(setup: SimulateRequest['setup']): Promise<Plan> {
  if (typeof setup !== 'string') return writtenPlan(setup)
  const plan = await getPlan(setup)
  if (plan) return plan
  throw new Problem(404, `There is no setup called ${givenIn(setup)}; /api/setups lists them.`)
}

async function writtenPlan(setup: Exclude<SimulateRequest['setup'], string>): Promise<Plan> {
  const { boat: written, ...rest } = setup
  const boat = written ?? (await demoBoat(setup.boatId))
  if (setup.boatId !== undefined && setup.boatId !== boat.id) {
    const message = 'is not the id of the boat given'
    throw refused([{ field: 'setup.boatId', given: setup.boatId, message, allowed: [boat.id] }])
  }
  const names = { id: 'unnamed', name: 'Unnamed', summary: '' }
  return { boat, setup: { ...names, ...rest, boatId: boat.id } }
}

async function demoBoat(id: string | undefined): Promise<Boat> {
  const boat = id === undefined ? undefined : await getBoat(id)
  if (boat) return boat
  const allowed = (await listBoats()).map((entry) => entry.id)
  const message = `must be one of ${allowed.join(', ')}, or the boat be given as setup.boat`
  throw refused([{ field: 'setup.boatId', given: id, message, allowed }])
}
