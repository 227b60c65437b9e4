import { keysOf, parameterAt, withValue } from 'sim/plan/keys'
import { problemsOf } from 'sim/plan/problems'
import type { Plan } from 'sim/plan/types'
import { describe, expect, test } from 'vitest'
import { boatCalled, demoPlans, planWith } from '../demo-plans'

const deflected = planWith(boatCalled('lifting-keel-22'), {
  trim: { main: { sheetAngleDeg: 24 }, genoa: { sheetAngleDeg: 12 }, jib: { set: 'no' } },
  line: { hitchDistance: 0.6, takeUp: 0.3, tillerRadius: 0.6 },
  leads: [{ x: 1.3, y: 0.6, z: 0.9 }],
  elastic: { tillerRadius: 0.7, anchorY: 1 },
})

/** The problem named by a key, which must be the only kind there is. */
function problem(plan: Plan, key: string) {
  const found = problemsOf(plan)
  expect(found.map((one) => one.key)).toContain(key)
  const [named] = found.filter((one) => one.key === key)
  if (!named) throw new Error(`no problem named ${key}`)
  return named
}

test('no demo plan is refused', () => {
  for (const plan of demoPlans) expect(problemsOf(plan)).toEqual([])
})

test('each single value beyond its range is refused by name with the range', () => {
  for (const key of keysOf(deflected)) {
    const parameter = parameterAt(deflected, key)
    if (!parameter || parameter.type === 'choice') continue
    for (const given of [parameter.min - 1, parameter.max + 1]) {
      expect(problemsOf(withValue(deflected, key, given))).toEqual([
        {
          key,
          given,
          message: expect.stringContaining(`${parameter.min} to ${parameter.max}`),
          min: parameter.min,
          max: parameter.max,
        },
      ])
    }
  }
})

test('an option that is not offered is refused with those that are', () => {
  const [found] = problemsOf(withValue(deflected, 'leads.0.kind', 'pulley'))
  expect(found?.key).toBe('leads.0.kind')
  expect(found?.message).toContain('ball, plain, fairlead, rub')
})

