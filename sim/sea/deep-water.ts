import { GRAVITY } from '../constants'
import { cos } from '../elementary'

/** Deep-water dispersion k = omega^2/g, rad/m; Airy theory. */
export function waveNumber(omega: number): number {
  return (omega * omega) / GRAVITY
}

/** Wave length, m, from the period, s. */
export function waveLength(period: number): number {
  return (GRAVITY * period * period) / (2 * Math.PI)
}

/** Phase speed, m/s, from the period, s. */
export function phaseSpeed(period: number): number {
  return (GRAVITY * period) / (2 * Math.PI)
}

/**
 * Frequency at which a boat meets a wave: omega_e = |omega - k U cos mu|.
 *
 * @param omega rad/s
 * @param speed U, m/s
 * @param waveHeading mu, rad, 0 in a following sea
 */
export function encounterFrequency(omega: number, speed: number, waveHeading: number): number {
  return Math.abs(omega - waveNumber(omega) * speed * cos(waveHeading))
}
