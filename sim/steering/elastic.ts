/** Working extension of jacketed cord over its slack length; chandlery texts, weak. */
const WORKING_EXTENSION = 1
/** Stiffness of the jacket once it locks, over that of the rubber at rest (estimate). */
const LOCK_UP = 12

/**
 * Pull of an elastic, N: rubber as A G (l - l^-2), and the jacket's own stiffness beyond the working extension.
 *
 * @param extension m; slack when negative
 * @param naturalLength m
 * @param area whole cross-section of all parts, m^2
 * @param modulus shear modulus G on that area, Pa
 * @source neo-Hookean rubber, Treloar, The Physics of Rubber Elasticity
 */
export function elasticPull(
  extension: number,
  naturalLength: number,
  area: number,
  modulus: number,
): number {
  if (extension <= 0) return 0
  const stretch = 1 + extension / naturalLength
  const over = stretch - 1 - WORKING_EXTENSION
  const jacket = over > 0 ? LOCK_UP * over * over : 0
  return area * modulus * (stretch - 1 / (stretch * stretch) + jacket)
}
