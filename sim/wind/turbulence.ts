import { cos, power, sin } from '../elementary'
import { uniformFrom } from '../random'

/** Ratio of the lateral to the longitudinal standard deviation; IEC 61400-1 ed. 3, table B.1 (from memory). */
const LATERAL_RATIO = 0.8
/** Integral scales over the turbulence scale parameter, longitudinal and lateral; same table. */
const LONGITUDINAL_SCALE = 8.1
const LATERAL_SCALE = 2.7

/** Sampling interval of a turbulence record, s. */
export const TURBULENCE_STEP = 0.25
const COMPONENTS = 72
const LOWEST_FREQUENCY = 1 / 600
const HIGHEST_FREQUENCY = 1

/** IEC 61400-1 ed. 3: turbulence scale parameter, m, at height z below 60 m. */
export function turbulenceScale(z: number): number {
  return 0.7 * Math.min(z, 60)
}

/**
 * Kaimal spectrum, one-sided, m^2/s^2 per Hz; its integral over frequency is sigma^2.
 *
 * @param frequency Hz
 * @param speed mean wind, m/s
 * @param sigma standard deviation of the component, m/s
 * @param scale integral scale of the component, m
 * @source IEC 61400-1 ed. 3, eq. B.14
 */
export function kaimal(frequency: number, speed: number, sigma: number, scale: number): number {
  const time = scale / speed
  return (4 * sigma * sigma * time) / power(1 + 6 * frequency * time, 5 / 3)
}

/** One record, sampled. */
export interface Turbulence {
  /** Departures from the mean along and across it, m/s, every TURBULENCE_STEP seconds from t = -TURBULENCE_STEP. */
  along: Float64Array
  across: Float64Array
}

/**
 * A record of turbulence at 10 m: a sum of cosines with the Kaimal spectrum's energy between one
 * cycle in ten minutes and one a second, scaled so that a ten-minute record has the asked intensity.
 * The lateral component has its own spectrum and phases: it is what turns the wind's direction.
 *
 * @param seed whole number
 * @param speed mean wind, m/s
 * @param intensity longitudinal standard deviation over the mean
 * @param duration s
 * @param mirror +1, or -1 for the mirror image about the mean direction
 */
export function turbulenceRecord(
  seed: number,
  speed: number,
  intensity: number,
  duration: number,
  mirror: 1 | -1 = 1,
): Turbulence {
  const uniform = uniformFrom(seed)
  const scale = turbulenceScale(10)
  const sigma = intensity * speed
  const samples = Math.ceil(duration / TURBULENCE_STEP) + 4
  const along = component(uniform, samples, speed, sigma, LONGITUDINAL_SCALE * scale)
  const across = component(uniform, samples, speed, LATERAL_RATIO * sigma, LATERAL_SCALE * scale)
  if (mirror < 0) for (let i = 0; i < samples; i++) across[i] = -(across[i] as number)
  return { along, across }
}

function component(
  uniform: () => number,
  samples: number,
  speed: number,
  sigma: number,
  scale: number,
): Float64Array {
  const record = new Float64Array(samples)
  // Also without any wind, where the spectrum is not defined.
  if (sigma === 0) return record
  const ratio = power(HIGHEST_FREQUENCY / LOWEST_FREQUENCY, 1 / COMPONENTS)
  const amplitudes = new Float64Array(COMPONENTS)
  const frequencies = new Float64Array(COMPONENTS)
  let variance = 0
  for (let i = 0; i < COMPONENTS; i++) {
    const low = LOWEST_FREQUENCY * power(ratio, i)
    const width = low * (ratio - 1)
    // One frequency drawn inside each band keeps the record from repeating.
    const frequency = low + width * uniform()
    const energy = kaimal(frequency, speed, 1, scale) * width
    frequencies[i] = frequency
    amplitudes[i] = Math.sqrt(2 * energy)
    variance += energy
  }
  const gain = variance > 0 ? sigma / Math.sqrt(variance) : 0
  for (let i = 0; i < COMPONENTS; i++) {
    const amplitude = gain * (amplitudes[i] as number)
    const turn = 2 * Math.PI * (frequencies[i] as number) * TURBULENCE_STEP
    const phase = 2 * Math.PI * uniform()
    const cosTurn = cos(turn)
    const sinTurn = sin(turn)
    let re = amplitude * cos(phase)
    let im = amplitude * sin(phase)
    for (let n = 0; n < samples; n++) {
      record[n] = (record[n] as number) + re
      const next = re * cosTurn - im * sinTurn
      im = re * sinTurn + im * cosTurn
      re = next
    }
  }
  return record
}

/** Value of a record at time t, s, by the cubic through its four neighbours (Catmull & Rom 1974). */
export function sampleRecord(record: Float64Array, t: number): number {
  const last = record.length - 3
  let place = t / TURBULENCE_STEP + 1
  if (place < 1) place = 1
  if (place > last) place = last
  const i = Math.floor(place)
  const s = place - i
  const a = record[i - 1] as number
  const b = record[i] as number
  const c = record[i + 1] as number
  const d = record[i + 2] as number
  return b + 0.5 * s * (c - a + s * (2 * a - 5 * b + 4 * c - d + s * (3 * (b - c) + d - a)))
}
