import type { Plan } from 'sim/plan/types'
import type { TrialRequest, TrialResult } from 'sim/trial/types'
import { getPlan, listSetups } from '~/features/setups/queries.server'
import type { SetupEntry } from '~/features/setups/schema'
import { PoolFull, PoolTimeout } from '~/server/simulate/pool'
import { computeTrial } from '~/server/simulate/trials'
import { decode } from './address'
import { firstSetup } from './first-setup'
import { refusalsOf, requestOf } from './request'
import { type Sketch, sketchOf } from './sketch'
import { startOf, type TrialState } from './state'

/** Close enough for the first drawing, and small enough to travel with the page. */
const SKETCH_EVERY_S = 4

export interface Opening {
  entries: SetupEntry[]
  /** The setup as it is kept. */
  plan: Plan
  state: TrialState
  /** What the address asked for and could not be given, one sentence each. */
  remarks: string[]
  sketch: Sketch
  /** What the sketch is a run of: the state, or the setup as it is kept where that has no run. */
  sketched: TrialState
  found: boolean
}

/** A sea trial as an address asks for it, with the run computed here. */
export async function openTrial(query: URLSearchParams, signal: AbortSignal): Promise<Opening> {
  const entries = await listSetups()
  const asked = query.get('setup')
  const fallback = firstSetup(entries)
  if (!fallback) throw new Response('No setups are kept here yet.', { status: 503 })

  const found = asked === null ? undefined : await getPlan(asked)
  const plan = found ?? (await getPlan(fallback.id))
  if (!plan) throw new Response('The setups are being changed.', { status: 503 })

  const missing = asked !== null && !found
  const { state, remarks } = decode(missing ? null : query.get('trial'), plan)
  if (missing) {
    remarks.unshift(
      `No setup is called “${asked.slice(0, 64)}”. ${plan.boat.name}, ${plan.setup.name} is shown in its place.`,
    )
  }
  // The adaptive solver is left to the visitor's own machine.
  const wanted: TrialState = { ...state, solver: 'fixed-step' }
  const runnable = refusalsOf(requestOf(wanted, plan)).length === 0
  const sketched = runnable ? wanted : startOf(plan.setup.id)
  const result = await computed(requestOf(sketched, plan), signal)
  return {
    entries,
    plan,
    state,
    remarks,
    sketch: sketchOf(result, SKETCH_EVERY_S),
    sketched,
    found: !missing,
  }
}

async function computed(request: TrialRequest, signal: AbortSignal): Promise<TrialResult> {
  try {
    return await computeTrial(request, signal)
  } catch (error) {
    if (!(error instanceof PoolFull || error instanceof PoolTimeout)) throw error
    throw new Response(
      'More runs were asked of the server than it can compute. Load the page again in a moment.',
      {
        status: 503,
        headers: { 'retry-after': '5' },
      },
    )
  }
}
