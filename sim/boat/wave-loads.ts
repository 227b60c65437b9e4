import type { Seaway } from '../sea/seaway'
import type { Vessel } from './vessel'

export interface WaveLoads {
  /** Forces and moment of the undisturbed and diffracted wave on the canoe body, N and N m. */
  surge: number
  sway: number
  yaw: number
  /** Slope of the surface across the boat, rad, positive rising to starboard. */
  slope: number
  /** Water velocity of the waves at hull and keel, body frame, m/s. */
  orbitalX: number
  orbitalY: number
  /** The same across the rudder. */
  rudderOrbitalY: number
  /** Surface height at the boat, m. */
  surface: number
  update(north: number, east: number, cosPsi: number, sinPsi: number, t: number, gain: number): void
}

/**
 * Wave loads by strips over the waterline length, whose sections follow a parabola and vanish at the ends: each strip is
 * pushed by the water's own acceleration times the mass and added mass it stands for (Froude-Krylov with long-wave
 * diffraction), so that
 *
 *   Y = (m + m22) a sin(mu) E(q) sin(theta),   N = (m + m22) a sin(mu) (L/2) O(q) cos(theta)
 *   E = 3 (sin q - q cos q)/q^3,   O = -dE/dq
 *
 * with a the wave's acceleration amplitude at the body's depth and q = (k L/2) cos(mu).
 *
 * @source strip theory, Salvesen, Tuck & Faltinsen 1970, in its long-wave form
 */
export function createWaveLoads(sea: Seaway, vessel: Vessel): WaveLoads {
  const { count, k, omega, cosDirection, sinDirection, phase } = sea
  const halfLength = vessel.length / 2
  const velocity = new Float64Array(count)
  const rudderVelocity = new Float64Array(count)
  const acceleration = new Float64Array(count)
  const slope = new Float64Array(count)
  for (let i = 0; i < count; i++) {
    const ki = k[i] as number
    const wi = omega[i] as number
    const ai = sea.amplitude[i] as number
    velocity[i] = ai * wi * Math.exp(-ki * vessel.keel.depth)
    rudderVelocity[i] = ai * wi * Math.exp(-ki * vessel.rudder.depth)
    acceleration[i] = ai * wi * wi * Math.exp((-ki * vessel.draught) / 2)
    slope[i] = ai * ki * Math.exp((-ki * vessel.draught) / 2)
  }
  const lateralMass = vessel.swayMass
  const loads: WaveLoads = {
    surge: 0,
    sway: 0,
    yaw: 0,
    slope: 0,
    orbitalX: 0,
    orbitalY: 0,
    rudderOrbitalY: 0,
    surface: 0,
    update(north, east, cosPsi, sinPsi, t, gain) {
      let surge = 0
      let sway = 0
      let yaw = 0
      let tilt = 0
      let ox = 0
      let oy = 0
      let roy = 0
      let surface = 0
      for (let i = 0; i < count; i++) {
        const ki = k[i] as number
        const cd = cosDirection[i] as number
        const sd = sinDirection[i] as number
        const theta =
          ki * (north * cd + east * sd) - (omega[i] as number) * t + (phase[i] as number)
        const c = Math.cos(theta)
        const s = Math.sin(theta)
        const cosMu = cd * cosPsi + sd * sinPsi
        const sinMu = sd * cosPsi - cd * sinPsi
        const q = ki * halfLength * cosMu
        const q2 = q * q
        let even = 1 - q2 / 10
        let odd = q / 5 - (q * q2) / 70
        if (q2 > 0.04) {
          const sq = Math.sin(q)
          const bow = sq - q * Math.cos(q)
          even = (3 * bow) / (q * q2)
          odd = (3 * (3 * bow - q2 * sq)) / (q2 * q2)
        }
        const a = acceleration[i] as number
        surge += a * cosMu * even * s
        sway += a * sinMu * even * s
        yaw += a * sinMu * odd * c
        tilt -= (slope[i] as number) * sinMu * even * s
        const w = (velocity[i] as number) * c
        ox += w * cosMu
        oy += w * sinMu
        const shift = ki * vessel.rudder.x * cosMu
        roy += (rudderVelocity[i] as number) * sinMu * Math.cos(theta + shift)
        surface += (sea.amplitude[i] as number) * c
      }
      loads.surge = gain * vessel.mass * surge
      loads.sway = gain * lateralMass * sway
      loads.yaw = gain * lateralMass * halfLength * yaw
      loads.slope = gain * tilt
      loads.orbitalX = gain * ox
      loads.orbitalY = gain * oy
      loads.rudderOrbitalY = gain * roy
      loads.surface = gain * surface
    },
  }
  return loads
}
