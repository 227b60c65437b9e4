import { expect, test } from 'vitest'
import { differenceOf, isSame, type Traces } from '~/features/sea-trial/difference'

const run = (course: (number | null)[], timeS = course.map((_, n) => n)): Traces => ({
  timeS,
  courseToWindDeg: course,
  tillerDeg: course.map(() => 0),
  controlLineN: course.map((_, n) => 10 * n),
})

test('a run does not differ from itself', () => {
  expect(differenceOf(run([60, 62, 64]), run([60, 62, 64]))).toEqual({
    courseDeg: 0,
    tillerDeg: 0,
    lineN: 0,
    partedAtS: null,
  })
})

test('courses are compared the short way round', () => {
  expect(differenceOf(run([179]), run([-179])).courseDeg).toBe(2)
  expect(differenceOf(run([359.9]), run([0])).courseDeg).toBeCloseTo(0.1)
})

test('what rounding to six decimals leaves between two runs makes no difference, more does', () => {
  expect(isSame(differenceOf(run([60.0000004]), run([60])))).toBe(true)
  expect(isSame(differenceOf(run([60.000002]), run([60])))).toBe(false)
})

test('runs with other output times are compared at the times both have', () => {
  const fine = run([60, 61, 62, 63, 64], [0, 0.5, 1, 1.5, 2])
  const coarse = run([60, 62, 64.5], [0, 1, 2])
  expect(differenceOf(fine, coarse).courseDeg).toBe(0.5)
  expect(differenceOf(coarse, fine).courseDeg).toBe(0.5)
})

test('the moment they part is the first at which they are a degree apart', () => {
  expect(differenceOf(run([60, 60.5, 62, 70]), run([60, 60, 60, 60])).partedAtS).toBe(2)
})
