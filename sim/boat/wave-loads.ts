import { cos, exp, sin } from '../elementary'
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
  rudderOrbitalX: number
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
  const keelAcceleration = new Float64Array(count)
  const slope = new Float64Array(count)
  for (let i = 0; i < count; i++) {
    const ki = k[i] as number
    const wi = omega[i] as number
    const ai = sea.amplitude[i] as number
    velocity[i] = ai * wi * exp(-ki * vessel.keel.depth)
    rudderVelocity[i] = ai * wi * exp(-ki * vessel.rudder.depth)
    acceleration[i] = ai * wi * wi * exp((-ki * vessel.draught) / 2)
    keelAcceleration[i] = ai * wi * wi * exp(-ki * vessel.keel.depth)
    slope[i] = ai * ki * exp((-ki * vessel.draught) / 2)
  }
  // The keel's added mass sits amidships and deep: it is pushed, not turned.
  const hullMass = vessel.swayMass - vessel.keelMass
  const table = hullTable(vessel.rudder.x / halfLength)
  const loads: WaveLoads = {
    surge: 0,
    sway: 0,
    yaw: 0,
    slope: 0,
    orbitalX: 0,
    orbitalY: 0,
    rudderOrbitalX: 0,
    rudderOrbitalY: 0,
    surface: 0,
    update(north, east, cosPsi, sinPsi, t, gain) {
      let surge = 0
      let sway = 0
      let yaw = 0
      let tilt = 0
      let ox = 0
      let oy = 0
      let rox = 0
      let roy = 0
      let surface = 0
      for (let i = 0; i < count; i++) {
        const ki = k[i] as number
        const cd = cosDirection[i] as number
        const sd = sinDirection[i] as number
        const theta =
          ki * (north * cd + east * sd) - (omega[i] as number) * t + (phase[i] as number)
        const turns = theta * TURNS_PER_RADIAN
        const angle = (turns - Math.floor(turns)) * SINE_ROWS
        const sineRow = Math.floor(angle)
        const sineShare = angle - sineRow
        const s = between(SINE, sineRow, sineShare)
        const c = between(SINE, sineRow + SINE_ROWS / 4, sineShare)
        const cosMu = cd * cosPsi + sd * sinPsi
        const sinMu = sd * cosPsi - cd * sinPsi
        // Everything that depends on q alone is read from the table, between its two nearest rows.
        const q = ki * halfLength * cosMu
        const side = q < 0 ? -1 : 1
        const place = Math.min(side * q, LARGEST_Q) * ROWS_PER_Q
        const row = Math.floor(place)
        const share = place - row
        const even = between(table.even, row, share)
        const odd = side * between(table.odd, row, share)
        const cosShift = between(table.cosShift, row, share)
        const sinShift = side * between(table.sinShift, row, share)
        const a = acceleration[i] as number
        surge += a * cosMu * even * s
        sway +=
          (hullMass * a * even + vessel.keelMass * (keelAcceleration[i] as number)) * sinMu * s
        yaw += a * sinMu * odd * c
        tilt -= (slope[i] as number) * sinMu * even * s
        const w = (velocity[i] as number) * c
        ox += w * cosMu
        oy += w * sinMu
        const atRudder = (rudderVelocity[i] as number) * (c * cosShift - s * sinShift)
        rox += atRudder * cosMu
        roy += atRudder * sinMu
        surface += (sea.amplitude[i] as number) * c
      }
      loads.surge = gain * vessel.surgeMass * surge
      loads.sway = gain * sway
      loads.yaw = gain * hullMass * halfLength * yaw
      loads.slope = gain * tilt
      loads.orbitalX = gain * ox
      loads.orbitalY = gain * oy
      loads.rudderOrbitalX = gain * rox
      loads.rudderOrbitalY = gain * roy
      loads.surface = gain * surface
    },
  }
  return loads
}

/** Sine over a turn and a quarter, so that the cosine is read a quarter further on; linear between rows within 3e-7. */
const SINE_ROWS = 4096
const TURNS_PER_RADIAN = 1 / (2 * Math.PI)
const SINE = Float64Array.from({ length: (5 * SINE_ROWS) / 4 + 2 }, (_, i) =>
  sin((2 * Math.PI * i) / SINE_ROWS),
)

/** Largest q kept: beyond it the hull spans many waves and feels next to nothing of them. */
const LARGEST_Q = 24
const ROWS_PER_Q = 64

interface HullTable {
  even: Float64Array
  odd: Float64Array
  /** Phase of the wave at the rudder against that at the centre of gravity. */
  cosShift: Float64Array
  sinShift: Float64Array
}

/** @param rudderShare place of the rudder over half the waterline length, negative aft */
function hullTable(rudderShare: number): HullTable {
  const rows = LARGEST_Q * ROWS_PER_Q + 2
  const table: HullTable = {
    even: new Float64Array(rows),
    odd: new Float64Array(rows),
    cosShift: new Float64Array(rows),
    sinShift: new Float64Array(rows),
  }
  for (let i = 0; i < rows; i++) {
    const q = i / ROWS_PER_Q
    table.even[i] = hullEven(q)
    table.odd[i] = hullOdd(q)
    table.cosShift[i] = cos(rudderShare * q)
    table.sinShift[i] = sin(rudderShare * q)
  }
  return table
}

/** E(q) = 3 (sin q - q cos q)/q^3, by its series near zero. */
export function hullEven(q: number): number {
  if (q < 0.2) return 1 - (q * q) / 10 + (q * q * q * q) / 280
  return (3 * (sin(q) - q * cos(q))) / (q * q * q)
}

/** O(q) = -dE/dq, by its series near zero. */
export function hullOdd(q: number): number {
  if (q < 0.2) return q / 5 - (q * q * q) / 70
  const bow = sin(q) - q * cos(q)
  return (3 * (3 * bow - q * q * sin(q))) / (q * q * q * q)
}

function between(column: Float64Array, row: number, share: number): number {
  const low = column[row] as number
  return low + share * ((column[row + 1] as number) - low)
}
