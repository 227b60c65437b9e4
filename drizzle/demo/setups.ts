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

// The two sound setups from which the wrong ones are made, each by one fault.
const reachFromTheMain: Setup = {
  id: 'long-keel-28-reaching-main',
  name: 'Reaching in a moderate breeze, from the mainsheet',
  summary:
    "Main hard in with a reef, genoa eased; the mainsheet's own tail goes over a block to the tiller.",
  boatId: 'long-keel-28',
  trim: { main: set(24, 20), genoa: set(71, 2), jib: stowed, steering: stowed },
  source: 'main',
  line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.63 },
  leads: [{ kind: 'ball', x: 0.89, y: 0.78, z: 1 }],
  elastic: {
    ...elastic,
    stretch: 0.15,
    diameterMm: 10,
    naturalLength: 1.07,
    tillerRadius: 0.85,
    anchorX: 2.54,
    anchorY: 0.92,
  },
  conditions: { ...conditions, trueWindSpeedKn: 14, trueWindAngleDeg: 95, peakWavePeriodS: 4.2 },
}

const broadReachFromTheGenoa: Setup = {
  id: 'fin-skeg-31-broad-reach-genoa',
  name: 'Broad reach in a light breeze, from the genoa sheet',
  summary: "Main squared off under a preventer, the genoa sheet's tail led to the tiller.",
  boatId: 'fin-skeg-31',
  trim: { main: set(78.5, 20, 'preventer'), genoa: set(55), jib: stowed, steering: stowed },
  source: 'genoa',
  line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.67 },
  leads: [{ kind: 'ball', x: 1.14, y: 0.9, z: 1.1 }],
  elastic: {
    ...elastic,
    stretch: 0.18,
    naturalLength: 0.56,
    tillerRadius: 0.95,
    anchorX: 2.61,
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
}

