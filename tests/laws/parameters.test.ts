import fc from 'fast-check'
import { conditionParameters } from 'sim/parameters/conditions'
import { defaultsOf, type ParameterTable, type Quantity } from 'sim/parameters/define'
import {
  hullParameters,
  keelParameters,
  rudderParameters,
  tillerParameters,
} from 'sim/parameters/hull'
import { judgingParameters } from 'sim/parameters/judging'
import { sailParameters, trimParameters } from 'sim/parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from 'sim/parameters/steering'
import { checkValue } from 'sim/plan/keys'
import { boatSchema, conditionsSchema, leadSchema, setupSchema, trimSchema } from 'sim/plan/schema'
import { describe, expect, test } from 'vitest'
import { boatCalled, planWith } from '../demo-plans'

const tables: Record<string, ParameterTable> = {
  conditions: conditionParameters,
  hull: hullParameters,
  keel: keelParameters,
  rudder: rudderParameters,
  tiller: tillerParameters,
  sail: sailParameters,
  trim: trimParameters,
  line: lineParameters,
  lead: leadParameters,
  elastic: elasticParameters,
  judging: judgingParameters,
}

const plan = planWith(boatCalled('fin-skeg-31'), { trim: { main: {} } })

/** Each table's values inside the document that carries them, and how a fault there is named. */
const carriers: Record<string, { parse(values: object): { success: boolean; error?: Error } }> = {
  conditions: { parse: (values) => conditionsSchema.safeParse(values) },
  lead: { parse: (values) => leadSchema.safeParse(values) },
  trim: { parse: (values) => trimSchema.safeParse(values) },
  hull: { parse: (hull) => boatSchema.safeParse({ ...plan.boat, hull }) },
  keel: { parse: (keel) => boatSchema.safeParse({ ...plan.boat, keel }) },
  rudder: { parse: (rudder) => boatSchema.safeParse({ ...plan.boat, rudder }) },
  tiller: { parse: (tiller) => boatSchema.safeParse({ ...plan.boat, tiller }) },
  sail: {
    parse: (sail) =>
      boatSchema.safeParse({ ...plan.boat, sails: { main: { ...sail, name: 'Mainsail' } } }),
  },
  line: { parse: (line) => setupSchema.safeParse({ ...plan.setup, line }) },
  elastic: { parse: (elastic) => setupSchema.safeParse({ ...plan.setup, elastic }) },
}

describe.each(Object.entries(tables))('table %s', (_, table) => {
  const quantities = Object.entries(table).filter(
    (entry): entry is [string, Quantity] => entry[1].type === 'quantity',
  )

  test('keeps every default inside its range and every range the right way round', () => {
    for (const [key, { min, max, step, default: value, whole }] of quantities) {
      expect([key, min < max]).toEqual([key, true])
      expect([key, min <= value && value <= max]).toEqual([key, true])
      expect([key, step > 0 && step <= max - min]).toEqual([key, true])
      if (whole) expect([key, [min, max, step, value].every(Number.isInteger)]).toEqual([key, true])
    }
  })

  test('offers every default among its options', () => {
    for (const [key, parameter] of Object.entries(table)) {
      if (parameter.type !== 'choice') continue
      expect([key, Object.keys(parameter.options)]).toEqual([
        key,
        expect.arrayContaining([parameter.default]),
      ])
      expect(Object.keys(parameter.options).length).toBeGreaterThan(1)
    }
  })

  test('has a label of its own and a source for every parameter', () => {
    const labels = Object.values(table).map(({ label }) => label)
    expect(new Set(labels).size).toBe(labels.length)
    for (const parameter of Object.values(table)) {
      expect(parameter.label.trim()).not.toBe('')
      expect(parameter.source.trim()).not.toBe('')
    }
  })

  test('has a symbol of its own for every quantity', () => {
    const symbols = quantities.map(([, { symbol }]) => symbol)
    expect(new Set(symbols).size).toBe(symbols.length)
  })
})

describe.each(Object.keys(carriers))('schema of %s', (name) => {
  const table = tables[name] as ParameterTable
  const carrier = carriers[name] as (typeof carriers)[string]
  const defaults = defaultsOf(table) as Record<string, number | string>

  test('accepts the defaults and the ends of every range', () => {
    expect(carrier.parse(defaults).success).toBe(true)
    for (const [key, parameter] of Object.entries(table)) {
      const allowed =
        parameter.type === 'quantity'
          ? [parameter.min, parameter.max]
          : Object.keys(parameter.options)
      for (const value of allowed) {
        expect([key, carrier.parse({ ...defaults, [key]: value }).success]).toEqual([key, true])
      }
    }
  })

  test('refuses what lies outside, names the parameter and says what is allowed', () => {
    for (const [key, parameter] of Object.entries(table)) {
      const refused =
        parameter.type === 'quantity'
          ? [
              parameter.min - 1e-6,
              parameter.max + 1e-6,
              Number.NaN,
              Number.POSITIVE_INFINITY,
              'much',
              null,
              ...(parameter.whole ? [parameter.min + 0.5] : []),
            ]
          : ['none of these', 3, null]
      for (const value of refused) {
        const { success, error } = carrier.parse({ ...defaults, [key]: value })
        expect([key, value, success]).toEqual([key, value, false])
        expect(error?.message).toContain(key)
        if (parameter.type === 'quantity') {
          expect(error?.message).toContain(`${parameter.min} to ${parameter.max}`)
        } else {
          for (const option of Object.keys(parameter.options)) {
            expect(error?.message).toContain(option)
          }
        }
      }
    }
  })

  test('refuses a name that is not in the table, and one that is missing', () => {
    expect(carrier.parse({ ...defaults, unheardOf: 1 }).success).toBe(false)
    const [first = ''] = Object.keys(table)
    const { [first]: _, ...rest } = defaults
    expect(carrier.parse(rest).success).toBe(false)
  })

  test('agrees with the check of single values', () => {
    const keys = Object.keys(table)
    fc.assert(
      fc.property(
        fc.constantFrom(...keys),
        fc.oneof(
          fc.double({ min: -400, max: 400, noNaN: true }),
          fc.integer({ min: -50, max: 2000 }),
          fc.string(),
        ),
        (key, value) => {
          const parameter = table[key]
          if (!parameter) throw new Error('no such parameter')
          const single = checkValue(key, parameter, value) === null
          expect(carrier.parse({ ...defaults, [key]: value }).success).toBe(single)
        },
      ),
      { numRuns: 200, seed: 3 },
    )
  })
})
