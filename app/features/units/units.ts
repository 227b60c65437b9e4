import type { StoredUnit } from 'sim/parameters/define'

/** What each person chooses; documents keep the stored unit whatever is shown. */
export interface Units {
  speed: 'kn' | 'm/s'
  length: 'metric' | 'imperial'
  force: 'N' | 'kgf' | 'lbf'
}

export const unitChoices = {
  speed: { label: 'Speeds', options: { kn: 'Knots', 'm/s': 'Metres a second' } },
  length: { label: 'Lengths', options: { metric: 'Metric', imperial: 'Imperial' } },
  force: {
    label: 'Forces',
    options: { N: 'Newtons', kgf: 'Kilograms-force', lbf: 'Pounds-force' },
  },
} as const satisfies {
  [Kind in keyof Units]: { label: string; options: Record<Units[Kind], string> }
}

export const defaultUnits: Units = { speed: 'kn', length: 'metric', force: 'N' }

/** A unit as shown: its name and how many of it make one of the stored unit. */
export interface ShownUnit {
  readonly name: string
  readonly perStored: number
}

const KNOT = 1852 / 3600
const INCH = 0.0254
const FOOT = 0.3048
const POUND = 0.45359237
const G = 9.80665

const forces: Record<Units['force'], { force: ShownUnit; moment: ShownUnit }> = {
  N: { force: { name: 'N', perStored: 1 }, moment: { name: 'N m', perStored: 1 } },
  kgf: { force: { name: 'kgf', perStored: 1 / G }, moment: { name: 'kgf m', perStored: 1 / G } },
  lbf: {
    force: { name: 'lbf', perStored: 1 / (POUND * G) },
    moment: { name: 'lbf ft', perStored: 1 / (POUND * G * FOOT) },
  },
}

/** Below this step a length in metres is one a hand adjusts, read in centimetres or inches. */
const HAND_STEP_M = 0.05

/** The unit in which a value stored in `unit`, adjusted in steps of `step`, is shown. */
export function shownUnit(unit: StoredUnit, units: Units, step = 1): ShownUnit {
  const imperial = units.length === 'imperial'
  switch (unit) {
    case 'm':
      if (step < HAND_STEP_M) {
        return imperial ? { name: 'in', perStored: 1 / INCH } : { name: 'cm', perStored: 100 }
      }
      return imperial ? { name: 'ft', perStored: 1 / FOOT } : { name: 'm', perStored: 1 }
    case 'm2':
      return imperial ? { name: 'ft²', perStored: 1 / FOOT ** 2 } : { name: 'm²', perStored: 1 }
    case 'mm':
      return imperial ? { name: 'in', perStored: 0.001 / INCH } : { name: 'mm', perStored: 1 }
    case 'kg':
      return imperial ? { name: 'lb', perStored: 1 / POUND } : { name: 'kg', perStored: 1 }
    case 'kgm2':
      return { name: 'kg m²', perStored: 1 }
    case 'kn':
      return units.speed === 'm/s' ? { name: 'm/s', perStored: KNOT } : { name: 'kn', perStored: 1 }
    case 'N':
      return forces[units.force].force
    case 'Nm':
      return forces[units.force].moment
    case 'deg':
      return { name: '°', perStored: 1 }
    case '1':
      return { name: '', perStored: 1 }
    default:
      return { name: unit, perStored: 1 }
  }
}

const spoken: Record<string, string> = {
  kn: 'knots',
  'm/s': 'metres a second',
  cm: 'centimetres',
  mm: 'millimetres',
  m: 'metres',
  in: 'inches',
  ft: 'feet',
  'm²': 'square metres',
  'ft²': 'square feet',
  kg: 'kilograms',
  lb: 'pounds',
  'kg m²': 'kilogram square metres',
  N: 'newtons',
  kgf: 'kilograms-force',
  lbf: 'pounds-force',
  'N m': 'newton metres',
  'kgf m': 'kilogram-force metres',
  'lbf ft': 'pound-force feet',
  '°': 'degrees',
  s: 'seconds',
  MPa: 'megapascals',
  '%': 'per cent',
}

/** A unit as it is read aloud. */
export function spokenUnit(unit: string): string {
  return spoken[unit] ?? unit
}

/** A number and its unit, apart, so that a page can set the unit smaller. */
export interface Reading {
  readonly figure: string
  readonly unit: string
}

/**
 * How a stored value reads: as many decimals as its step needs, up to two more when that shows it
 * exactly, so that a typed 8.5 does not turn into 9 and a converted one does not run on.
 */
export function reading(unit: StoredUnit, value: number, units: Units, step = 1): Reading {
  const shown = shownUnit(unit, units, step)
  const amount = value * shown.perStored
  const fewest = decimalsOf(step * shown.perStored)
  for (let decimals = fewest; decimals <= fewest + 2; decimals++) {
    const figure = fixed(amount, decimals)
    if (Math.abs(Number(figure) - amount) < 1e-9 * Math.max(1, Math.abs(amount))) {
      return { figure, unit: shown.name }
    }
  }
  const converted = shown.perStored !== 1 && shown.perStored !== 100
  return { figure: fixed(amount, converted ? fewest : fewest + 2), unit: shown.name }
}

/** The same for a computed value, which has a resolution worth reading and no exact form. */
export function rounded(unit: StoredUnit, value: number, units: Units, resolution = 1): Reading {
  const shown = shownUnit(unit, units, resolution)
  return {
    figure: fixed(value * shown.perStored, decimalsOf(resolution * shown.perStored)),
    unit: shown.name,
  }
}

/** A reading on one line: "12.0 kn", "62°". */
export function inWords({ figure, unit }: Reading): string {
  return unit === '' || unit === '°' ? `${figure}${unit}` : `${figure} ${unit}`
}

function decimalsOf(step: number): number {
  return Math.min(4, Math.max(0, Math.ceil(-Math.log10(step) - 1e-9)))
}

function fixed(amount: number, decimals: number): string {
  const text = amount.toFixed(decimals)
  return Number(text) === 0 ? text.replace('-', '') : text
}
