import { runHolds, runTrial } from 'sim/trial/run'
import type { TrialRequest, TrialResult } from 'sim/trial/types'
import { describe, expect, test } from 'vitest'
import { demoPlans } from '../demo-plans'

const base = (index: number): TrialRequest => {
  const plan = demoPlans[index]
  if (!plan) throw new Error('no demo plan')
  return {
    plan,
    conditions: plan.setup.conditions,
    events: [{ atS: 60, kind: 'gust', strengthKn: 4, durationS: 8 }],
    helm: 'sheet-to-tiller',
    solver: 'fixed-step',
    durationS: 180,
    outputIntervalS: 1,
  }
}

/** Each double as its bits, so that not even a sign of zero may differ. */
function bits(result: TrialResult): string {
  return [result.series, result.boomDeg, result.drawing]
    .flatMap((table) => Object.values(table))
    .map((column) =>
      Buffer.from(column.buffer, column.byteOffset, column.byteLength).toString('hex'),
    )
    .join()
}

describe('the same request', () => {
  test('gives the same run, bit for bit', () => {
    for (const index of demoPlans.keys()) {
      const there = runTrial(base(index))
      const again = runTrial(structuredClone(base(index)))
      expect(bits(again)).toBe(bits(there))
      expect(again.metrics).toEqual(there.metrics)
      expect(again.verdict).toEqual(there.verdict)
      expect(again.happenings).toEqual(there.happenings)
    }
  })

  test('gives the same run whatever was computed in between', () => {
    const there = runTrial(base(0))
    runTrial({ ...base(1), helm: 'free' })
    expect(bits(runTrial(base(0)))).toBe(bits(there))
  })

  test('is left as it was', () => {
    const request = base(0)
    const before = JSON.stringify(request)
    runTrial(request)
    expect(JSON.stringify(request)).toBe(before)
  })

  test('gives another run under another seed', () => {
    const request = base(0)
    const other = { ...request, conditions: { ...request.conditions, seed: 77 } }
    expect(bits(runTrial(other))).not.toBe(bits(runTrial(request)))
  })
})

test('how often a run is written changes neither its verdict nor its figures nor its rows', () => {
  for (const index of demoPlans.keys()) {
    const often = runTrial({ ...base(index), outputIntervalS: 0.25 })
    const seldom = runTrial({ ...base(index), outputIntervalS: 5 })
    expect(seldom.metrics).toEqual(often.metrics)
    expect(seldom.verdict).toEqual(often.verdict)
    expect(seldom.happenings).toEqual(often.happenings)
    const { timeS, headingDeg } = seldom.series
    for (let i = 0; i < timeS.length - 1; i++) {
      const row = Math.round((timeS[i] as number) / 0.25)
      expect(often.series.timeS[row]).toBeCloseTo(timeS[i] as number, 9)
      expect(often.series.headingDeg[row]).toBe(headingDeg[i])
    }
  }
})

test('a run without traces is judged like the one with them', () => {
  for (const index of demoPlans.keys()) {
    const request = { ...base(index), durationS: 240 }
    const full = runTrial(request).metrics
    const quick = runHolds(request)
    expect(quick.holds).toBe(full.holds)
    expect(quick.lastedS).toBe(full.lastedS)
    if (full.lastedS >= request.durationS) expect(quick).toEqual(full)
  }
})
