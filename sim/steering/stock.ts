import { foilCentre } from '../foils/section'

/**
 * Moment of the water on the rudder about its stock, N m, positive when it would turn the tiller to starboard.
 *
 * @param normal force on the blade, N, positive to starboard
 * @param incidence rad
 * @param chord mean, m
 * @param balance part of the chord ahead of the stock
 * @source centre of pressure: Whicker & Fehlner 1958; mid-chord when stalled
 */
export function stockMoment(
  normal: number,
  incidence: number,
  chord: number,
  balance: number,
): number {
  return -normal * (foilCentre(incidence) - balance) * chord
}
