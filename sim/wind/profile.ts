import { log } from '../elementary'

/**
 * Mean wind over the sea at height z over that at 10 m: U(z)/U0 = 1 + C ln(z/10),
 * C = .0573 sqrt(1 + .15 U0).
 *
 * @param z height, m; held at .5 m below that
 * @param windAt10 hourly mean at 10 m, m/s
 * @source Froya profile, ISO 19901-1
 */
export function windProfile(z: number, windAt10: number): number {
  const slope = 0.0573 * Math.sqrt(1 + 0.15 * windAt10)
  return 1 + slope * log(Math.max(z, 0.5) / 10)
}
