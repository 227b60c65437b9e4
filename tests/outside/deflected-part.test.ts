import { controlLineOf } from 'sim/boat/control-line'
import { createLineSolver } from 'sim/boat/line-pull'
import { vesselOf } from 'sim/boat/vessel'
import { DEGREE } from 'sim/constants'
import { pullOverTension } from 'sim/steering/deflected-part'
import { describe, expect, test } from 'vitest'
import { plainPlan } from './bare-vessel'

/** Pull square to a level part, held end behind and live end ahead of a hitch that is pulled out by d. */
const square = (held: number, live: number, d: number) =>
  pullOverTension(-held, -d, 0, live, -d, 0, 0, 1, 0)

describe('pulling a taut line out of straight', () => {
  // F = 2 T sin theta (computed).
  test.each([
    [500, 10, 173.648],
    [1000, 15, 517.638],
  ])('%d N at %d degrees', (tension, degrees, pull) => {
    expect(tension * square(1, 1, Math.tan(degrees * DEGREE))).toBeCloseTo(pull, 3)
  })

  // Mid-span, span and deflection in m (computed).
  test.each([
    [1, 0.05, 500, 99.504],
    [1.5, 0.2, 800, 412.26],
  ])('middle of %d m, out by %d m, %d N', (span, out, tension, pull) => {
    expect(tension * square(span / 2, span / 2, out)).toBeCloseTo(pull, 3)
  })

  test('off the middle, within half a percent of a line that runs through the hitch', () => {
    // .6 and .9 m, out by .1 m, 500 N: 137.415 N with the same tension on both sides (computed). A hitch is made fast, so the
    // held side carries what balances the live one along the part: a little more.
    const pull = 500 * square(0.6, 0.9, 0.1)
    expect(Math.abs(pull / 137.415 - 1)).toBeLessThan(0.005)
    const liveCos = 0.9 / Math.hypot(0.9, 0.1)
    expect(pull).toBeCloseTo(500 * liveCos * (0.1 / 0.6 + 0.1 / 0.9), 9)
  })

  test('forces at the hitch are in balance whatever the direction of the pull', () => {
    // Live tension 1 along b, pull F along e: what is left must lie along the held side a.
    const a = [-0.5, -0.1, -0.2] as const
    const b = [0.8, -0.15, 0.4] as const
    const length = Math.hypot(0.3, 0.9, 0.1)
    const e = [0.3 / length, 0.9 / length, 0.1 / length] as const
    // Bring the pull into the plane of the part, where the equilibrium is meant.
    const normal = cross(a, b)
    const out = dot(e, normal) / dot(normal, normal)
    const inPlane = e.map((value, i) => value - out * (normal[i] as number))
    const size = Math.hypot(...inPlane)
    const [ex, ey, ez] = inPlane.map((value) => value / size) as [number, number, number]
    const pull = pullOverTension(...a, ...b, ex, ey, ez)
    const live = Math.hypot(...b)
    const rest = [ex, ey, ez].map((value, i) => -(pull * value) - (b[i] as number) / live)
    expect(Math.hypot(...cross(rest as never, a))).toBeCloseTo(0, 9)
  })
})

type Triple = readonly [number, number, number]
function cross(a: Triple, b: Triple): Triple {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]]
}
function dot(a: Triple, b: Triple): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
}

