import type { Conditions, Helm, Plan, TrialEvent } from '../plan/types'
import type { Series } from './channels'

/** Fixed-step Runge-Kutta, or extrapolation with step control as reference. */
export type Solver = 'fixed-step' | 'adaptive'

/** All that a run depends on. `conditions` count in place of the setup's own; seconds throughout. */
export interface TrialRequest {
  plan: Plan
  conditions: Conditions
  events: TrialEvent[]
  helm: Helm
  solver: Solver
  durationS: number
  outputIntervalS: number
}

/** Something that happened during a run, at a moment. */
export interface Happening {
  atS: number
  code:
    | 'tacked'
    | 'gybed'
    | 'broached'
    | 'line-slack'
    | 'elastic-slack'
    | 'tiller-on-stop'
    | 'left-valid-range'
    | 'gust'
    | 'wind-shift'
    | 'wave-set'
    | 'reef'
  text: string
}

/** Headline figures; the judged ones after the unjudged beginning, angles in degrees, positive over the starboard side. */
export interface Metrics {
  holds: boolean
  /** Until she tacked, gybed, broached or was knocked flat, or the whole run. */
  lastedS: number
  meanCourseToWindDeg: number
  rmsCourseErrorDeg: number
  maxCourseErrorDeg: number
  withinBandFraction: number
  meanSpeedKn: number
  balanceSpeedKn: number
  maxHeelDeg: number
  peakControlLineN: number
  peakElasticN: number
  peakSheetN: number
}

/** What became of her, for programs; `Verdict.text` says it to people. */
export type VerdictCode =
  | 'holds'
  | 'holds-other-course'
  | 'creeps-to-windward'
  | 'sags-to-leeward'
  | 'hunts'
  | 'luffs'
  | 'tacks'
  | 'gybes'
  | 'broaches'
  | 'too-slow'
  | 'not-judged'
  | 'stopped'

/** How the run went. */
export interface Verdict {
  code: VerdictCode
  /** One sentence in a sailor's words. */
  text: string
  /** Why, in one or two sentences. */
  reason: string
}

/** The course band a run is judged against, both positive with the wind over the starboard side. */
export interface Band {
  centreDeg: number
  halfWidthDeg: number
}

/** The steady state a run starts from. */
export interface BalanceSummary {
  found: boolean
  speedKn: number
  heelDeg: number
  leewayDeg: number
  tillerDeg: number
  /** Moment of the water on the rudder, positive when it turns the tiller to starboard. */
  rudderMomentNm: number
}

/** A run as it is shown, exported and compared. */
export interface TrialResult {
  modelVersion: string
  verdict: Verdict
  metrics: Metrics
  happenings: Happening[]
  band: Band
  balance: BalanceSummary
  series: Series
  /** Boom or clew angle of each sail set, degrees, positive with the clew to starboard. */
  boomDeg: Record<string, Float64Array>
  /** Drawing or flogging: normal force over that of a full sail, 0..1, per sail set. */
  drawing: Record<string, Float64Array>
}
