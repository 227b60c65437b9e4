import { cos, power, sin } from '../elementary'
import { uniformFrom } from '../random'
import { waveNumber } from './deep-water'
import { bretschneider } from './spectrum'

/** Long-crested components that together make a short-crested sea. */
export interface Seaway {
  count: number
  /** Amplitude, m. */
  amplitude: Float64Array
  /** Frequency, rad/s. */
  omega: Float64Array
  /** Wave number, rad/m. */
  k: Float64Array
  /** Direction the component runs to, as cosine north and sine east. */
  cosDirection: Float64Array
  sinDirection: Float64Array
  phase: Float64Array
}

const COMPONENTS = 20
/** Band of the spectrum kept, over the peak frequency: 98.5 % of a Bretschneider sea's energy lie in it. */
const LOWEST = 0.6
const HIGHEST = 3

/**
 * A seaway with Bretschneider energy and cos^2 spreading about its mean direction.
 * Bands of equal width on a logarithmic scale, one frequency and one direction drawn in each, so that
 * the record does not repeat; scaled so that its variance is Hs^2/16 whatever the seed.
 *
 * @param seed whole number
 * @param height significant wave height, m
 * @param peakPeriod s
 * @param from direction the sea comes from, rad clockwise from north
 * @param mirror +1, or -1 for the mirror image about north
 * @source spreading: cos^2, ITTC recommended procedure 7.5-02-07-01.1, from memory
 */
export function seaway(
  seed: number,
  height: number,
  peakPeriod: number,
  from: number,
  mirror: 1 | -1 = 1,
): Seaway {
  const uniform = uniformFrom(seed)
  const count = height > 0 ? COMPONENTS : 0
  const sea: Seaway = {
    count,
    amplitude: new Float64Array(count),
    omega: new Float64Array(count),
    k: new Float64Array(count),
    cosDirection: new Float64Array(count),
    sinDirection: new Float64Array(count),
    phase: new Float64Array(count),
  }
  const peak = (2 * Math.PI) / peakPeriod
  const ratio = power(HIGHEST / LOWEST, 1 / Math.max(count, 1))
  let variance = 0
  for (let i = 0; i < count; i++) {
    const low = peak * LOWEST * power(ratio, i)
    const width = low * (ratio - 1)
    const omega = low + width * uniform()
    const energy = bretschneider(omega, height, peakPeriod) * width
    const spread = inverseCosineSquared(uniform())
    const away = from + mirror * spread
    sea.omega[i] = omega
    sea.k[i] = waveNumber(omega)
    sea.amplitude[i] = Math.sqrt(2 * energy)
    sea.cosDirection[i] = -cos(away)
    sea.sinDirection[i] = -sin(away)
    sea.phase[i] = 2 * Math.PI * uniform()
    variance += energy
  }
  const gain = variance > 0 ? height / 4 / Math.sqrt(variance) : 0
  for (let i = 0; i < count; i++) sea.amplitude[i] = (sea.amplitude[i] as number) * gain
  return sea
}

/** Angle, rad, below which a share of the cos^2 distribution over +-90 degrees lies; Newton's method. */
function inverseCosineSquared(share: number): number {
  let angle = (share - 0.5) * 2
  for (let i = 0; i < 12; i++) {
    const below = 0.5 + (angle + sin(angle) * cos(angle)) / Math.PI
    const density = (2 / Math.PI) * Math.max(cos(angle) * cos(angle), 0.02)
    angle -= (below - share) / density
    if (angle > 1.55) angle = 1.55
    if (angle < -1.55) angle = -1.55
  }
  return angle
}
