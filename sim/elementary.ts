/**
 * Elementary functions that give the same bits on every engine. JavaScript leaves the last digits of Math.sin and its
 * kin to the engine, and a boat near the edge of holding turns a last digit into another run; these use only
 * operations that IEEE 754 fixes (+ - * / and the square root). Each is within four units in the last place of the
 * true value over the arguments a run meets.
 */

const TWO_OVER_PI = 2 / Math.PI
/** pi/2 in three pieces, the first two short enough that their products with a whole number are exact. */
const HALF_PI_1 = 1.5707963705062866
const HALF_PI_2 = -4.371138828673793e-8
const HALF_PI_3 = -1.7151244994428829e-15
const HALF_PI = Math.PI / 2
const QUARTER_PI = Math.PI / 4
const TAN_EIGHTH_PI = Math.SQRT2 - 1

/** Sine on [-pi/4, pi/4] by its series. */
function sineKernel(x: number): number {
  const q = x * x
  const tail =
    -1 / 6 +
    q *
      (1 / 120 +
        q *
          (-1 / 5040 +
            q *
              (1 / 362880 + q * (-1 / 39916800 + q * (1 / 6227020800 - q * (1 / 1307674368000))))))
  return x + x * q * tail
}

/** Cosine on [-pi/4, pi/4] by its series. */
function cosineKernel(x: number): number {
  const q = x * x
  const tail =
    1 / 24 +
    q *
      (-1 / 720 +
        q *
          (1 / 40320 +
            q *
              (-1 / 3628800 +
                q * (1 / 479001600 + q * (-1 / 87178291200 + q * (1 / 20922789888000))))))
  return 1 - 0.5 * q + q * q * tail
}

/** @param x rad; NaN beyond 1e8, where the reduction would lose its digits */
export function sin(x: number): number {
  const a = x < 0 ? -x : x
  if (!(a < 1e8)) return Number.NaN
  const k = Math.floor(a * TWO_OVER_PI + 0.5)
  const r = a - k * HALF_PI_1 - k * HALF_PI_2 - k * HALF_PI_3
  const quadrant = k & 3
  const value = quadrant === 0 || quadrant === 2 ? sineKernel(r) : cosineKernel(r)
  const up = quadrant < 2
  return x < 0 === up ? -value : value
}

/** @param x rad; NaN beyond 1e8 */
export function cos(x: number): number {
  const a = x < 0 ? -x : x
  if (!(a < 1e8)) return Number.NaN
  const k = Math.floor(a * TWO_OVER_PI + 0.5)
  const r = a - k * HALF_PI_1 - k * HALF_PI_2 - k * HALF_PI_3
  const quadrant = k & 3
  if (quadrant === 0) return cosineKernel(r)
  if (quadrant === 1) return -sineKernel(r)
  return quadrant === 2 ? -cosineKernel(r) : sineKernel(r)
}

/** Arc tangent on [0, 1]: turned to within tan(pi/8), halved once, then the series. */
function arcKernel(x: number): number {
  const turned = x > TAN_EIGHTH_PI
  const t = turned ? (x - 1) / (x + 1) : x
  const h = t / (1 + Math.sqrt(1 + t * t))
  const q = h * h
  const series =
    -1 / 3 +
    q *
      (1 / 5 +
        q *
          (-1 / 7 +
            q *
              (1 / 9 +
                q *
                  (-1 / 11 +
                    q * (1 / 13 + q * (-1 / 15 + q * (1 / 17 + q * (-1 / 19 + q * (1 / 21)))))))))
  const angle = 2 * (h + h * q * series)
  return turned ? QUARTER_PI + angle : angle
}

/** Angle of the point (x, y) from the x axis, in (-pi, pi]; 0 at the origin. */
export function atan2(y: number, x: number): number {
  const ax = x < 0 ? -x : x
  const ay = y < 0 ? -y : y
  if (ax === 0 && ay === 0) return 0
  const steep = ay > ax
  const acute = arcKernel(steep ? ax / ay : ay / ax)
  const first = steep ? HALF_PI - acute : acute
  const angle = x < 0 ? Math.PI - first : first
  return y < 0 ? -angle : angle
}

/** Length of a vector of two or three components. */
export function hypot(x: number, y: number, z = 0): number {
  return Math.sqrt(x * x + y * y + z * z)
}

const LN2_1 = 0.6931471824645996
const LN2_2 = -1.904654299957768e-9
const INVERSE_LN2 = Math.LOG2E

/** e^r for |r| up to ln 2 / 2 by its series. */
function exponentialKernel(r: number): number {
  return (
    1 +
    r *
      (1 +
        r *
          (1 / 2 +
            r *
              (1 / 6 +
                r *
                  (1 / 24 +
                    r *
                      (1 / 120 +
                        r *
                          (1 / 720 +
                            r *
                              (1 / 5040 +
                                r *
                                  (1 / 40320 +
                                    r *
                                      (1 / 362880 +
                                        r *
                                          (1 / 3628800 +
                                            r *
                                              (1 / 39916800 +
                                                r *
                                                  (1 / 479001600 +
                                                    r *
                                                      (1 / 6227020800 +
                                                        r * (1 / 87178291200))))))))))))))
  )
}

/** e^x for |x| up to 700; beyond it 0 or Infinity. */
export function exp(x: number): number {
  if (x > 700) return Number.POSITIVE_INFINITY
  if (x < -700) return 0
  const k = Math.floor(x * INVERSE_LN2 + 0.5)
  const r = x - k * LN2_1 - k * LN2_2
  const sum = exponentialKernel(r)
  return scaled(sum, k)
}

/** x 2^k by doublings and halvings, which are exact. */
function scaled(x: number, k: number): number {
  let value = x
  for (let i = k; i > 0; i--) value *= 2
  for (let i = k; i < 0; i++) value *= 0.5
  return value
}

/** Natural logarithm of a positive number; NaN otherwise. */
export function log(x: number): number {
  if (!(x > 0) || x === Number.POSITIVE_INFINITY) return Number.NaN
  let m = x
  let k = 0
  while (m > Math.SQRT2) {
    m *= 0.5
    k++
  }
  while (m < Math.SQRT1_2) {
    m *= 2
    k--
  }
  const z = (m - 1) / (m + 1)
  const q = z * z
  let series = 0
  for (let i = 25; i >= 1; i -= 2) series = 1 / i + q * series
  return 2 * z * series + k * LN2_2 + k * LN2_1
}

/** x^y of a positive x. */
export function power(x: number, y: number): number {
  return exp(y * log(x))
}
