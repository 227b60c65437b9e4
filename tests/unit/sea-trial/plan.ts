import { conditionParameters } from 'sim/parameters/conditions'
import { defaultsOf } from 'sim/parameters/define'
import {
  hullParameters,
  keelParameters,
  rudderParameters,
  tillerParameters,
} from 'sim/parameters/hull'
import { sailParameters, trimParameters } from 'sim/parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from 'sim/parameters/steering'
import type { Plan } from 'sim/plan/types'

/** A boat and setup of nothing but defaults, with two sails and two leads. */
export const plan: Plan = {
  boat: {
    id: 'plain-28',
    name: 'Plain',
    type: 'Long-keel 28',
    summary: '',
    hull: defaultsOf(hullParameters),
    keel: defaultsOf(keelParameters),
    rudder: defaultsOf(rudderParameters),
    tiller: defaultsOf(tillerParameters),
    sails: {
      main: { ...defaultsOf(sailParameters), name: 'Mainsail' },
      'storm-jib': { ...defaultsOf(sailParameters), kind: 'headsail', name: 'Storm jib' },
    },
    hardware: [],
    provenance: {},
  },
  setup: {
    id: 'plain-beam',
    name: 'Beam reach',
    summary: '',
    boatId: 'plain-28',
    trim: { main: defaultsOf(trimParameters), 'storm-jib': defaultsOf(trimParameters) },
    source: 'main',
    line: defaultsOf(lineParameters),
    leads: [defaultsOf(leadParameters), defaultsOf(leadParameters)],
    elastic: defaultsOf(elasticParameters),
    conditions: defaultsOf(conditionParameters),
  },
}
