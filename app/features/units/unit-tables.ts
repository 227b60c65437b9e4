import { create, createUnitDependencies, unitDependencies } from 'mathjs'
import type { StoredUnit } from 'sim/parameters/define'
import type { Entry } from '~/ui/types'
import type { Term } from './entry'

const tables = create({ ...unitDependencies, ...createUnitDependencies })
tables.createUnit('knot', '0.514444444444444444 m/s')
tables.createUnit('mileperhour', '0.44704 m/s')

/** For each stored unit: its name in the tables, what it measures, and units people write for it. */
const measures: Record<
  StoredUnit,
  { unit: string; kind: string; use: string; also?: Record<string, string> }
> = {
  m: { unit: 'm', kind: 'a length', use: 'm, cm, mm, ft or in' },
  mm: { unit: 'mm', kind: 'a length', use: 'mm, cm or in' },
  m2: {
    unit: 'm^2',
    kind: 'an area',
    use: 'm² or ft²',
    also: { 'm²': 'm^2', 'ft²': 'ft^2', ft2: 'ft^2' },
  },
  kg: { unit: 'kg', kind: 'a mass', use: 'kg, t or lb', also: { t: 'tonne' } },
  kgm2: {
    unit: 'kg m^2',
    kind: 'a moment of inertia',
    use: 'kg m²',
    also: { 'kg m²': 'kg m^2', 'kg m2': 'kg m^2' },
  },
  deg: { unit: 'deg', kind: 'an angle', use: '°', also: { '°': 'deg' } },
  kn: {
    unit: 'knot',
    kind: 'a speed',
    use: 'kn, m/s, km/h or mph',
    also: { kn: 'knot', kt: 'knot', kts: 'knot', knots: 'knot', mph: 'mileperhour' },
  },
  s: { unit: 's', kind: 'a time', use: 's or min' },
  N: { unit: 'N', kind: 'a force', use: 'N, kgf or lbf', also: { kp: 'kgf', dan: 'daN' } },
  Nm: {
    unit: 'N m',
    kind: 'a moment',
    use: 'N m, kgf m or lbf ft',
    also: { nm: 'N m', kgfm: 'kgf m', 'ft lbf': 'lbf ft', 'ft lb': 'lbf ft' },
  },
  MPa: { unit: 'MPa', kind: 'a stress', use: 'MPa or psi' },
  '%': { unit: '%', kind: 'a share', use: '%' },
  '1': { unit: '', kind: 'a plain number', use: 'no unit, or %' },
}

const marks = { "'": 'ft', '"': 'in' }

/** One term in the stored unit, or a message that names the unit and those that would do. */
export function convert(term: Term, stored: StoredUnit): Entry {
  const { unit, kind, use, also } = measures[stored]
  if (stored === '1' || stored === '%') {
    if (term.unit === '%') {
      return { ok: true, value: stored === '1' ? term.amount / 100 : term.amount }
    }
    return refused(term.unit, kind, use)
  }
  const aliases = { ...marks, ...also }
  const written = own(aliases, term.unit) ?? own(aliases, term.unit.toLowerCase()) ?? term.unit
  for (const name of [written, written.toLowerCase()]) {
    try {
      return { ok: true, value: tables.unit(term.amount, name).toNumber(unit) }
    } catch (error) {
      // The tables throw for a unit they do not have and for one of another kind.
      if (!(error instanceof Error)) throw error
    }
  }
  return refused(term.unit, kind, use)
}

function own(table: Record<string, string>, key: string): string | undefined {
  return Object.hasOwn(table, key) ? table[key] : undefined
}

function refused(unit: string, kind: string, use: string): Entry {
  return { ok: false, message: `“${unit}” is not ${kind} here. Use ${use}.` }
}
