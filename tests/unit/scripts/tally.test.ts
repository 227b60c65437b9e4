import { expect, test } from 'vitest'
import { tallyOf } from '../../../scripts/lib/checks.mjs'

const file = (status: string, ...tests: string[]) => ({
  status,
  assertionResults: tests.map((each) => ({ status: each })),
})
const report = (passed: number, failed: number, ...testResults: ReturnType<typeof file>[]) => ({
  numPassedTests: passed,
  numFailedTests: failed,
  testResults,
})

test('each test counts once', () => {
  const files = [file('passed', 'passed', 'passed'), file('failed', 'failed', 'passed')]
  expect(tallyOf(report(3, 1, ...files), false)).toEqual({ passed: 3, failed: 1 })
})

test('a file that cannot be read counts as one failure', () => {
  expect(tallyOf(report(2, 0, file('passed', 'passed', 'passed'), file('failed')), false)).toEqual({
    passed: 2,
    failed: 1,
  })
})

test('a file whose tests pass and whose clean-up fails counts as one failure', () => {
  expect(tallyOf(report(1, 0, file('failed', 'passed')), false)).toEqual({ passed: 1, failed: 1 })
})

test('an error outside any test is a failure, as is a run that wrote no report', () => {
  expect(tallyOf(report(2, 0, file('passed', 'passed', 'passed')), false).failed).toBe(1)
  expect(tallyOf(null, false)).toEqual({ passed: 0, failed: 1 })
})

test('a run in which all is well has no failure', () => {
  expect(tallyOf(report(1, 0, file('passed', 'passed')), true)).toEqual({ passed: 1, failed: 0 })
})
