import { demoBoats } from 'db/demo/boats'
import { demoSetups } from 'db/demo/setups'
import { balanceOf } from 'sim/analysis/balance'
import { environmentOf } from 'sim/boat/environment'
import { createSystem } from 'sim/boat/system'
import { vesselOf } from 'sim/boat/vessel'
import { runTrial } from 'sim/trial/run'
import type { TrialRequest } from 'sim/trial/types'
import { bench, describe } from 'vitest'

const setup = demoSetups.find(({ flaw }) => flaw === undefined)
const boat = demoBoats.find(({ id }) => id === setup?.boatId)
if (!setup || !boat) throw new Error('there is no demo setup to measure with')

const plan = { boat, setup }
const { conditions } = setup
const durationS = 600
const request: TrialRequest = {
  plan,
  conditions,
  events: [],
  helm: 'sheet-to-tiller',
  solver: 'fixed-step',
  durationS,
  outputIntervalS: 1,
}
/** Each is run often enough to tell a change of a tenth, and the slow one not for minutes. */
const often = { time: 3000, warmupTime: 500 }
const seldom = { iterations: 3, time: 0, warmupIterations: 0, warmupTime: 0 }

describe(`ten minutes of ${boat.type}, ${setup.name}`, () => {
  bench('fixed step', () => void runTrial(request), often)
  bench('adaptive', () => void runTrial({ ...request, solver: 'adaptive' }), seldom)
})

describe('parts of a run', () => {
  const vessel = vesselOf(plan)
  const environment = environmentOf(conditions, [], durationS, vessel.tack)
  const system = createSystem(vessel, environment, 'sheet-to-tiller')
  const state = balanceOf(plan).state
  const rate = new Float64Array(system.size)

  bench('wind and sea', () => void environmentOf(conditions, [], durationS, vessel.tack), often)
  bench('balance', () => void balanceOf(plan), often)
  bench(
    'derivative, a thousand times',
    () => {
      for (let call = 0; call < 1000; call += 1) system.derivative(call, state, rate)
    },
    often,
  )
})