export const demoSetups: Setup[] = [
  reachFromTheMain,
  {
    id: 'long-keel-28-broad-reach-genoa',
    name: 'Broad reach, from the genoa sheet',
    summary: "Main squared off, genoa part rolled; the genoa sheet's tail leads to the tiller.",
    boatId: 'long-keel-28',
    trim: { main: set(81.5), genoa: set(34.5, 35), jib: stowed, steering: stowed },
    source: 'genoa',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 1.15 },
    leads: [{ kind: 'ball', x: 1.23, y: 0.72, z: 1 }],
    elastic: {
      ...elastic,
      stretch: 0.07,
      diameterMm: 9,
      strands: 2,
      naturalLength: 0.39,
      tillerRadius: 1.06,
      anchorX: 1.45,
      anchorY: 1.15,
    },
    conditions: { ...conditions, trueWindSpeedKn: 14, trueWindAngleDeg: 115, peakWavePeriodS: 4.2 },
  },
  {
    id: 'long-keel-28-running-steering-sail',
    name: 'Running in a moderate breeze, steering sail',
    summary:
      'Reefed main under a preventer; a small sail aft whose sheet goes to nothing but the tiller.',
    boatId: 'long-keel-28',
    trim: { main: set(77, 50, 'preventer'), genoa: stowed, jib: stowed, steering: set(27) },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.62 },
    leads: [{ kind: 'ball', x: 0.5, y: 0.93, z: 1 }],
    elastic: {
      ...elastic,
      stretch: 0.06,
      diameterMm: 5,
      strands: 2,
      naturalLength: 1.13,
      tillerRadius: 0.82,
      anchorX: 2.06,
      anchorY: 0.95,
    },
    conditions: { ...conditions, trueWindSpeedKn: 11, trueWindAngleDeg: 165, peakWavePeriodS: 4.2 },
  },
  {
    id: 'fin-skeg-31-reaching-main-fresh',
    name: 'Reaching in a fresh breeze, from the mainsheet',
    summary: 'Main hard in, genoa eased; the pull is hitched to a part of the mainsheet.',
    boatId: 'fin-skeg-31',
    trim: { main: set(22, 1), genoa: set(63), jib: stowed, steering: stowed },
    source: 'main',
    line: { ...line, hitchDistance: 0.99, takeUp: 0.98, tillerRadius: 1.15 },
    leads: [{ kind: 'ball', x: 1.15, y: 0.96, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.78,
      strands: 2,
      naturalLength: 0.79,
      tillerRadius: 1.17,
      anchorX: 2.85,
      anchorY: 0.98,
      anchorZ: 1.1,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 18,
      significantWaveHeightM: 0.6,
      peakWavePeriodS: 4.2,
    },
  },
  {
    id: 'fin-skeg-31-broad-reach-main',
    name: 'Broad reach in a moderate breeze, from the mainsheet',
    summary: 'Main hard in, genoa well eased; the pull is hitched to a part of the mainsheet.',
    boatId: 'fin-skeg-31',
    trim: { main: set(26), genoa: set(76.5, 19), jib: stowed, steering: stowed },
    source: 'main',
    line: { ...line, hitchDistance: 1.53, takeUp: 0.35, tillerRadius: 0.97 },
    leads: [{ kind: 'ball', x: 0.98, y: 0.57, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.41,
      diameterMm: 7,
      naturalLength: 0.62,
      tillerRadius: 1.02,
      anchorX: 2.48,
      anchorY: 1.22,
      anchorZ: 1.1,
    },
    conditions: { ...conditions, trueWindSpeedKn: 15, trueWindAngleDeg: 110, peakWavePeriodS: 4.2 },
  },
  broadReachFromTheGenoa,
  {
    id: 'fin-skeg-31-running-steering-sail',
    name: 'Running in a moderate breeze, steering sail',
    summary:
      'Main alone under a preventer; a small sail aft whose sheet goes to nothing but the tiller.',
    boatId: 'fin-skeg-31',
    trim: { main: set(82, 0, 'preventer'), genoa: stowed, jib: stowed, steering: set(36.5) },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 0.88 },
    leads: [{ kind: 'ball', x: 1.06, y: 1.03, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.18,
      diameterMm: 6,
      naturalLength: 1.26,
      tillerRadius: 0.63,
      anchorX: 1.61,
      anchorY: 1.13,
      anchorZ: 1.1,
    },
    conditions: { ...conditions, trueWindSpeedKn: 13, trueWindAngleDeg: 165, peakWavePeriodS: 4.2 },
  },
  {
    id: 'fin-skeg-31-running-light-steering-sail',
    name: 'Running in a light breeze, steering sail',
    summary:
      'Main under a preventer, genoa poled out; a small sail aft whose sheet goes to nothing but the tiller.',
    boatId: 'fin-skeg-31',
    trim: {
      main: set(82, 20, 'preventer'),
      genoa: set(90, 20, 'pole'),
      jib: stowed,
      steering: set(33.5),
    },
    source: 'steering',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 1.07 },
    leads: [{ kind: 'ball', x: 1.16, y: 0.61, z: 1.1 }],
    elastic: {
      ...elastic,
      stretch: 0.07,
      naturalLength: 0.8,
      tillerRadius: 0.46,
      anchorX: 2.42,
      anchorY: 1.51,
      anchorZ: 1.1,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 9,
      trueWindAngleDeg: 170,
      significantWaveHeightM: 0.2,
      peakWavePeriodS: 3,
    },
  },
  {
    id: 'lifting-keel-22-close-hauled-main',
    name: 'Close-hauled in a light breeze, from the mainsheet',
    summary: 'Headsail part rolled and hard in, the pull hitched to a part of the mainsheet.',
    boatId: 'lifting-keel-22',
    trim: { main: set(23.5), genoa: set(6, 35), jib: stowed, steering: stowed },
    source: 'main',
    line: { ...line, hitchDistance: 0.99, takeUp: 0.16, tillerRadius: 0.35 },
    leads: [{ kind: 'ball', x: 0.8, y: 0.8, z: 0.9 }],
    elastic: {
      ...elastic,
      stretch: 0.05,
      diameterMm: 6,
      naturalLength: 0.86,
      tillerRadius: 0.67,
      anchorX: 0.47,
      anchorY: 0.94,
      anchorZ: 0.9,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 8,
      trueWindAngleDeg: 60,
      significantWaveHeightM: 0.2,
      peakWavePeriodS: 3,
    },
  },
  {
    id: 'lifting-keel-22-close-hauled-jib',
    name: 'Close-hauled in a moderate breeze, from the jib sheet',
    summary:
      'Working jib part rolled; the line is hitched to the jib sheet and crosses to windward.',
    boatId: 'lifting-keel-22',
    trim: { main: set(29), genoa: stowed, jib: set(24, 20), steering: stowed },
    source: 'jib',
    line: { ...line, hitchDistance: 0.96, takeUp: 0.05, tillerRadius: 0.71 },
    leads: [
      { kind: 'ball', x: 3.2, y: 0.25, z: 0.95 },
      { kind: 'ball', x: 1.07, y: 0.53, z: 0.9 },
    ],
    elastic: {
      ...elastic,
      stretch: 0.11,
      diameterMm: 5,
      strands: 2,
      naturalLength: 0.75,
      tillerRadius: 0.92,
      anchorX: 2.53,
      anchorY: 0.74,
      anchorZ: 0.9,
    },
    conditions: { ...conditions, trueWindSpeedKn: 14, trueWindAngleDeg: 55, peakWavePeriodS: 4 },
  },
  {
    id: 'ketch-38-reaching-mizzen',
    name: 'Reaching in a fresh breeze, from the mizzen sheet',
    summary: 'No headsail: main and mizzen, the pull hitched to a part of the mizzen sheet.',
    boatId: 'ketch-38',
    trim: { main: set(53), mizzen: set(35), genoa: stowed, staysail: stowed },
    source: 'mizzen',
    line: { ...line, hitchDistance: 0.53, takeUp: 0.63, tillerRadius: 1.49 },
    leads: [{ kind: 'ball', x: 1.51, y: 1.17, z: 1.3 }],
    elastic: {
      ...elastic,
      stretch: 0.27,
      diameterMm: 5,
      strands: 2,
      naturalLength: 0.46,
      tillerRadius: 0.99,
      anchorX: 1.93,
      anchorY: 1.71,
      anchorZ: 1.3,
    },
    conditions: {
      ...conditions,
      trueWindSpeedKn: 17,
      trueWindAngleDeg: 80,
      significantWaveHeightM: 0.6,
      peakWavePeriodS: 4.2,
    },
  },
  {
    id: 'ketch-38-reaching-genoa',
    name: 'Reaching in a light breeze, from the genoa sheet',
    summary: "Genoa part rolled, its sheet's tail led over a block to the tiller.",
    boatId: 'ketch-38',
    trim: { main: set(43.5), mizzen: set(48, 27), genoa: set(31, 35), staysail: stowed },
    source: 'genoa',
    line: { ...line, pull: 'tail', takeUp: 0, tillerRadius: 1.61 },
    leads: [{ kind: 'ball', x: 1.5, y: 0.98, z: 1.3 }],
    elastic: {
      ...elastic,
      stretch: 0.53,
      diameterMm: 11,
      naturalLength: 1.44,
      tillerRadius: 1.73,
      anchorX: 3.09,
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
  {
    ...broadReachFromTheGenoa,
    id: 'fin-skeg-31-elastic-too-strong',
    name: 'Elastic too strong for the wind',
    summary:
      'The broad reach in a light breeze with a trebled, thicker elastic: the genoa sheet cannot answer it.',
    elastic: { ...broadReachFromTheGenoa.elastic, diameterMm: 10, strands: 3 },
    flaw: {
      code: 'elastic-too-strong',
      text: 'The elastic is too strong for this wind: it holds the tiller to leeward whatever the sheet does, and she rounds up.',
    },
  },
  {
    ...reachFromTheMain,
    id: 'long-keel-28-lead-off-square',
    name: 'Lead far off square',
    summary: 'The reach from the mainsheet with the last block led nearly along the tiller.',
    leads: [{ kind: 'ball', x: 2.2, y: 0.3, z: 1 }],
    flaw: {
      code: 'lead-off-square',
      text: 'The line reaches the tiller far off square: most of its pull goes along the tiller and turns nothing.',
    },
  },
  {
    ...reachFromTheMain,
    id: 'long-keel-28-out-of-balance',
    name: 'Boat out of balance',
    summary:
      'Whole main hard in and no headsail, in a fresh breeze: weather helm before the line is asked to steer.',
    trim: { main: set(14), genoa: stowed, jib: stowed, steering: stowed },
    conditions: { ...reachFromTheMain.conditions, trueWindSpeedKn: 19, trueWindAngleDeg: 70 },
    flaw: {
      code: 'out-of-balance',
      text: 'Far too much sail aft: she needs a handful of helm before the line is asked to steer, and neither line nor elastic can find a course for her. Balance first.',
    },
  },
]
