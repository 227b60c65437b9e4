export type RopeMaterial = 'polyester' | 'hmpe'

/**
 * Breaking load over the square of the diameter, N/mm^2, and stretch at a fifth of it.
 * Stretch: double-braid polyester 1.7 %, HMPE .70 % at 20 % of breaking load (makers' tables, from memory);
 * breaking load: usual for new line, estimate.
 */
const ROPE = {
  polyester: { breaking: 240, stretch: 0.017 },
  hmpe: { breaking: 420, stretch: 0.007 },
} as const

/** What a line bears and how much it gives. */
export interface RopeStrength {
  /** N */
  breakingLoad: number
  /** EA, N */
  axialStiffness: number
}

/** Strength and stiffness of new line from its diameter in mm. */
export function ropeStrength(diameterMm: number, material: RopeMaterial): RopeStrength {
  const { breaking, stretch } = ROPE[material]
  const breakingLoad = breaking * diameterMm * diameterMm
  return { breakingLoad, axialStiffness: (0.2 * breakingLoad) / stretch }
}
