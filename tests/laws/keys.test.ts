import fc from 'fast-check'
import type { Parameter } from 'sim/parameters/define'
import { checkValue, keysOf, parameterAt, readValue, type Value, withValue } from 'sim/plan/keys'
import { describe, expect, test } from 'vitest'
import { demoPlans } from '../demo-plans'

/** Any value that a parameter allows. */
function valueFor(parameter: Parameter): fc.Arbitrary<Value> {
  if (parameter.type === 'choice') return fc.constantFrom(...Object.keys(parameter.options))
  const { min, max, whole } = parameter
  return whole ? fc.integer({ min, max }) : fc.double({ min, max, noNaN: true })
}

const planAndKey = fc
  .constantFrom(...demoPlans)
  .chain((plan) => fc.constantFrom(...keysOf(plan)).map((key) => ({ plan, key })))
  .chain(({ plan, key }) => {
    const parameter = parameterAt(plan, key)
    if (!parameter) throw new Error(`no parameter under ${key}`)
    return valueFor(parameter).map((value) => ({ plan, key, parameter, value }))
  })

describe('every key of every demo plan', () => {
  test('has a parameter and a value that the parameter allows', () => {
    for (const plan of demoPlans) {
      for (const key of keysOf(plan)) {
        const parameter = parameterAt(plan, key)
        expect([key, parameter?.label]).toEqual([key, expect.any(String)])
        if (parameter) expect(checkValue(key, parameter, readValue(plan, key))).toBeNull()
      }
    }
  })

  test('is there once', () => {
    for (const plan of demoPlans) expect(new Set(keysOf(plan)).size).toBe(keysOf(plan).length)
  })
})

test('what is written under a key is read there, nothing else moves and the plan given stays', () => {
  fc.assert(
    fc.property(planAndKey, ({ plan, key, value }) => {
      const before = JSON.stringify(plan)
      const changed = withValue(plan, key, value)
      expect(readValue(changed, key)).toBe(value)
      expect(JSON.stringify(plan)).toBe(before)
      for (const other of keysOf(plan)) {
        if (other !== key) expect(readValue(changed, other)).toBe(readValue(plan, other))
      }
      expect(withValue(changed, key, readValue(plan, key))).toEqual(plan)
    }),
    { numRuns: 150, seed: 11 },
  )
})

test('an allowed value passes the check, one beyond the range is refused with it', () => {
  fc.assert(
    fc.property(planAndKey, ({ key, parameter, value }) => {
      expect(checkValue(key, parameter, value)).toBeNull()
      if (parameter.type === 'choice') return
      for (const beyond of [parameter.min - 1, parameter.max + 1]) {
        const message = checkValue(key, parameter, beyond)
        expect(message).toContain(key)
        expect(message).toContain(`${parameter.min} to ${parameter.max}`)
      }
    }),
    { numRuns: 200, seed: 12 },
  )
})

test('a key that the plan does not have is no parameter, is not read and not written', () => {
  const [plan] = demoPlans
  if (!plan) throw new Error('no demo plan')
  const keys = [
    '',
    'line',
    'line.',
    'line.nothing',
    'leads.7.x',
    'leads.x',
    'trim.spinnaker.reef',
    'constructor.name',
    'line.constructor',
    'leads.length.x',
    'sails.main.area.unit',
    '__proto__.x',
  ]
  for (const key of keys) {
    expect(parameterAt(plan, key)).toBeUndefined()
    expect(() => readValue(plan, key)).toThrow(RangeError)
    expect(() => withValue(plan, key, 1)).toThrow(RangeError)
  }
})
