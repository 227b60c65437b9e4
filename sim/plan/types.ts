import type { conditionParameters } from '../parameters/conditions'
import type { ValuesOf } from '../parameters/define'
import type {
  hullParameters,
  keelParameters,
  rudderParameters,
  tillerParameters,
} from '../parameters/hull'
import type { sailParameters, trimParameters } from '../parameters/sails'
import type { elasticParameters, leadParameters, lineParameters } from '../parameters/steering'

/** Values in the stored units of their parameter tables; layouts are drawn for the starboard tack. */

/** A fitting on deck, m: x forward from the rudder stock, y to starboard, z above the waterline. */
export interface HardwarePoint {
  readonly name: string
  readonly kind: 'block' | 'cleat' | 'padeye' | 'stanchion' | 'winch' | 'toe-rail'
  readonly x: number
  readonly y: number
  readonly z: number
}

/** Geometry of one sail, and its name. */
export type Sail = ValuesOf<typeof sailParameters> & { name: string }

/** A boat as a document; `sails` by their ids, which trims and setups name. */
export interface Boat {
  id: string
  name: string
  type: string
  summary: string
  hull: ValuesOf<typeof hullParameters>
  keel: ValuesOf<typeof keelParameters>
  rudder: ValuesOf<typeof rudderParameters>
  tiller: ValuesOf<typeof tillerParameters>
  sails: Record<string, Sail>
  hardware: HardwarePoint[]
  /** Where each value comes from, by parameter key, where it differs from the table's source. */
  provenance: Record<string, string>
}

/** How one sail is set and sheeted. */
export type Trim = ValuesOf<typeof trimParameters>
/** One lead of the control line. */
export type Lead = ValuesOf<typeof leadParameters>
/** Wind, sea, course asked and seed. */
export type Conditions = ValuesOf<typeof conditionParameters>

/** What is wrong with a setup on purpose, in a code and in words. */
export interface Flaw {
  code: string
  text: string
}

/** How a boat is rigged and trimmed, and the conditions it is meant for; leads in order from the sheet to the tiller. */
export interface Setup {
  id: string
  name: string
  summary: string
  boatId: string
  trim: Record<string, Trim>
  /** Which sail's sheet the pull is taken from. */
  source: string
  line: ValuesOf<typeof lineParameters>
  leads: Lead[]
  elastic: ValuesOf<typeof elasticParameters>
  conditions: Conditions
  /** For a setup that is wrong on purpose: what is wrong with it. */
  flaw?: Flaw
}

/** A boat with one of her setups. */
export interface Plan {
  boat: Boat
  setup: Setup
}

/** What holds the tiller: line and elastic, a lashing at the balance, or nothing. */
export type Helm = 'sheet-to-tiller' | 'lashed' | 'free'

/** What is dropped into a run at a moment; angles in degrees clockwise, a negative gust is a lull, heights and reefs add to what is there. */
export type TrialEvent =
  | { atS: number; kind: 'gust'; strengthKn: number; durationS: number }
  | { atS: number; kind: 'wind-shift'; angleDeg: number; durationS: number }
  | { atS: number; kind: 'wave-set'; heightM: number; durationS: number }
  | { atS: number; kind: 'reef'; sail: string; percent: number }
