// Common practice, no source.
import type { Helm, Plan } from 'sim/plan/types'
import { runTrial } from 'sim/trial/run'
import { describe, expect, test } from 'vitest'
import { calm, soundPlans } from '../demo-plans'

const BEGINS = 120

/** Changes from just before a gust of two fifths of the wind to its end, degrees, positive to windward or away from the wind. */
function inGust(plan: Plan, helm: Helm) {
  const { conditions } = plan.setup
  const side = Math.sign(conditions.trueWindAngleDeg)
  const { series } = runTrial({
    plan,
    conditions: { ...conditions, ...calm },
    events: [
      {
        atS: BEGINS,
        kind: 'gust',
        strengthKn: 0.4 * conditions.trueWindSpeedKn,
        durationS: 20,
      },
    ],
    helm,
    solver: 'fixed-step',
    durationS: BEGINS + 20,
    outputIntervalS: 0.5,
  })
  const from = (channel: 'tillerDeg' | 'courseToWindDeg') => {
    const column = series[channel].subarray(2 * BEGINS)
    const start = column[0] as number
    return column.map((degrees) => side * (degrees - start))
  }
  const tiller = from('tillerDeg')
  const course = from('courseToWindDeg')
  return {
    /** As the gust sets in, and at its height. */
    tillerAtOnce: tiller[2 * 2] as number,
    tillerAtHeight: tiller[2 * 10] as number,
    roundsUp: -Math.min(...course),
  }
}

test.each(soundPlans)(
  '$setup.id: as a gust sets in the control line draws the tiller to windward',
  ({ boat, setup }) => {
    expect(inGust({ boat, setup }, 'sheet-to-tiller').tillerAtOnce).toBeGreaterThan(0.02)
  },
)

const reaching = soundPlans.filter(({ setup }) => {
  const asked = Math.abs(setup.conditions.trueWindAngleDeg)
  return asked >= 70 && asked <= 140
})

describe('reaching, it holds the tiller there and she rounds up less than lashed', () => {
  test('is tried on two boats at least', () => {
    expect(new Set(reaching.map(({ boat }) => boat.id)).size).toBeGreaterThan(1)
  })

  test.each(reaching)('$setup.id', ({ boat, setup }) => {
    const rigged = inGust({ boat, setup }, 'sheet-to-tiller')
    expect(rigged.tillerAtHeight).toBeGreaterThan(0.5)
    const lashed = inGust({ boat, setup }, 'lashed')
    expect(lashed.roundsUp).toBeGreaterThan(0.5)
    expect(rigged.roundsUp).toBeLessThan(0.75 * lashed.roundsUp)
  })
})
