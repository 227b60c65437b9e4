// Common practice, no source.
import { readValue, withValue } from 'sim/plan/keys'
import { problemsOf } from 'sim/plan/problems'
import type { Plan } from 'sim/plan/types'
import { runTrial } from 'sim/trial/run'
import { describe, expect, test } from 'vitest'
import { calm, soundPlans } from '../demo-plans'

/** Courses to the wind on the tack sailed, degrees, in steady wind on flat water. */
function courses(plan: Plan) {
  const { trueWindAngleDeg } = plan.setup.conditions
  const side = Math.sign(trueWindAngleDeg)
  const { series, metrics } = runTrial({
    plan,
    conditions: { ...plan.setup.conditions, ...calm },
    events: [],
    helm: 'sheet-to-tiller',
    solver: 'fixed-step',
    durationS: 360,
    outputIntervalS: 1,
  })
  const course = series.courseToWindDeg.map((degrees) => side * degrees)
  const last = course.slice(-60)
  return {
    soon: course[20] as number,
    settled: last.reduce((sum, degrees) => sum + degrees, 0) / last.length,
    lost: metrics.lastedS < 360,
  }
}

function changed(plan: Plan, key: string, by: number): Plan {
  const moved = withValue(plan, key, (readValue(plan, key) as number) + by)
  expect(problemsOf(moved)).toEqual([])
  return moved
}

const CENTIMETRE = 0.01

describe('stretching the elastic', () => {
  test.each(soundPlans)(
    '$setup.id: further brings her up, less lets her fall off',
    ({ boat, setup }) => {
      const plan = { boat, setup }
      const before = courses(plan)
      const more = courses(changed(plan, 'elastic.stretch', CENTIMETRE))
      const less = courses(changed(plan, 'elastic.stretch', -CENTIMETRE))
      expect(more.soon).toBeLessThan(before.soon)
      expect(less.soon).toBeGreaterThan(before.soon)
      if (!before.lost && !more.lost) expect(more.settled).toBeLessThan(before.settled)
      if (!before.lost && !less.lost) expect(less.settled).toBeGreaterThan(before.settled)
    },
  )
})

// A sheet's own tail is another matter: taking it up sheets the sail in and leaves the pull to the wind.
const hitched = soundPlans.filter(({ setup }) => setup.line.pull === 'deflected')

describe('taking up a control line that is hitched to a sheet', () => {
  test('is tried on two boats at least', () => {
    expect(new Set(hitched.map(({ boat }) => boat.id)).size).toBeGreaterThan(1)
  })

  test.each(hitched)('$setup.id: bears her away, easing it brings her up', ({ boat, setup }) => {
    const plan = { boat, setup }
    const before = courses(plan)
    const more = courses(changed(plan, 'line.takeUp', CENTIMETRE))
    const less = courses(changed(plan, 'line.takeUp', -CENTIMETRE))
    expect(more.soon).toBeGreaterThan(before.soon)
    expect(less.soon).toBeLessThan(before.soon)
    if (!before.lost && !more.lost) expect(more.settled).toBeGreaterThan(before.settled)
    if (!before.lost && !less.lost) expect(less.settled).toBeLessThan(before.settled)
  })
})
