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

export interface HardwarePoint {
  readonly name: string
  readonly kind: 'block' | 'cleat' | 'padeye' | 'stanchion' | 'winch' | 'toe-rail'
  readonly x: number
  readonly y: number
  readonly z: number
}

export type Sail = ValuesOf<typeof sailParameters> & { name: string }

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

export type Trim = ValuesOf<typeof trimParameters>
export type Lead = ValuesOf<typeof leadParameters>
export type Conditions = ValuesOf<typeof conditionParameters>

export interface Flaw {
  code: string
  text: string
}

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

export type Helm = 'sheet-to-tiller' | 'lashed' | 'free'

export type TrialEvent =
  | { atS: number; kind: 'gust'; strengthKn: number; durationS: number }
  | { atS: number; kind: 'wind-shift'; angleDeg: number; durationS: number }
  | { atS: number; kind: 'wave-set'; heightM: number; durationS: number }
  | { atS: number; kind: 'reef'; sail: string; percent: number }
