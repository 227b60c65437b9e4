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
    id: 'long-keel-28-reaching-main',
    name: 'Reaching in a moderate breeze, from the mainsheet',
    summary:
      "Main hard in with a reef, genoa eased; the mainsheet's own tail goes over a block to the tiller.",
    boatId: 'long-keel-28',
    trim: { main: set(26, 20), genoa: set(68), jib: stowed, steering: stowed },
    source: 'main',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.65 },
    leads: [{ kind: 'ball', x: 0.71, y: 0.69, z: 1 }],
    elastic: {
      ...elastic,
      stretch: 0.18,
      diameterMm: 10,
      naturalLength: 1.19,
      tillerRadius: 0.95,
      anchorX: 2.6,
      anchorY: 0.92,
    },
    conditions: { ...conditions, trueWindSpeedKn: 14, trueWindAngleDeg: 95, peakWavePeriodS: 3.2 },
  },
  {
    id: 'long-keel-28-broad-reach-genoa',
    name: 'Broad reach, from the genoa sheet',
    summary: "Main squared off, genoa part rolled; the genoa sheet's tail leads to the tiller.",
    boatId: 'long-keel-28',
    trim: { main: set(82), genoa: set(48, 35), jib: stowed, steering: stowed },
    source: 'genoa',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 1.15 },
    leads: [{ kind: 'ball', x: 1.22, y: 0.9, z: 1 }],
    elastic: {
      ...elastic,
      stretch: 0.07,
      strands: 2,
      naturalLength: 0.41,
      tillerRadius: 1.05,
      anchorX: 1.45,
      anchorY: 1.15,
    },
    conditions: { ...conditions, trueWindSpeedKn: 14, trueWindAngleDeg: 115, peakWavePeriodS: 3.2 },
  },
  {
    id: 'long-keel-28-running-steering-sail',
    name: 'Running, steering sail',
    summary:
      'Main alone under a preventer; a small sail aft whose sheet goes to nothing but the tiller.',
    boatId: 'long-keel-28',
    trim: { main: set(82, 0, 'preventer'), genoa: stowed, jib: stowed, steering: set(39) },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.61 },
    leads: [{ kind: 'ball', x: 0.69, y: 0.54, z: 1 }],
    elastic: {
      ...elastic,
      stretch: 0.04,
      naturalLength: 1.38,
      tillerRadius: 1.15,
      anchorX: 2,
      anchorY: 1.21,
    },
    conditions: { ...conditions, trueWindSpeedKn: 11, trueWindAngleDeg: 165, peakWavePeriodS: 3.4 },
  },
  {
    id: 'fin-skeg-31-reaching-main',
    name: 'Reaching in a fresh breeze, from the mainsheet',
    summary: 'Main hard in, genoa well eased; the pull is hitched to a part of the mainsheet.',
    boatId: 'fin-skeg-31',
    trim: { main: set(25), genoa: set(75, 20), jib: stowed, steering: stowed },
    source: 'main',
    line: { ...line, hitchDistance: 1.53, takeUp: 0.35, tillerRadius: 0.9 },
    leads: [{ kind: 'ball', x: 1.13, y: 0.6, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.54,
      diameterMm: 6,
      naturalLength: 0.63,
      tillerRadius: 0.97,
      anchorX: 2.53,
      anchorY: 1.22,
      anchorZ: 1.1,
    },
    conditions: { ...conditions, trueWindSpeedKn: 15, trueWindAngleDeg: 110, peakWavePeriodS: 3.3 },
  },
  {
    id: 'fin-skeg-31-broad-reach-genoa',
    name: 'Broad reach in a light breeze, from the genoa sheet',
    summary: "Main squared off under a preventer, the genoa sheet's tail led to the tiller.",
    boatId: 'fin-skeg-31',
    trim: { main: set(82, 20, 'preventer'), genoa: set(59.5), jib: stowed, steering: stowed },
    source: 'genoa',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.68 },
    leads: [{ kind: 'ball', x: 0.77, y: 0.68, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.24,
      naturalLength: 0.72,
      tillerRadius: 0.99,
      anchorX: 2.76,
      anchorY: 1.29,
      anchorZ: 1.1,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 9,
      trueWindAngleDeg: 130,
      significantWaveHeightM: 0.2,
      peakWavePeriodS: 2.6,
    },
  },
  {
    id: 'fin-skeg-31-running-steering-sail',
    name: 'Running in a moderate breeze, steering sail',
    summary:
      'Main under a preventer, jib poled out; a small sail aft whose sheet goes to nothing but the tiller.',
    boatId: 'fin-skeg-31',
    trim: {
      main: set(82, 0, 'preventer'),
      genoa: stowed,
      jib: set(82.5, 20, 'pole'),
      steering: set(34.5),
    },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.75 },
    leads: [{ kind: 'ball', x: 0.8, y: 0.61, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.07,
      diameterMm: 10,
      naturalLength: 0.59,
      tillerRadius: 0.86,
      anchorX: 3.02,
      anchorY: 1.48,
      anchorZ: 1.1,
    },
    conditions: { ...conditions, trueWindSpeedKn: 13, trueWindAngleDeg: 165, peakWavePeriodS: 3.4 },
  },
  {
    id: 'lifting-keel-22-close-hauled-main',
    name: 'Close-hauled in a light breeze, from the mainsheet',
    summary: 'Headsail part rolled and hard in, the pull hitched to a part of the mainsheet.',
    boatId: 'lifting-keel-22',
    trim: { main: set(24), genoa: set(6, 35), jib: stowed, steering: stowed },
    source: 'main',
    line: { ...line, hitchDistance: 0.99, takeUp: 0.16, tillerRadius: 0.4 },
    leads: [{ kind: 'ball', x: 0.8, y: 0.8, z: 0.9 }],
    elastic: {
      ...elastic,
      stretch: 0.05,
      diameterMm: 6,
      naturalLength: 0.78,
      tillerRadius: 0.67,
      anchorX: 0.5,
      anchorY: 0.94,
      anchorZ: 0.9,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 8,
      trueWindAngleDeg: 60,
      significantWaveHeightM: 0.2,
      peakWavePeriodS: 2.5,
    },
  },
  {
    id: 'lifting-keel-22-close-hauled-jib',
    name: 'Close-hauled in a moderate breeze, from the jib sheet',
    summary:
      'Working jib part rolled; the line is hitched to the jib sheet and crosses to windward.',
    boatId: 'lifting-keel-22',
    trim: { main: set(30), genoa: stowed, jib: set(25.5, 20), steering: stowed },
    source: 'jib',
    line: { ...line, hitchDistance: 1, takeUp: 0.05, tillerRadius: 0.71 },
    leads: [
      { kind: 'ball', x: 3.2, y: 0.25, z: 0.95 },
      { kind: 'ball', x: 1.07, y: 0.53, z: 0.9 },
    ],
    elastic: {
      ...elastic,
      stretch: 0.11,
      diameterMm: 4,
      strands: 2,
      naturalLength: 0.73,
      tillerRadius: 0.92,
      anchorX: 2.53,
      anchorY: 0.74,
      anchorZ: 0.9,
    },
    conditions: { ...conditions, trueWindSpeedKn: 14, trueWindAngleDeg: 55, peakWavePeriodS: 3.2 },
  },
  {
    id: 'lifting-keel-22-running-steering-sail',
    name: 'Running in a light breeze, steering sail',
    summary:
      'Genoa poled out, no main; a small sail aft whose sheet goes to nothing but the tiller.',
    boatId: 'lifting-keel-22',
    trim: { main: stowed, genoa: set(90, 0, 'pole'), jib: stowed, steering: set(28) },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.89 },
    leads: [{ kind: 'ball', x: 1.13, y: 0.66, z: 0.9 }],
    elastic: {
      ...elastic,
      stretch: 0.04,
      diameterMm: 4,
      strands: 2,
      naturalLength: 0.52,
      tillerRadius: 0.85,
      anchorX: 1.14,
      anchorY: 0.86,
      anchorZ: 0.9,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 8,
      trueWindAngleDeg: 160,
      significantWaveHeightM: 0.2,
      peakWavePeriodS: 2.5,
    },
  },
  {
    id: 'ketch-38-reaching-mizzen',
    name: 'Reaching in a fresh breeze, from the mizzen sheet',
    summary: 'No headsail: main and mizzen, the pull hitched to a part of the mizzen sheet.',
    boatId: 'ketch-38',
    trim: { main: set(53), mizzen: set(39), genoa: stowed, staysail: stowed },
    source: 'mizzen',
    line: { ...line, hitchDistance: 0.53, takeUp: 0.63, tillerRadius: 1.49 },
    leads: [{ kind: 'ball', x: 1.57, y: 1.25, z: 1.3 }],
    elastic: {
      ...elastic,
      stretch: 0.28,
      diameterMm: 5,
      strands: 2,
      naturalLength: 0.52,
      tillerRadius: 0.99,
      anchorX: 1.92,
      anchorY: 1.71,
      anchorZ: 1.3,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 17,
      trueWindAngleDeg: 80,
      significantWaveHeightM: 0.6,
    },
  },
  {
    id: 'ketch-38-reaching-genoa',
    name: 'Reaching in a light breeze, from the genoa sheet',
    summary: "Genoa part rolled, its sheet's tail led over a block to the tiller.",
    boatId: 'ketch-38',
    trim: { main: set(46), mizzen: set(45.5), genoa: set(36.5, 35), staysail: stowed },
    source: 'genoa',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 1.63 },
    leads: [{ kind: 'ball', x: 1.72, y: 0.78, z: 1.3 }],
    elastic: {
      ...elastic,
      stretch: 0.49,
      diameterMm: 10,
      naturalLength: 1.42,
      tillerRadius: 1.7,
      anchorX: 2.93,
      anchorY: 1.52,
      anchorZ: 1.3,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 9,
      significantWaveHeightM: 0.2,
      peakWavePeriodS: 2.6,
    },
  },
]
