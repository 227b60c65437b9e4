import { sin } from '../elementary'

/**
 * Righting arm, m: (GM phi_v/pi) sin(pi phi/phi_v). Slope GM upright, zero at the vanishing angle phi_v,
 * highest half way there.
 *
 * @param heel rad
 * @param metacentricHeight GM, m
 * @param vanishing phi_v, rad
 * @source shape fitted to published cruising-yacht curves (largest near 65 degrees, vanishing near 130)
 */
export function rightingArm(heel: number, metacentricHeight: number, vanishing: number): number {
  return ((metacentricHeight * vanishing) / Math.PI) * sin((Math.PI * heel) / vanishing)
}
