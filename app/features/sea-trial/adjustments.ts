import type { conditionParameters } from 'sim/parameters/conditions'
import { trimParameters } from 'sim/parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from 'sim/parameters/steering'
import type { Plan } from 'sim/plan/types'
import { partsOf } from '~/drawing/parts'
import type { Part, PartKey } from '~/drawing/types'

type LineName = keyof typeof lineParameters
type ElasticName = keyof typeof elasticParameters

const onHitch: LineName[] = ['hitchDistance']
const onTiller: { line: LineName[]; elastic: ElasticName[] } = {
  line: ['tillerRadius'],
  elastic: ['tillerRadius'],
}
const onAnchor: ElasticName[] = ['anchorX', 'anchorY', 'anchorZ']
const howPulled: LineName[] = ['pull']

/** Everything that can be adjusted on one drawn part. */
export function keysOfPart(part: PartKey): string[] {
  const [kind, of = ''] = part.split('.')
  switch (kind) {
    case 'sail':
      return keys(`trim.${of}`, trimParameters)
    case 'sheet':
      return ['source', ...howPulled.map((name) => `line.${name}`)]
    case 'hitch':
      return onHitch.map((name) => `line.${name}`)
    case 'line':
      return keys('line', lineParameters, [...onHitch, ...onTiller.line, ...howPulled])
    case 'lead':
      return keys(`leads.${of}`, leadParameters)
    case 'tiller':
      return [
        ...onTiller.line.map((name) => `line.${name}`),
        ...onTiller.elastic.map((name) => `elastic.${name}`),
      ]
    case 'elastic':
      return keys('elastic', elasticParameters, [...onTiller.elastic, ...onAnchor])
    case 'elastic-anchor':
      return onAnchor.map((name) => `elastic.${name}`)
    default:
      return []
  }
}

/** The one adjustment a note shows while it is closed. */
export function mainKeyOf(part: PartKey): string | undefined {
  const [kind, of = ''] = part.split('.')
  switch (kind) {
    case 'sail':
      return `trim.${of}.sheetAngleDeg`
    case 'lead':
      return `leads.${of}.y`
    case 'line':
      return 'line.takeUp'
    case 'elastic':
      return 'elastic.stretch'
    default:
      return keysOfPart(part)[0]
  }
}

export interface Stowed {
  sail: string
  name: string
  key: string
}

/** Numbered parts in the order of the drawings, and the sails that are below. */
export function adjustable(plan: Plan): { parts: Part[]; stowed: Stowed[] } {
  const stowed = Object.entries(plan.boat.sails)
    .filter(([id]) => plan.setup.trim[id]?.set === 'no')
    .map(([id, { name }]) => ({ sail: id, name, key: `trim.${id}.set` }))
  return { parts: partsOf(plan), stowed }
}

type ConditionName = keyof typeof conditionParameters

const conditionKeys = (...names: ConditionName[]) => names.map((name) => `conditions.${name}`)

/** What a sailor looks at before anything else. */
export const weatherKeys = conditionKeys(
  'trueWindSpeedKn',
  'trueWindAngleDeg',
  'turbulenceIntensity',
  'significantWaveHeightM',
  'peakWavePeriodS',
)

export const furtherWeatherKeys = conditionKeys('waveAngleDeg', 'seed')

function keys(group: string, table: object, except: readonly string[] = []): string[] {
  return Object.keys(table)
    .filter((name) => !except.includes(name))
    .map((name) => `${group}.${name}`)
}
