import { DEGREE, KNOT } from '../constants'
import type { Conditions, TrialEvent } from '../plan/types'
import { type Seaway, seaway } from '../sea/seaway'
import { gustShape, shiftShape } from '../wind/gust'
import { sampleRecord, type Turbulence, turbulenceRecord } from '../wind/turbulence'

/** Wind and sea of one run as functions of time; the mean wind comes from north. */
export interface Environment {
  /** Mean wind at 10 m, m/s. */
  meanWind: number
  turbulence: Turbulence
  /** Seaway of unit significant height; `waveGain` scales it. */
  sea: Seaway
  significantHeight: number
  events: readonly TrialEvent[]
}

/** Keeps the sea's random numbers apart from the wind's under one seed. */
const SEA_STREAM = 0x5ea

/**
 * @param duration s
 * @param mirror -1 gives the mirror image, for the port tack
 */
export function environmentOf(
  conditions: Conditions,
  events: readonly TrialEvent[],
  duration: number,
  mirror: 1 | -1,
): Environment {
  const meanWind = conditions.trueWindSpeedKn * KNOT
  const calm = conditions.significantWaveHeightM === 0 && !events.some((e) => e.kind === 'wave-set')
  return {
    meanWind,
    turbulence: turbulenceRecord(
      conditions.seed,
      meanWind,
      conditions.turbulenceIntensity,
      duration,
      mirror,
    ),
    sea: seaway(
      conditions.seed ^ SEA_STREAM,
      calm ? 0 : 1,
      conditions.peakWavePeriodS,
      conditions.waveAngleDeg * DEGREE,
      mirror,
    ),
    significantHeight: conditions.significantWaveHeightM,
    events,
  }
}

/** Wind speed along the mean direction, m/s, with gusts. */
export function windAlong(environment: Environment, t: number): number {
  let speed = environment.meanWind + sampleRecord(environment.turbulence.along, t)
  for (const event of environment.events) {
    if (event.kind === 'gust') {
      speed += event.strengthKn * KNOT * gustShape(t - event.atS, event.durationS)
    }
  }
  return Math.max(speed, 0)
}

/** Wind speed across the mean direction, m/s. */
export function windAcross(environment: Environment, t: number): number {
  return sampleRecord(environment.turbulence.across, t)
}

/** Direction the mean wind comes from, rad clockwise from north, with the shifts so far. */
export function windFrom(environment: Environment, t: number): number {
  let from = 0
  for (const event of environment.events) {
    if (event.kind === 'wind-shift') {
      from += event.angleDeg * DEGREE * shiftShape(t - event.atS, event.durationS)
    }
  }
  return from
}

/** Significant height of the sea at a time, m, which scales the unit seaway. */
export function waveGain(environment: Environment, t: number): number {
  let height = environment.significantHeight
  for (const event of environment.events) {
    if (event.kind === 'wave-set')
      height += event.heightM * gustShape(t - event.atS, event.durationS)
  }
  return height
}