describe('sheet taken by the deflected part', () => {
  // The path is longer than the straight part by (computed): mid-span 1 m, .05 m: .0049876; 1.5 m, .2 m: .052417;
  // .6 and .9 m, .1 m: .013815. Off the middle a hitch that is made fast takes a little more.
  test.each([
    [0.5, 0.5, 0.05, 0.0049876],
    [0.75, 0.75, 0.2, 0.052417],
    [0.6, 0.9, 0.1, 0.013815],
  ])('%d and %d m, out by %d m, within a hundredth of the longer path', (held, live, out, more) => {
    const [sail] = vesselOf(plainPlan).sails
    const span = held + live
    // A part that stands upright on the centreline, its first lead square off to windward at the hitch.
    const line = {
      ...controlLineOf(plainPlan, sail, 1),
      tail: false,
      luffX: 1,
      reach: 1,
      blockX: 0,
      blockY: 0,
      blockZ: 1,
      boomZ: 1 + span,
      boomAtRest: 0,
      hitchShare: held / span,
      firstX: 0,
      firstY: 0.3,
      firstZ: 1 + held,
      takeUp: out,
      hitchToLeadAtRest: 0.3,
      parts: 1,
      stiffness: 1e12,
      exponent: 0,
      leadToTillerAtRest: Math.hypot(0.5, 1),
      lastX: 0.5,
      lastY: 1,
      lastZ: 1,
      tillerRadius: 1,
      tillerZ: 1,
    }
    const solver = createLineSolver(line)
    expect(solver.easedLength(0, 0, 500)).toBeCloseTo(0, 9)
    expect(solver.tension(0, 0, 500, 0)).toBeCloseTo(500 * square(held, live, out), 4)
    expect(solver.hitchOut).toBeCloseTo(out, 6)
    // With the tiller gone over to the lead the line is slack, and the sheet has all of it back.
    const back = solver.easedLength(0, -0.6, 500)
    expect(Math.abs(back / more - 1)).toBeLessThan(0.01)
  })

  test('is worth the work that the pull does', () => {
    // Virtual work: F d(out) = T d(sheet), whatever the direction of the pull.
    const [sail] = vesselOf(plainPlan).sails
    const rigged = {
      ...controlLineOf(plainPlan, sail, 1),
      parts: 1,
      stiffness: 1e12,
      exponent: 0,
      leadToTillerAtRest: Math.hypot(0.5, 1),
      lastX: 0.5,
      lastY: 1,
      lastZ: 1,
      tillerRadius: 1,
      tillerZ: 1,
    }
    const boom = sail?.heldAt ?? 0
    const at = (takeUp: number) => {
      const solver = createLineSolver({ ...rigged, takeUp })
      const pull = solver.tension(boom, 0, 300, 0)
      // With the tiller far over the line is slack, and the sheet has back what the hitch took.
      return { pull, sheet: solver.easedLength(boom, -0.9, 300) }
    }
    for (const takeUp of [0.1, 0.25, 0.4]) {
      const before = at(takeUp - 0.02)
      const after = at(takeUp + 0.02)
      const work = at(takeUp).pull * 0.04
      expect((300 * (after.sheet - before.sheet)) / work).toBeCloseTo(1, 2)
    }
  })
})

describe('the line from a hitch to the tiller', () => {
  const [sail] = vesselOf(plainPlan).sails
  const rigged = controlLineOf(plainPlan, sail, 1)
  const atRest = sail?.heldAt ?? 0

  test('stretches by its tension over its stiffness, which the hitch gives up', () => {
    for (const stiffness of [3e3, 2e4, 2e5]) {
      for (const takeUp of [0.05, 0.2, 0.4]) {
        for (const sheet of [20, 150, 900]) {
          const solver = createLineSolver({ ...rigged, stiffness, takeUp })
          const tension = solver.tension(atRest, 0, sheet, 0)
          expect(tension).toBeGreaterThan(0)
          expect(takeUp - solver.hitchOut).toBeCloseTo(tension / stiffness, 6)
        }
      }
    }
  })

  test('pulls harder the more it is taken up and the harder the sheet pulls', () => {
    const pull = (takeUp: number, sheet: number) =>
      createLineSolver({ ...rigged, takeUp }).tension(atRest, 0, sheet, 0)
    for (let takeUp = 0.05; takeUp < 0.5; takeUp += 0.05) {
      expect(pull(takeUp + 0.05, 200)).toBeGreaterThan(pull(takeUp, 200))
      expect(pull(takeUp, 210)).toBeGreaterThan(pull(takeUp, 200))
    }
  })

  test('goes slack when it is eased, and never pushes', () => {
    const solver = createLineSolver({ ...rigged, takeUp: -0.1 })
    expect(solver.tension(atRest, 0, 300, 0)).toBe(0)
    expect(solver.hitchOut).toBe(0)
  })

  test('loses in its leads what friction takes, in the direction it runs', () => {
    // Eytelwein, e^(mu theta) for each lead.
    const tail = createLineSolver({ ...rigged, tail: true, exponent: 0.12 })
    expect(tail.tension(atRest, 0, 200, 1)).toBeCloseTo(200 * Math.exp(-0.12), 9)
    expect(tail.tension(atRest, 0, 200, 0)).toBeCloseTo(200, 9)
    expect(tail.tension(atRest, 0, 200, -1)).toBeCloseTo(200 * Math.exp(0.12), 9)
  })
})
