import { setFlagsFromString } from 'node:v8'
import { runInNewContext } from 'node:vm'
import { balanceOf } from 'sim/analysis/balance'
import { environmentOf } from 'sim/boat/environment'
import { createSystem } from 'sim/boat/system'
import { vesselOf } from 'sim/boat/vessel'
import { rungeKutta } from 'sim/integrate/runge-kutta'
import { expect, test } from 'vitest'
import { soundPlans } from '../demo-plans'

setFlagsFromString('--expose-gc')
const collect = runInNewContext('gc') as () => void

/** Memory in use once everything unreachable is gone, bytes. */
function kept(): number {
  collect()
  collect()
  return process.memoryUsage().heapUsed
}

test('forty thousand steps keep no memory', () => {
  for (const plan of [soundPlans[0], soundPlans.find((p) => p.setup.line.pull === 'deflected')]) {
    if (!plan) throw new Error('no demo plan')
    const vessel = vesselOf(plan)
    const environment = environmentOf(plan.setup.conditions, [], 600, vessel.tack)
    const system = createSystem(vessel, environment, 'sheet-to-tiller')
    const y = Float64Array.from(balanceOf(plan).state)
    const step = rungeKutta(system.size, system.derivative)
    const sail = (steps: number) => {
      for (let i = 0; i < steps; i++) step((i % 12_000) * 0.05, y, 0.05)
    }
    // Compiled code and inline caches settle first.
    sail(8_000)
    const before = kept()
    sail(40_000)
    // A single double kept per step would be 640 kB.
    expect(kept() - before).toBeLessThan(200_000)
  }
})
