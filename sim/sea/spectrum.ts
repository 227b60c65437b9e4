import { exp } from '../elementary'

/**
 * Bretschneider (two-parameter Pierson-Moskowitz) spectrum, m^2 s; its integral is Hs^2/16.
 *
 * @param omega rad/s
 * @param height significant wave height, m
 * @param peakPeriod s
 * @source DNV-RP-C205, section 3.5.5
 */
export function bretschneider(omega: number, height: number, peakPeriod: number): number {
  const peak = (2 * Math.PI) / peakPeriod
  const over = peak / omega
  const ratio = over * over * over * over
  return ((5 / 16) * height * height * ratio * exp(-1.25 * ratio)) / omega
}
