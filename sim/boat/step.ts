import { hypot } from '../elementary'
import type { Vessel } from './vessel'

/** Longest step, s; a run at half of it differs by less than its tolerance (see docs/model.md, numerics). */
const LONGEST = 0.05
/** Runge-Kutta 4 is stable up to |lambda| h = 2.8 on the imaginary axis; part of it is kept. */
const STABLE = 1.4

/**
 * Fixed step for a vessel, s: the longest one, halved until the fastest part (tiller against elastic, deflected
 * sheet, bearing friction) is resolved.
 *
 * @param sheetTension the largest sheet tension reckoned with, N
 */
export function stepFor(vessel: Vessel, sheetTension: number): number {
  const { line, rudder } = vessel
  const { elastic } = line
  const cord = (3.5 * elastic.area * elastic.modulus) / elastic.naturalLength
  const part = Math.max(
    hypot(line.blockX - (line.luffX - line.reach), line.blockY, line.blockZ - line.boomZ),
    0.1,
  )
  const share = line.hitchShare
  const bend = sheetTension / (part * Math.max(share * (1 - share), 0.01))
  const sheet = line.tail ? 0 : (bend * line.stiffness) / (bend + line.stiffness)
  const stiffness =
    cord * elastic.tillerRadius * elastic.tillerRadius +
    sheet * line.tillerRadius * line.tillerRadius +
    rudder.friction / 0.02
  const fastest = Math.max(Math.sqrt(stiffness / rudder.inertia), 22)
  let step = LONGEST
  while (step * fastest > STABLE && step > LONGEST / 64) step /= 2
  return step
}
