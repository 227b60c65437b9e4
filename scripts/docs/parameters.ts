import { conditionParameters } from '../../sim/parameters/conditions'
import type { Parameter, ParameterTable } from '../../sim/parameters/define'
import {
  hullParameters,
  keelParameters,
  rudderParameters,
  tillerParameters,
} from '../../sim/parameters/hull'
import { judgingParameters } from '../../sim/parameters/judging'
import { sailParameters, trimParameters } from '../../sim/parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from '../../sim/parameters/steering'

/** Headings of the page, the keys their values are found under, and their tables. */
const sections: [heading: string, keys: string, table: ParameterTable][] = [
  ['Wind, sea and course asked', 'conditions.', conditionParameters],
  ['Hull', 'hull.', hullParameters],
  ['Keel', 'keel.', keelParameters],
  ['Rudder', 'rudder.', rudderParameters],
  ['Tiller', 'tiller.', tillerParameters],
  ['Sails, each', 'sails.<sail>.', sailParameters],
  ['Trim, of each sail', 'trim.<sail>.', trimParameters],
  ['Control line', 'line.', lineParameters],
  ['Leads, each', 'leads.<number>.', leadParameters],
  ['Elastic', 'elastic.', elasticParameters],
  ['Judging a run', '', judgingParameters],
]

const units: Record<string, string> = { m2: 'm²', kgm2: 'kg m²', Nm: 'N m', deg: '°', '1': '' }

const greek = /^(alpha|beta|delta|phi|mu|zeta|Lambda)/

/** A symbol of the tables as typeset mathematics. */
export function typeset(symbol: string): string {
  const fraction = symbol.split('/').map((part) => {
    const [head = '', ...index] = part.split('_')
    const letter = head.replace(greek, '\\$1').replace(/^([A-Za-z])(\d+)$/, '$1_{$2}')
    const name = /^[A-Za-z]{2,}$/.test(letter) ? `\\mathrm{${letter}}` : letter
    const below = index.join(' ').replace(greek, '\\$1')
    if (below === '') return name
    return `${name}_{${/^[A-Za-z]{2,}$/.test(below) ? `\\mathrm{${below}}` : below}}`
  })
  return `$${fraction.join('/')}$`
}

const heads = ['what', 'symbol', 'key', 'allowed', 'default', 'source']

function row(name: string, parameter: Parameter): string[] {
  const { label, source } = parameter
  if (parameter.type === 'choice') {
    const options = Object.entries(parameter.options).map(([key, words]) => `\`${key}\` ${words}`)
    return [label, '', `\`${name}\``, options.join('; '), `\`${parameter.default}\``, source]
  }
  const { min, max, unit, whole, symbol } = parameter
  const range = `${min} to ${max} ${units[unit] ?? unit}`.trimEnd()
  const allowed = whole ? `${range}, whole` : range
  return [label, typeset(symbol), `\`${name}\``, allowed, String(parameter.default), source]
}

/** Rows under their heads, columns aligned as the project formats its pages. */
function aligned(rows: string[][]): string[] {
  const lines = [heads, ...rows]
  const widths = heads.map((_, i) => Math.max(...lines.map((line) => line[i]?.length ?? 0)))
  const written = lines.map((line) => line.map((cell, i) => cell.padEnd(widths[i] ?? 0)))
  written.splice(
    1,
    0,
    widths.map((width) => '-'.repeat(width)),
  )
  return written.map((line) => `| ${line.join(' | ')} |`)
}

/** The parameter tables as a part of a page. */
export function parameterTables(): string {
  return sections
    .map(([heading, keys, table]) =>
      [
        `### ${heading}`,
        '',
        ...(keys ? [`Keys begin with \`${keys}\`.`, ''] : []),
        ...aligned(Object.entries(table).map(([name, parameter]) => row(name, parameter))),
      ].join('\n'),
    )
    .join('\n\n')
}

const begin = '<!-- parameters: begin -->'
const end = '<!-- parameters: end -->'

/** A page with what stands between its two marks replaced by the tables as they are now. */
export function withParameters(page: string): string {
  const from = page.indexOf(begin)
  const to = page.indexOf(end)
  if (from < 0 || to < from) throw new Error(`the page lacks ${begin} or ${end}`)
  return `${page.slice(0, from + begin.length)}\n\n${parameterTables()}\n\n${page.slice(to)}`
}
