import { turningAngle } from 'sim/boat/control-line'
import { DEGREE } from 'sim/constants'
import { blockLoad, capstan, leadExponent } from 'sim/steering/leads'
import { ropeStrength } from 'sim/steering/rope'
import { describe, expect, test } from 'vitest'

describe('line around a post', () => {
  // e^(mu theta), Eytelwein (computed).
  test.each([
    [0.1, 180, 1.3691],
    [0.2, 90, 1.3691],
    [0.2, 180, 1.8745],
    [0.2, 360, 3.5136],
    [0.3, 180, 2.5663],
  ])('friction %d over %d degrees', (friction, degrees, ratio) => {
    expect(capstan(friction, degrees * DEGREE)).toBeCloseTo(ratio, 4)
  })

  test('rubbing leads follow it, with frictions between .1 and .3', () => {
    for (const kind of ['fairlead', 'rub'] as const) {
      const right = Math.exp(leadExponent(kind, 90 * DEGREE))
      expect(right ** 2).toBeCloseTo(Math.exp(leadExponent(kind, 180 * DEGREE)), 12)
      expect(right).toBeGreaterThan(capstan(0.1, 90 * DEGREE))
      expect(right).toBeLessThan(capstan(0.3, 90 * DEGREE))
    }
  })
})

describe('load on a block', () => {
  // 2 sin(theta/2) (read).
  test.each([
    [30, 52],
    [60, 100],
    [90, 141],
    [120, 173],
    [180, 200],
  ])('turning %d degrees is %d percent', (degrees, percent) => {
    expect(100 * blockLoad(degrees * DEGREE)).toBeCloseTo(percent, -0.5)
    expect(Math.round(100 * blockLoad(degrees * DEGREE))).toBe(percent)
  })
})

describe('loss in a sheave at a half turn', () => {
  const loss = (kind: 'ball' | 'plain') => 1 - Math.exp(-leadExponent(kind, Math.PI))

  test('ball-bearing about 2 percent, plain 3 to 10', () => {
    // Toss, The Complete Rigger's Apprentice (read): 2 to 10 percent, best bushings 3 to 5, ball or roller about 2.
    expect(loss('ball')).toBeCloseTo(0.02, 3)
    expect(loss('plain')).toBeGreaterThan(0.03)
    expect(loss('plain')).toBeLessThan(0.1)
  })

  test('a plain one hauls a load on four parts as the wire rope handbook has it, within 2 percent', () => {
    // Wire Rope Users Manual (read): factor 1.09 a plain sheave, lead line .309 of the load on 4 parts.
    const k = Math.exp(leadExponent('plain', Math.PI))
    expect(Math.abs(k / 1.09 - 1)).toBeLessThan(0.02)
    const lead = (k ** 4 * (k - 1)) / (k ** 4 - 1)
    expect(Math.abs(lead / 0.309 - 1)).toBeLessThan(0.02)
  })

  test('grows with the load on the sheave, from nothing at no turn', () => {
    // In proportion to 2 sin(theta/2): a derivation, not published.
    for (const kind of ['ball', 'plain'] as const) {
      expect(leadExponent(kind, 0)).toBeCloseTo(0, 12)
      const right = 1 - Math.exp(-leadExponent(kind, 90 * DEGREE))
      expect(right / loss(kind)).toBeCloseTo(Math.SQRT1_2, 9)
    }
  })

  test('leads rank as a rigger ranks them', () => {
    const order = (['ball', 'plain', 'fairlead', 'rub'] as const).map((kind) =>
      leadExponent(kind, 90 * DEGREE),
    )
    expect(order).toEqual([...order].sort((a, b) => a - b))
  })
})

test('turning angle of a line at a lead', () => {
  const at = { x: 1, y: 1, z: 1 }
  const from = { x: 0, y: 1, z: 1 }
  expect(turningAngle(from, at, { x: 2, y: 1, z: 1 })).toBeCloseTo(0, 9)
  expect(turningAngle(from, at, { x: 1, y: 3, z: 1 })).toBeCloseTo(Math.PI / 2, 9)
  expect(turningAngle(from, at, { x: 1, y: 1, z: 2 })).toBeCloseTo(Math.PI / 2, 9)
  expect(turningAngle(from, at, { x: 0, y: 1, z: 1 })).toBeCloseTo(Math.PI, 6)
})

describe('stretch of new line', () => {
  // At 10, 20 and 30 percent of breaking load, percent (from memory, fairly sure).
  test.each([
    ['polyester', 1.1, 1.7, 2.7],
    ['hmpe', 0.46, 0.7, 0.96],
  ] as const)(
    '%s, exact at a fifth and within a quarter around it',
    (material, tenth, fifth, most) => {
      const { breakingLoad, axialStiffness } = ropeStrength(8, material)
      const stretch = (share: number) => (100 * share * breakingLoad) / axialStiffness
      expect(stretch(0.2)).toBeCloseTo(fifth, 9)
      expect(Math.abs(stretch(0.1) / tenth - 1)).toBeLessThan(0.25)
      expect(Math.abs(stretch(0.3) / most - 1)).toBeLessThan(0.25)
    },
  )

  test('strength grows with the cross-section', () => {
    const thin = ropeStrength(5, 'polyester').breakingLoad
    expect(ropeStrength(10, 'polyester').breakingLoad / thin).toBeCloseTo(4, 9)
  })
})
