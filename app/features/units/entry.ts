import type { StoredUnit } from 'sim/parameters/define'
import type { Entry } from '~/ui/types'
import type { ShownUnit } from './units'

export interface Term {
  amount: number
  /** As typed; empty where a bare number was given. */
  unit: string
}

const NUMBER = /\d+\s+\d+\s*\/\s*\d+|\d+\s*\/\s*\d+|(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:e[+-]?\d+)?/
const UNIT = /['"°%]|[a-zµ]+[a-z0-9^*/²·]*(?:\s+[a-z]+[a-z0-9^*/²]*)*/
const TERM = new RegExp(`\\s*(${NUMBER.source})\\s*(${UNIT.source})?\\s*`, 'iy')

/** Splits "1 ft 3 1/2 in" into its terms; null where the text is no sum of numbers with units. */
export function termsOf(text: string): { terms: Term[]; sign: 1 | -1 } | null {
  const plain = text
    .replace(/(\d)\s*([¼½¾⅐-⅞])/g, '$1 $2')
    .normalize('NFKC')
    .replaceAll('⁄', '/')
    .replaceAll(/[′’]/g, "'")
    .replaceAll(/[″”]/g, '"')
    .replaceAll('−', '-')
    .trim()
  const sign = plain.startsWith('-') ? -1 : 1
  const body = plain.replace(/^[+-]\s*/, '')
  const terms: Term[] = []
  TERM.lastIndex = 0
  while (TERM.lastIndex < body.length) {
    const found = TERM.exec(body)
    if (!found) return null
    const amount = amountOf(found[1] ?? '')
    if (!Number.isFinite(amount)) return null
    terms.push({ amount, unit: found[2] ?? '' })
  }
  const bare = terms.filter((term) => term.unit === '').length
  return terms.length === 0 || (bare > 0 && terms.length > 1) ? null : { terms, sign }
}

function amountOf(text: string): number {
  const [first = '', second] = text.trim().split(/\s+(?=\d)/)
  if (second?.includes('/') && !first.includes('/')) return amountOf(first) + amountOf(second)
  const [over = '', under] = text.split('/')
  return under === undefined ? Number(over.trim().replace(',', '.')) : Number(over) / Number(under)
}

/**
 * Reads an entry. A bare number is in the unit shown; anything with a unit of its own is converted
 * by the unit tables, which are fetched only then.
 */
export async function readEntry(
  text: string,
  stored: StoredUnit,
  shown: ShownUnit,
): Promise<Entry> {
  if (text.trim() === '') return { ok: false, message: 'Nothing entered.' }
  const parsed = termsOf(text)
  if (!parsed) {
    const example = shown.name === '' || shown.name === '°' ? '12' : `12 ${shown.name}`
    return {
      ok: false,
      message: `“${text.trim()}” is no number with a unit. Write it as ${example}.`,
    }
  }
  const { terms, sign } = parsed
  const [only] = terms
  if (terms.length === 1 && only && (only.unit === '' || only.unit === shown.name)) {
    return { ok: true, value: settled((sign * only.amount) / shown.perStored) }
  }
  const { convert } = await import('./unit-tables')
  let total = 0
  for (const term of terms) {
    const converted = convert(term, stored)
    if (!converted.ok) return converted
    total += converted.value
  }
  return { ok: true, value: settled(sign * total) }
}

/** Nine figures: enough for any unit to come back as typed, short enough for an address. */
function settled(value: number): number {
  return Number(value.toPrecision(9))
}
