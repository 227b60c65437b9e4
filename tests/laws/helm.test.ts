// Common practice, no source.
import { RUDDER, RUDDER_RATE } from 'sim/boat/state'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE } from 'sim/constants'
import { describe, expect, test } from 'vitest'
import { boatCalled, calm, planWith } from '../demo-plans'
import { afloat } from './afloat'

const boats = ['long-keel-28', 'fin-skeg-31', 'lifting-keel-22', 'ketch-38']

describe.each(boats)('%s', (id) => {
  const boat = boatCalled(id)

  test.each([60, -60, 120, -120])(
    'at %d degrees the tiller to windward bears her away, to leeward heads her up',
    (asked) => {
      const out = Math.abs(asked) / 2 - 8
      const plan = planWith(boat, {
        trim: { main: { sheetAngleDeg: out }, genoa: { sheetAngleDeg: out } },
        conditions: { ...calm, trueWindSpeedKn: 12, trueWindAngleDeg: asked },
      })
      const turned = (degrees: number) => {
        const { vessel, y, sail, course } = afloat(plan, 'lashed')
        const before = course()
        // The tiller goes the other way from the blade; windward is the side of the tack.
        y[RUDDER] = (y[RUDDER] as number) - vessel.tack * degrees * DEGREE
        sail(6)
        return course() - before
      }
      expect(turned(0)).toBeCloseTo(0, 3)
      expect(turned(8)).toBeGreaterThan(2)
      expect(turned(-8)).toBeLessThan(-2)
      // More tiller turns her further.
      expect(turned(14)).toBeGreaterThan(turned(8))
    },
  )
})

describe.each(['long-keel-28', 'lifting-keel-22'])('lead of the line to the tiller of %s', (id) => {
  const boat = boatCalled(id)
  const plan = planWith(boat, {
    trim: { main: { sheetAngleDeg: 30 } },
    line: { pull: 'tail', tillerRadius: 0.5 },
    conditions: { ...calm, trueWindSpeedKn: 14, trueWindAngleDeg: 90 },
  })

  /** Moment on the tiller to windward over the line's pull, m, with the last lead `off` degrees from square. */
  function lever(off: number): number {
    const { line } = vesselOf(plan)
    const rigged = afloat(plan, 'sheet-to-tiller', {
      vessel: {
        line: {
          ...line,
          exponent: 0,
          lastX: line.tillerRadius + 0.8 * Math.sin(off * DEGREE),
          lastY: 0.8 * Math.cos(off * DEGREE),
          lastZ: line.tillerZ,
          elastic: { ...line.elastic, area: 0 },
        },
      },
    })
    const cast = afloat(plan, 'free')
    const [withLine, without] = [rigged, cast].map(({ system, y, vessel }) => {
      const rate = new Float64Array(system.size)
      y[RUDDER] = 0
      system.derivative(0, y, rate)
      // The tiller goes the other way from the blade.
      return -(rate[RUDDER_RATE] as number) * vessel.rudder.inertia
    }) as [number, number]
    const pull = rigged.system.observed.lineTension
    expect(pull).toBeGreaterThan(5)
    return (withLine - without) / pull
  }

  test('square is best, 30 degrees off costs 13 percent, along the tiller does nothing', () => {
    const square = lever(0)
    expect(square).toBeCloseTo(0.5, 6)
    expect(lever(30) / square).toBeCloseTo(Math.cos(30 * DEGREE), 6)
    expect(lever(-30) / square).toBeCloseTo(Math.cos(30 * DEGREE), 6)
    expect(1 - lever(30) / square).toBeCloseTo(0.134, 3)
    expect(lever(90)).toBeCloseTo(0, 6)
    for (const off of [-60, -15, 15, 60]) expect(lever(off)).toBeLessThan(square)
  })
})
