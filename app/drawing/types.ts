import type { Plan } from 'sim/plan/types'
import type { Channel } from 'sim/trial/channels'
import type { TrialRequest, TrialResult } from 'sim/trial/types'

/** A run with what was asked for, so that a drawing needs nothing else. */
export interface Run {
  request: TrialRequest
  result: TrialResult
}

/** Everything that moves, at one moment of a run. */
export type Moment = Record<Channel, number> & {
  /** Boom or clew angle per sail set, positive with the clew to starboard. */
  boomDeg: Readonly<Record<string, number>>
  /** Drawing (1) or flogging (0), per sail set. */
  drawing: Readonly<Record<string, number>>
  /** Part taken in, per sail, percent; reefs taken during the run included. */
  reef: Readonly<Record<string, number>>
}

/** A run on the same seed with another helm, shown thin and dashed beside the real one. */
export interface Ghost {
  helm: 'lashed' | 'free'
  /** The word at its line's end, e.g. 'lashed'. */
  label: string
  run: Run
}

/** How one kind of quantity is shown. Units are the page's business. */
export interface Measure {
  /** Written after a number, e.g. 'kn'. */
  unit: string
  /** Stored value times this is the number shown; axes and scale bars find round ticks with it. */
  factor: number
  /** The number alone, from the stored value. */
  format: (stored: number) => string
}

export interface Measures {
  /** Stored in kn, of wind and boat. */
  windSpeed: Measure
  boatSpeed: Measure
  /** Stored in deg; the unit is the degree sign. */
  angle: Measure
  /** Stored in N. */
  force: Measure
  /** Stored in m: of boats and tracks. */
  length: Measure
  /** Stored in m: of lines and elastic, e.g. shown in cm. */
  travel: Measure
}

/**
 * A part that can be pointed at: `sail.<id>`, `sheet`, `hitch`, `line`, `lead.<n>`, `tiller`,
 * `elastic`, `elastic-anchor`.
 */
export type PartKey =
  | `sail.${string}`
  | `lead.${number}`
  | 'sheet'
  | 'hitch'
  | 'line'
  | 'tiller'
  | 'elastic'
  | 'elastic-anchor'

/** A numbered part; the same number in every drawing and in the list. */
export interface Part {
  key: PartKey
  number: number
  /** In a sailor's words, e.g. 'Ball-bearing block'. */
  name: string
}

/** Pixels from the upper left corner of the drawing that gave it. */
export interface Anchor {
  x: number
  y: number
}

/** Size of a drawing in CSS pixels; type is 14 px whatever the size. */
export interface Size {
  width: number
  height: number
}

/** `app/drawing/sea-trial-sheet.tsx`: `SeaTrialSheet`. */
export interface SeaTrialSheetProps extends Size {
  run: Run
  moment: Moment
  measures: Measures
  ghosts?: readonly Ghost[]
  /** Read by screen readers in place of the drawing; keep it still while playing. */
  label: string
  /** Whether wave crests run; hold them still at high playback speeds and with reduced motion. */
  water?: 'running' | 'still'
}

/** `app/drawing/tiller-detail.tsx`: `TillerDetail`, and `partAnchors(props)` for the notes. */
export interface TillerDetailProps extends Size {
  plan: Plan
  moment: Moment
  measures: Measures
  label: string
  /** Part to draw stronger, while its note is open. */
  active?: PartKey | null
}

export type PartAnchors = Readonly<Partial<Record<PartKey, Anchor>>>

/** `app/drawing/track-chart.tsx`: `TrackChart`. */
export interface TrackChartProps extends Size {
  run: Run
  moment: Moment
  measures: Measures
  ghosts?: readonly Ghost[]
  label: string
}

/** `app/drawing/stern-view.tsx`: `SternView`. */
export interface SternViewProps extends Size {
  plan: Plan
  moment: Moment
  measures: Measures
  label: string
}

/** `app/drawing/strip.tsx`: `Strip`. */
export interface StripProps extends Size {
  run: Run
  ghosts?: readonly Ghost[]
  cursorS: number
  measures: Measures
  label: string
  /** Called while the pointer drags along the time axis. */
  onScrub?: (timeS: number) => void
}

/** `app/drawing/readings.ts`: `readings(run, cursorS, measures): Reading[]`. */
export interface Reading {
  plot: 'course' | 'heel' | 'tiller' | 'loads'
  title: string
  /** One sentence: what it is at the cursor. */
  atCursor: string
  /** One sentence: what it does over the run. */
  overRun: string
}
