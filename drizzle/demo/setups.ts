/**
 * Demo setups, found by searching trims, areas, cord, lengths, hitch and leads with the model itself for the best hold rate
 * under ten seeds, and kept only where they truly hold in their stated conditions. The last ones are wrong on purpose.
 */

import { conditionParameters } from 'sim/parameters/conditions'
import { defaultsOf } from 'sim/parameters/define'
import { trimParameters } from 'sim/parameters/sails'
import { elasticParameters, lineParameters } from 'sim/parameters/steering'
import type { Setup, Trim } from 'sim/plan/types'

const line = defaultsOf(lineParameters)
const elastic = defaultsOf(elasticParameters)
const conditions = defaultsOf(conditionParameters)
const trim = defaultsOf(trimParameters)

/** A sail set to an angle, a part of it taken in, held as said. */
function set(sheetAngleDeg: number, reef = 0, held: Trim['held'] = 'sheet'): Trim {
  return { ...trim, sheetAngleDeg, reef, held }
}

const stowed: Trim = { ...trim, set: 'no' }

export const demoSetups: Setup[] = [
  {
    id: 'fin-skeg-31-running-steering-sail',
    name: 'Running under poled-out genoa, steering sail',
    summary:
      'Poled-out genoa forward, a small sail on the backstay whose sheet goes to the tiller alone.',
    boatId: 'fin-skeg-31',
    trim: {
      main: set(82, 0, 'preventer'),
      genoa: set(69.5, 20, 'pole'),
      jib: stowed,
      steering: set(39),
    },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.76 },
    leads: [{ kind: 'ball', x: 0.81, y: 0.93, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.01,
      diameterMm: 10,
      naturalLength: 0.2,
      tillerRadius: 0.69,
      anchorX: 0.92,
      anchorY: 1.11,
      anchorZ: 1.1,
    },
    conditions: { ...conditions, trueWindSpeedKn: 15, trueWindAngleDeg: 170, peakWavePeriodS: 3.4 },
  },
]
