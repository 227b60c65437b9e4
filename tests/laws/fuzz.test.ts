import fc from 'fast-check'
import type { Parameter } from 'sim/parameters/define'
import { keysOf, parameterAt, type Value, withValue } from 'sim/plan/keys'
import { problemsOf } from 'sim/plan/problems'
import type { Helm, Plan, TrialEvent } from 'sim/plan/types'
import { runTrial } from 'sim/trial/run'
import { expect, test } from 'vitest'
import { demoPlans } from '../demo-plans'

/** Values of a parameter, its ends as often as its inside. */
function valueFor(parameter: Parameter): fc.Arbitrary<Value> {
  if (parameter.type === 'choice') return fc.constantFrom(...Object.keys(parameter.options))
  const { min, max, whole } = parameter
  const inside = whole ? fc.integer({ min, max }) : fc.double({ min, max, noNaN: true })
  return fc.oneof(fc.constantFrom(min, max), inside)
}

/** A demo plan with any number of its values moved anywhere in their ranges. */
const anyPlan: fc.Arbitrary<Plan> = fc.constantFrom(...demoPlans).chain((plan) =>
  fc
    .uniqueArray(fc.constantFrom(...keysOf(plan)), { minLength: 0, maxLength: 60 })
    .chain((keys) => {
      const parameters = keys.map((key) => parameterAt(plan, key))
      const values = parameters.map((parameter) => {
        if (!parameter) throw new Error('a key without a parameter')
        return valueFor(parameter)
      })
      return fc
        .tuple(...values)
        .map((chosen) =>
          chosen.reduce<Plan>(
            (moved, value, i) => withValue(moved, keys[i] as string, value),
            plan,
          ),
        )
    }),
)

const anyEvents: fc.Arbitrary<TrialEvent[]> = fc.array(
  fc.oneof(
    fc.record({
      kind: fc.constant('gust' as const),
      atS: fc.double({ min: 0, max: 20, noNaN: true }),
      strengthKn: fc.double({ min: -20, max: 25, noNaN: true }),
      durationS: fc.double({ min: 1, max: 30, noNaN: true }),
    }),
    fc.record({
      kind: fc.constant('wind-shift' as const),
      atS: fc.double({ min: 0, max: 20, noNaN: true }),
      angleDeg: fc.double({ min: -90, max: 90, noNaN: true }),
      durationS: fc.double({ min: 1, max: 30, noNaN: true }),
    }),
    fc.record({
      kind: fc.constant('wave-set' as const),
      atS: fc.double({ min: 0, max: 20, noNaN: true }),
      heightM: fc.double({ min: 0, max: 4, noNaN: true }),
      durationS: fc.double({ min: 1, max: 30, noNaN: true }),
    }),
    fc.record({
      kind: fc.constant('reef' as const),
      atS: fc.double({ min: 0, max: 20, noNaN: true }),
      sail: fc.constantFrom('main', 'genoa', 'jib', 'mizzen'),
      percent: fc.double({ min: 0, max: 70, noNaN: true }),
    }),
  ),
  { maxLength: 3 },
)

const helms = fc.constantFrom<Helm>('sheet-to-tiller', 'lashed', 'free')

test('any plan is either refused by name, or sailed to its end or to a named stop with finite figures', () => {
  let sailed = 0
  let refused = 0
  fc.assert(
    fc.property(anyPlan, anyEvents, helms, (plan, events, helm) => {
      if (problemsOf(plan).length > 0) {
        refused++
        return
      }
      sailed++
      const result = runTrial({
        plan,
        conditions: plan.setup.conditions,
        events,
        helm,
        solver: 'fixed-step',
        durationS: 30,
        outputIntervalS: 1,
      })
      const { timeS } = result.series
      const stopped = result.happenings.some(({ code }) => code === 'left-valid-range')
      expect(stopped || timeS[timeS.length - 1] === 30).toBe(true)
      const columns = [result.series, result.boomDeg, result.drawing].flatMap(Object.values)
      for (const column of columns as Float64Array[]) {
        expect(column.length).toBe(timeS.length)
        // The last row of a run that left the valid range is where it left it.
        const rows = stopped ? column.subarray(0, -1) : column
        expect(rows.every(Number.isFinite)).toBe(true)
      }
      for (const [name, value] of Object.entries(result.metrics)) {
        if (typeof value === 'number') expect([name, Number.isFinite(value)]).toEqual([name, true])
      }
      expect(result.verdict.text).not.toMatch(/NaN|undefined|Infinity/)
      expect(result.verdict.reason).not.toMatch(/NaN|undefined|Infinity/)
    }),
    { numRuns: 500, seed: 31 },
  )
  // The box must not be refused so often that nothing is tried.
  expect(sailed).toBeGreaterThan(100)
  expect(refused).toBeGreaterThan(20)
})
