export type Derivative = (t: number, y: Float64Array, dy: Float64Array) => void

/**
 * Classical fourth-order Runge-Kutta with a fixed step; the returned function advances y in place and allocates nothing.
 *
 * @param size length of the state
 * @source Kutta 1901; Hairer, Norsett & Wanner, Solving Ordinary Differential Equations I, section II.1
 */
export function rungeKutta(
  size: number,
  derivative: Derivative,
): (t: number, y: Float64Array, h: number) => void {
  const k1 = new Float64Array(size)
  const k2 = new Float64Array(size)
  const k3 = new Float64Array(size)
  const k4 = new Float64Array(size)
  const mid = new Float64Array(size)
  return (t, y, h) => {
    const half = 0.5 * h
    derivative(t, y, k1)
    for (let i = 0; i < size; i++) mid[i] = (y[i] as number) + half * (k1[i] as number)
    derivative(t + half, mid, k2)
    for (let i = 0; i < size; i++) mid[i] = (y[i] as number) + half * (k2[i] as number)
    derivative(t + half, mid, k3)
    for (let i = 0; i < size; i++) mid[i] = (y[i] as number) + h * (k3[i] as number)
    derivative(t + h, mid, k4)
    const sixth = h / 6
    for (let i = 0; i < size; i++) {
      y[i] =
        (y[i] as number) +
        sixth *
          ((k1[i] as number) + 2 * ((k2[i] as number) + (k3[i] as number)) + (k4[i] as number))
    }
  }
}
