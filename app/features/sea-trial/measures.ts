import type { StoredUnit } from 'sim/parameters/define'
import type { Measure, Measures } from '~/drawing/types'
import { rounded, shownUnit, type Units } from '~/features/units/units'

function measure(stored: StoredUnit, units: Units, resolution: number): Measure {
  const { name, perStored } = shownUnit(stored, units, resolution)
  return {
    unit: name,
    factor: perStored,
    format: (value) => rounded(stored, value, units, resolution).figure,
  }
}

/** How the drawings show what they measure, in the visitor's units. */
export function measuresIn(units: Units): Measures {
  return {
    windSpeed: measure('kn', units, 1),
    boatSpeed: measure('kn', units, 0.1),
    angle: measure('deg', units, 1),
    force: measure('N', units, 1),
    length: measure('m', units, 1),
    travel: measure('m', units, 0.01),
  }
}
