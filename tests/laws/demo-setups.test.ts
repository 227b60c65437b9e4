import { demoSetups } from 'db/demo/setups'
import { judgingParameters } from 'sim/parameters/judging'
import { problemsOf } from 'sim/plan/problems'
import { boatSchema, setupSchema } from 'sim/plan/schema'
import { describe, expect, test } from 'vitest'
import { demoPlan, demoPlans, soundPlans } from '../demo-plans'
import { heldOf } from './hold-count'

const SEEDS = 10
const flawed = demoSetups.filter((setup) => setup.flaw).map(demoPlan)
/** Wind from which it is called fresh, knots; the upper end of force 3 (Beaufort scale). */
const FRESH = 11

describe('the demo setups as a whole', () => {
  test('are at least nine that hold and three that are wrong on purpose', () => {
    expect(soundPlans.length).toBeGreaterThanOrEqual(9)
    expect(flawed.length).toBeGreaterThanOrEqual(3)
    expect(new Set(flawed.map(({ setup }) => setup.flaw?.code)).size).toBe(flawed.length)
  })

  test('go close-hauled, reaching and running, in light and in fresh wind', () => {
    const asked = soundPlans.map(({ setup }) => Math.abs(setup.conditions.trueWindAngleDeg))
    expect(asked.some((angle) => angle <= 60)).toBe(true)
    expect(asked.some((angle) => angle > 60 && angle < 135)).toBe(true)
    expect(asked.some((angle) => angle >= 150)).toBe(true)
    const winds = soundPlans.map(({ setup }) => setup.conditions.trueWindSpeedKn)
    expect(winds.filter((wind) => wind < FRESH).length).toBeGreaterThanOrEqual(2)
    expect(winds.filter((wind) => wind >= FRESH).length).toBeGreaterThanOrEqual(2)
  })

  test('take the pull from main, headsail and steering sail, two of each at least', () => {
    const kinds = soundPlans.map(({ boat, setup }) => boat.sails[setup.source]?.kind)
    for (const kind of ['main', 'headsail', 'steering'] as const) {
      expect(kinds.filter((one) => one === kind).length).toBeGreaterThanOrEqual(2)
    }
  })

  test('sail every demo boat', () => {
    expect(new Set(soundPlans.map(({ boat }) => boat.id)).size).toBe(4)
  })

  test.each(demoPlans)(
    '$setup.id keeps to the schemas and is refused nowhere',
    ({ boat, setup }) => {
      expect(boatSchema.safeParse(boat).success).toBe(true)
      expect(setupSchema.safeParse(setup).success).toBe(true)
      expect(problemsOf({ boat, setup })).toEqual([])
    },
  )

  test.each(soundPlans)('$setup.id has gusts and a sea', ({ setup }) => {
    const { turbulenceIntensity, significantWaveHeightM, trueWindSpeedKn } = setup.conditions
    expect(turbulenceIntensity).toBeGreaterThanOrEqual(0.12)
    expect(significantWaveHeightM).toBeGreaterThanOrEqual(trueWindSpeedKn < FRESH ? 0.2 : 0.5)
  })

  test.each(soundPlans)('$setup.id meets a sea that can exist', ({ setup }) => {
    const { significantWaveHeightM, peakWavePeriodS, trueWindSpeedKn } = setup.conditions
    // Steepness of a sea in deep water: Hs/L no more than 1/15 (DNV-RP-C205, Tp below 8 s; from memory, fairly sure).
    const length = (9.80665 * peakWavePeriodS ** 2) / (2 * Math.PI)
    expect(significantWaveHeightM / length).toBeLessThan(1 / 15)
    // No higher than this wind can raise: .22 U10^2/g (Pierson-Moskowitz, read).
    const wind = (trueWindSpeedKn * 1852) / 3600
    expect(significantWaveHeightM).toBeLessThan((0.22 * wind ** 2) / 9.80665 + 0.05)
  })
})

describe('a sound setup', () => {
  const least = judgingParameters.seedsToHold.default

  test.each(soundPlans)(`$setup.id holds in ${least} of ${SEEDS} seeds at least`, (plan) => {
    expect(heldOf(plan, 'sheet-to-tiller', SEEDS)).toBeGreaterThanOrEqual(least)
  })

  test.each(soundPlans)('$setup.id with the tiller free holds in two at most', (plan) => {
    expect(heldOf(plan, 'free', SEEDS)).toBeLessThanOrEqual(2)
  })
})

describe('a setup that is wrong on purpose', () => {
  test.each(flawed)('$setup.id holds in two seeds at most, as its flaw says', (plan) => {
    expect(plan.setup.flaw?.text.length).toBeGreaterThan(20)
    expect(heldOf(plan, 'sheet-to-tiller', SEEDS)).toBeLessThanOrEqual(2)
  })
})
