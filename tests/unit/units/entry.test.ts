import fc from 'fast-check'
import type { StoredUnit } from 'sim/parameters/define'
import { describe, expect, test } from 'vitest'
import { readEntry } from '~/features/units/entry'
import { inWords, reading, rounded, shownUnit, type Units } from '~/features/units/units'

const metric: Units = { speed: 'kn', length: 'metric', force: 'N' }
const imperial: Units = { speed: 'm/s', length: 'imperial', force: 'lbf' }

async function read(text: string, unit: StoredUnit, units = metric, step = 1) {
  const entry = await readEntry(text, unit, shownUnit(unit, units, step))
  if (!entry.ok) throw new Error(entry.message)
  return entry.value
}

describe('an entry', () => {
  test.each<[string, StoredUnit, number]>([
    ['8 mm', 'mm', 8],
    ['8 mm', 'm', 0.008],
    ['42 cm', 'm', 0.42],
    ['3/4 in', 'm', 0.01905],
    ['3/4 in', 'mm', 19.05],
    ['1 ft 3 in', 'm', 0.381],
    ['1\' 3 1/2"', 'm', 0.3937],
    ['1½ in', 'mm', 38.1],
    ['-3 in', 'm', -0.0762],
    ['12 kn', 'kn', 12],
    ['12 knots', 'kn', 12],
    ['6 m/s', 'kn', 11.663067],
    ['20 km/h', 'kn', 10.7991361],
    ['5 kgf', 'N', 49.03325],
    ['5 KGF', 'N', 49.03325],
    ['0.2 kN', 'N', 200],
    ['10 lbf', 'N', 44.4822162],
    ['3 lbf ft', 'Nm', 4.06745384],
    ['2 min 30 s', 's', 150],
    ['12 %', '1', 0.12],
    ['62°', 'deg', 62],
    ['62 deg', 'deg', 62],
    ['100 ft²', 'm2', 9.290304],
    ['3.6 t', 'kg', 3600],
    ['0,5', 'm', 0.5],
    ['1.5e1', 's', 15],
    ['−4', 'deg', -4],
  ])('%s for %s is %d', async (text, unit, expected) => {
    expect(await read(text, unit)).toBeCloseTo(expected, 6)
  })

  test('a bare number is in the unit shown', async () => {
    expect(await read('42', 'm', metric, 0.01)).toBeCloseTo(0.42, 9)
    expect(await read('10', 'm', imperial, 0.01)).toBeCloseTo(0.254, 9)
    expect(await read('6', 'kn', imperial)).toBeCloseTo(11.663067, 6)
  })

  test.each<[string, StoredUnit, RegExp]>([
    ['', 'm', /Nothing entered/],
    ['fresh', 'kn', /no number with a unit/],
    ['5 kg', 'N', /“kg” is not a force here. Use N, kgf or lbf/],
    ['12 kn', 'm', /“kn” is not a length here/],
    ['3 zork', 'm', /“zork” is not a length here/],
    ['sqrt(4) m', 'm', /no number with a unit/],
    ['2*3 m', 'm', /no number with a unit/],
    ['1/0 in', 'm', /no number with a unit/],
    ['4 m', 'deg', /not an angle/],
    ['3 4', 'm', /no number with a unit/],
    ['5 constructor', 'N', /not a force/],
    ['5 N/', 'N', /not a force/],
  ])('“%s” for %s is refused by name', async (text, unit, message) => {
    const entry = await readEntry(text, unit, shownUnit(unit, metric))
    expect(entry).toMatchObject({ ok: false, message: expect.stringMatching(message) })
  })

  test('no text makes it throw', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.oneof(
          fc.string(),
          fc.string({ unit: fc.constantFrom(...'0123456789.,/- eminftkgN"\'°%^*²') }),
        ),
        fc.constantFrom<StoredUnit>('m', 'kn', 'N', 'deg', '1', '%'),
        async (text, unit) => {
          const entry = await readEntry(text, unit, shownUnit(unit, metric))
          if (entry.ok) expect(Number.isFinite(entry.value)).toBe(true)
          else expect(entry.message).not.toBe('')
        },
      ),
    )
  })
})

const stored: StoredUnit[] = [
  'm',
  'm2',
  'kg',
  'kgm2',
  'deg',
  'kn',
  's',
  'mm',
  'N',
  'Nm',
  'MPa',
  '%',
  '1',
]
const choices = fc.record<Units>({
  speed: fc.constantFrom('kn', 'm/s'),
  length: fc.constantFrom('metric', 'imperial'),
  force: fc.constantFrom('N', 'kgf', 'lbf'),
})

describe('a value shown', () => {
  test('read back with its unit, is the same to the resolution shown', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.constantFrom(...stored),
        choices,
        fc.constantFrom(0.01, 0.05, 0.1, 0.5, 1),
        fc.double({ min: -500, max: 5000, noNaN: true }),
        async (unit, units, step, value) => {
          const text = inWords(reading(unit, value, units, step))
          const entry = await readEntry(text, unit, shownUnit(unit, units, step))
          expect(entry.ok && Math.abs(entry.value - value)).toBeLessThanOrEqual(step / 2 + 1e-5)
        },
      ),
    )
  })

  test('in steps of its parameter, is exactly the same in the stored unit', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.constantFrom(...stored),
        fc.constantFrom(0.01, 0.05, 0.1, 0.5, 1),
        fc.integer({ min: -400, max: 4000 }),
        async (unit, step, count) => {
          const value = Number((count * step).toPrecision(9))
          const text = inWords(reading(unit, value, metric, step))
          expect(await read(text, unit, metric, step)).toBe(value)
        },
      ),
    )
  })

  test('shows what was typed, not its nearest step', () => {
    expect(inWords(reading('m', 0.085, metric, 0.01))).toBe('8.5 cm')
    expect(inWords(reading('kn', 12, metric, 0.5))).toBe('12.0 kn')
    expect(inWords(reading('m', 0.3, imperial, 0.01))).toBe('11.8 in')
  })

  test('has no minus before nought', () => {
    expect(inWords(rounded('deg', -0.2, metric))).toBe('0°')
  })
})
