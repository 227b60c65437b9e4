import { wilsonInterval } from 'sim/trial/hold-rate'
import type { TrialRequest } from 'sim/trial/types'
import { Problem } from '~/server/problem'
import { PoolFull, PoolTimeout } from '~/server/simulate/pool'
import { computeTrials } from '~/server/simulate/trials'
import { measurementsOf, type SimulateAnswer } from './answer'
import { readAsked } from './ask.server'

/** Computes what a body asks for; throws a Problem where it cannot. */
export async function simulate(body: unknown, signal: AbortSignal): Promise<SimulateAnswer> {
  const { request, changes, seeds } = await readAsked(body)
  const { result, held } = await computed(request, seeds, signal)
  const { boat, setup } = request.plan
  const { metrics, ...measurements } = measurementsOf(result)
  const holdRate = { held, of: seeds, interval: wilsonInterval(held, seeds) }
  return {
    modelVersion: result.modelVersion,
    setup: {
      id: setup.id,
      name: setup.name,
      boat: { id: boat.id, name: boat.name, type: boat.type },
      changes,
      conditions: { ...request.conditions, events: request.events },
    },
    helm: request.helm,
    solver: request.solver,
    durationS: request.durationS,
    outputIntervalS: request.outputIntervalS,
    seeds,
    verdict: result.verdict,
    metrics: seeds > 1 ? { ...metrics, holdRate } : metrics,
    ...measurements,
  }
}

async function computed(request: TrialRequest, seeds: number, signal: AbortSignal) {
  try {
    return await computeTrials(request, seeds, signal)
  } catch (error) {
    if (error instanceof PoolFull) {
      throw new Problem(503, 'Too many runs are being computed; try again shortly.', {
        headers: { 'retry-after': '5' },
      })
    }
    if (error instanceof PoolTimeout) {
      throw new Problem(503, `The run was ${error.message}; ask for fewer seeds or a shorter one.`)
    }
    if (signal.aborted) throw new Problem(503, 'The request was given up by its sender.')
    throw error
  }
}
