import type { Conditions, Plan, TrialEvent } from 'sim/plan/types'
import { inWords, rounded, type Units } from '~/features/units/units'

/** "12 kn, 60° starboard tack". */
export function weatherInWords(conditions: Conditions, units: Units): string {
  const wind = inWords(rounded('kn', conditions.trueWindSpeedKn, units, 1))
  return `${wind}, ${courseInWords(conditions.trueWindAngleDeg)}`
}

/** A course to the wind, with the side the wind comes over. */
export function courseInWords(angleDeg: number): string {
  const side = angleDeg < 0 ? 'port' : 'starboard'
  return `${Math.round(Math.abs(angleDeg))}° ${side} tack`
}

/** "2:05". */
export function clock(timeS: number): string {
  const whole = Math.floor(timeS + 1e-6)
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`
}

export const eventNames: Record<TrialEvent['kind'], string> = {
  gust: 'Gust',
  'wind-shift': 'Wind shift',
  'wave-set': 'Wave set',
  reef: 'Reef',
}

/** "Gust of 6 kn for 20 s". */
export function eventInWords(event: TrialEvent, plan: Plan, units: Units): string {
  switch (event.kind) {
    case 'gust': {
      const strength = inWords(rounded('kn', Math.abs(event.strengthKn), units, 0.5))
      const what = event.strengthKn < 0 ? 'Lull' : 'Gust'
      return `${what} of ${strength} for ${event.durationS} s`
    }
    case 'wind-shift': {
      const way = event.angleDeg < 0 ? 'backs' : 'veers'
      return `Wind ${way} ${Math.abs(event.angleDeg)}° within ${event.durationS} s`
    }
    case 'wave-set':
      return `Wave set of ${inWords(rounded('m', event.heightM, units, 0.1))} for ${event.durationS} s`
    case 'reef': {
      const sail = plan.boat.sails[event.sail]?.name ?? event.sail
      return `${sail} reefed to ${100 - event.percent} %`
    }
  }
}
