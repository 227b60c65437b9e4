import fc from 'fast-check'
import type { Parameter } from 'sim/parameters/define'
import { keysOf, parameterAt, readValue, type Value } from 'sim/plan/keys'
import type { TrialEvent } from 'sim/plan/types'
import { MODEL_VERSION } from 'sim/version'
import { describe, expect, test } from 'vitest'
import {
  changedPlan,
  decode,
  encode,
  linkQueryOf,
  queryOf,
  shortName,
} from '~/features/sea-trial/address'
import { allGhosts, durationsS, startOf, type TrialState } from '~/features/sea-trial/state'
import { plan } from './plan'

const keys = keysOf(plan)
const start = startOf(plan.setup.id)

function anyValueOf(parameter: Parameter): fc.Arbitrary<Value> {
  if (parameter.type === 'choice') return fc.constantFrom(...Object.keys(parameter.options))
  const { min, max, whole } = parameter
  return whole ? fc.integer({ min, max }) : fc.double({ min, max, noNaN: true })
}

const changes = fc
  .uniqueArray(fc.constantFrom(...keys), { maxLength: 12 })
  .chain((chosen) =>
    fc.tuple(
      ...chosen.map((key) => {
        const parameter = parameterAt(plan, key)
        if (!parameter) throw new Error(`no parameter ${key}`)
        return anyValueOf(parameter).map((value) => [key, value] as const)
      }),
    ),
  )
  .map((entries) =>
    Object.fromEntries(
      entries
        .filter(([key, value]) => value !== readValue(plan, key))
        // A negative nought is no setting of its own.
        .map(([key, value]) => [key, Object.is(value, -0) ? 0 : value] as const),
    ),
  )

const amount = (min: number, max: number) =>
  fc.double({ min, max, noNaN: true }).map((value) => (Object.is(value, -0) ? 0 : value))
const atS = amount(0, 600)
const durationS = amount(1, 600)
const event: fc.Arbitrary<TrialEvent> = fc.oneof(
  fc.record({ kind: fc.constant('gust' as const), atS, durationS, strengthKn: amount(-20, 25) }),
  fc.record({
    kind: fc.constant('wind-shift' as const),
    atS,
    durationS,
    angleDeg: amount(-90, 90),
  }),
  fc.record({ kind: fc.constant('wave-set' as const), atS, durationS, heightM: amount(0, 4) }),
  fc.record({
    kind: fc.constant('reef' as const),
    atS,
    sail: fc.constantFrom('main', 'storm-jib'),
    percent: amount(0, 70),
  }),
)

const state: fc.Arbitrary<TrialState> = fc.record({
  setupId: fc.constant(plan.setup.id),
  changes,
  events: fc.array(event, { maxLength: 6 }),
  helm: fc.constantFrom('sheet-to-tiller', 'lashed', 'free'),
  solver: fc.constantFrom('fixed-step', 'adaptive'),
  durationS: fc.constantFrom(...durationsS),
  ghosts: fc.subarray([...allGhosts]),
})

describe('the address', () => {
  test('gives every state back exactly', () => {
    fc.assert(
      fc.property(state, (given) => {
        const { state: back, remarks } = decode(encode(given), plan)
        expect(remarks).toEqual([])
        expect(back).toEqual(given)
      }),
    )
  })

  test('survives a query string as it is, without escapes', () => {
    fc.assert(
      fc.property(state, (given) => {
        const query = linkQueryOf(given)
        expect(query).toMatch(/^[A-Za-z0-9?&=._~+-]*$/)
        expect(new URLSearchParams(query.replaceAll('+', '%2B')).get('trial')).toBe(encode(given))
      }),
    )
  })

  test('holds nothing but what differs', () => {
    expect(queryOf(start)).toBe('?setup=plain-beam')
    expect(linkQueryOf(start)).toBe(`?setup=plain-beam&trial=1~${MODEL_VERSION}`)
    const stronger = { ...start, changes: { 'conditions.trueWindSpeedKn': 14 } }
    expect(queryOf(stronger)).toBe(`?setup=plain-beam&trial=1~${MODEL_VERSION}~co.trWndSpdKn_14`)
  })

  test('has a short name of its own for every parameter', () => {
    const names = keys.map(shortName)
    expect(new Set(names).size).toBe(names.length)
    for (const name of names) expect(name).toMatch(/^[a-zA-Z0-9.-]+$/)
  })

  test('never throws, and never sets what the tables do not allow', () => {
    const item = fc.oneof(
      fc.string(),
      fc
        .tuple(
          fc.constantFrom(...keys.map(shortName)),
          fc.oneof(fc.string(), fc.double().map(String)),
        )
        .map(([name, value]) => `${name}_${value}`),
      fc
        .array(
          fc.oneof(fc.constantFrom('gust', 'reef', 'main', '-1', '1e9', '', 'NaN'), fc.string()),
        )
        .map((parts) => parts.join('_')),
    )
    fc.assert(
      fc.property(fc.array(item), (items) => {
        const { state: taken } = decode(['1', MODEL_VERSION, ...items].join('~'), plan)
        const changed = changedPlan(plan, taken.changes)
        for (const key of Object.keys(taken.changes)) {
          const parameter = parameterAt(changed, key)
          const value = readValue(changed, key)
          if (parameter?.type === 'quantity') {
            expect(value).toBeGreaterThanOrEqual(parameter.min)
            expect(value).toBeLessThanOrEqual(parameter.max)
          }
        }
      }),
    )
  })

  test.each([
    ['2~1.0.0~co.trWndSpdKn_14', /of a form \(“2”\) that cannot be read/],
    ['1~0.0.1', /made with model 0\.0\.1.*may differ/],
    [`1~${MODEL_VERSION}~co.trWndSpdKn_140`, /“140” in this link is left out: .*2 to 35 kn/],
    [`1~${MODEL_VERSION}~co.trWndSpdKn_`, /left out: .*2 to 35 kn/],
    [`1~${MODEL_VERSION}~tr.spinnaker.rf_20`, /which this boat and setup do not have/],
    [`1~${MODEL_VERSION}~gust_120_900_15`, /event “gust_120_900_15” in this link is out of range/],
    [`1~${MODEL_VERSION}~gust__6_15`, /out of range/],
    [`1~${MODEL_VERSION}~reef_60_genoa_20`, /a sail this boat does not have/],
    [`1~${MODEL_VERSION}~helm_autopilot`, /which this boat and setup do not have/],
  ])('%s is answered by name and falls back', (code, remark) => {
    const { state: taken, remarks } = decode(code, plan)
    expect(remarks).toHaveLength(1)
    expect(remarks[0]).toMatch(remark)
    expect(taken).toEqual(start)
  })

  test('of an older model keeps the settings', () => {
    const { state: taken } = decode('1~0.0.1~co.trWndSpdKn_14', plan)
    expect(taken.changes).toEqual({ 'conditions.trueWindSpeedKn': 14 })
  })
})