describe('what only several values together tell', () => {
  test('a setup made for another boat', () => {
    const plan = { ...deflected, setup: { ...deflected.setup, boatId: 'another' } }
    expect(problem(plan, 'boatId').message).toContain(deflected.boat.id)
  })

  test('a trim for a sail the boat does not have', () => {
    const { setup } = deflected
    const any = Object.values(setup.trim)[0]
    if (!any) throw new Error('no trim')
    const plan = { ...deflected, setup: { ...setup, trim: { ...setup.trim, topsail: any } } }
    expect(problem(plan, 'trim.topsail').message).toContain('topsail')
  })

  test('no sail set', () => {
    let plan = deflected
    for (const id of Object.keys(plan.setup.trim)) plan = withValue(plan, `trim.${id}.set`, 'no')
    expect(problem(plan, 'trim').message).toContain('at least one sail')
  })

  test('a pull taken from a sail that is stowed, or that is not there', () => {
    const { source } = deflected.setup
    expect(problem(withValue(deflected, `trim.${source}.set`, 'no'), 'source').given).toBe(source)
    const absent = { ...deflected, setup: { ...deflected.setup, source: 'topsail' } }
    const named = problem(absent, 'source')
    expect(named.message).toContain(source)
  })

  test.each(['line.tillerRadius', 'elastic.tillerRadius'])(
    '%s beyond the end of the tiller',
    (key) => {
      const length = deflected.boat.tiller.length
      const named = problem(withValue(deflected, key, length + 0.01), key)
      expect(named.max).toBeCloseTo(length, 9)
      expect(named.message).toContain(`0.1 to ${length} m`)
      expect(problemsOf(withValue(deflected, key, length))).toEqual([])
    },
  )

  test('a hitch beyond the end of its part of the sheet', () => {
    const named = problem(withValue(deflected, 'line.hitchDistance', 4), 'line.hitchDistance')
    expect(named.max).toBeLessThan(4)
    const kept = withValue(deflected, 'line.hitchDistance', (named.max ?? 0) - 1e-9)
    expect(problemsOf(kept).map((one) => one.key)).not.toContain('line.hitchDistance')
  })

  test('a hitch hauled into its first lead', () => {
    const named = problem(withValue(deflected, 'line.takeUp', 1.8), 'line.takeUp')
    expect(named.max).toBeLessThan(1.8)
    const kept = withValue(deflected, 'line.takeUp', (named.max ?? 0) - 1e-9)
    expect(problemsOf(kept)).toEqual([])
  })

  test.each([
    ['leads.0.y', 2.5],
    ['leads.0.x', 14],
    ['leads.0.z', 3],
    ['leads.0.z', 0.2],
  ])('a lead off the boat or through the hull: %s %d', (key, given) => {
    const named = problem(withValue(deflected, key, given), key)
    expect(named.given).toBe(given)
    expect(named.message).toMatch(/ must be from -?[\d.]+ to [\d.]+ m: a lead sits on/)
  })

  test('a lead on the next point of the line, which would leave no length between them', () => {
    const { boat, setup } = deflected
    const onTiller = { x: setup.line.tillerRadius, y: 0, z: boat.tiller.height }
    const leads = [...setup.leads.slice(0, -1), { kind: 'ball' as const, ...onTiller }]
    const place = `leads.${leads.length - 1}.x`
    const plan = { boat, setup: { ...setup, leads } }
    expect(problem(plan, place).message).toContain('nothing')
  })

  test('an elastic that does not fit between its anchor and the tiller', () => {
    const named = problem(withValue(deflected, 'elastic.naturalLength', 3), 'elastic.naturalLength')
    expect(named.max).toBeLessThan(3)
    expect(named.message).toContain('fit')
  })

  test('an elastic strained beyond its jacket', () => {
    const short = withValue(deflected, 'elastic.naturalLength', 0.3)
    const named = problem(withValue(short, 'elastic.stretch', 0.5), 'elastic.stretch')
    expect(named.max).toBeLessThan(0.5)
    expect(named.message).toContain('jacket')
    expect(problemsOf(withValue(short, 'elastic.stretch', named.max ?? 0))).toEqual([])
  })

  test('an elastic for whose stretch there is no room at all', () => {
    const near = withValue(withValue(deflected, 'elastic.anchorX', 0.7), 'elastic.anchorY', 0.3)
    const level = withValue(near, 'elastic.anchorZ', deflected.boat.tiller.height)
    expect(problem(withValue(level, 'elastic.stretch', 0.25), 'elastic.stretch').given).toBe(0.25)
  })

  test.each([
    ['elastic.anchorX', 10],
    ['elastic.anchorY', 2.5],
  ])('an elastic made fast off the boat: %s %d', (key, given) => {
    expect(problem(withValue(deflected, key, given), key).message).toContain('on the boat')
  })

  test.each([10, -10, 0])(
    'a course of %d degrees, closer to the wind than any sail draws',
    (course) => {
      const key = 'conditions.trueWindAngleDeg'
      expect(problem(withValue(deflected, key, course), key).message).toContain('25 to 180')
      expect(problemsOf(withValue(deflected, key, course < 0 ? -25 : 25))).toEqual([])
    },
  )

  test('a waterline longer than the boat', () => {
    const { lengthOverall } = deflected.boat.hull
    const named = problem(
      withValue(deflected, 'hull.waterlineLength', lengthOverall + 0.05),
      'hull.waterlineLength',
    )
    expect(named.max).toBe(lengthOverall)
  })

  test.each([500, 16000])('a displacement of %d kg that the canoe body cannot have', (given) => {
    const named = problem(withValue(deflected, 'hull.displacement', given), 'hull.displacement')
    expect(named.message).toContain(`${named.min} to ${named.max} kg`)
    expect(problemsOf(withValue(deflected, 'hull.displacement', named.max ?? 0))).toEqual([])
  })

  test('a sheet made fast beyond the end of the foot', () => {
    const named = problem(withValue(deflected, 'sails.main.sheetReach', 5), 'sails.main.sheetReach')
    expect(named.max).toBeGreaterThanOrEqual(deflected.boat.sails.main?.footLength ?? 0)
  })

  test.each(['pole', 'backed'])('a main held to windward: %s', (held) => {
    const named = problem(withValue(deflected, 'trim.main.held', held), 'trim.main.held')
    expect(named.message).toContain('sheet or preventer')
  })

  test('a mainsheet led from under the pivot of its boom', () => {
    const { main } = deflected.boat.sails
    const plan = withValue(deflected, 'sails.main.sheetX', Math.round((main?.luffX ?? 0) * 20) / 20)
    expect(problem(plan, 'sails.main.sheetX').message).toContain('pivot')
  })

  describe('of a tail', () => {
    const tail = withValue(withValue(deflected, 'line.pull', 'tail'), 'line.takeUp', 0)

    test('which as such may be sailed', () => {
      expect(problemsOf(tail)).toEqual([])
    })

    test('a sail that is held fast', () => {
      const named = problem(withValue(tail, 'trim.main.held', 'preventer'), 'trim.main.held')
      expect(named.message).toContain('must be sheet')
    })

    test('hauled until the boom would pass amidships', () => {
      const hard = withValue(tail, 'trim.main.sheetAngleDeg', 3)
      const named = problem(withValue(hard, 'line.takeUp', 1.5), 'line.takeUp')
      expect(named.message).toContain('amidships')
      expect(problemsOf(withValue(hard, 'line.takeUp', named.max ?? 0))).toEqual([])
    })
  })
})
