import { cos, exp, hypot, sin } from '../elementary'
import { pullOverTension } from '../steering/deflected-part'
import type { ControlLine } from './control-line'

export interface LineSolver {
  /**
   * Tension of the line at the tiller, N, never negative.
   *
   * @param boom angle, rad, positive to starboard
   * @param delta rudder angle, rad
   * @param sheet tension of the part, N
   * @param friction state of the leads, +1 while the line runs from the tiller towards the sheet
   */
  tension(boom: number, delta: number, sheet: number, friction: number): number
  /** How much sheet the line gives to the boom beyond its nominal trim, m per part. */
  easedLength(boom: number, delta: number, sheet: number): number
  /** Where the last call left the hitch, m out of straight. */
  hitchOut: number
}

const ITERATIONS = 5
/** Rows of the table of sheet taken over the way of the hitch. */
const TAKEN_ROWS = 96

/** Undeflected hitch for one boom angle: ways to the held and the live end, unit way and distance to the first lead. */
function createHitch() {
  return {
    boom: Number.NaN,
    heldX: Number.NaN,
    heldY: Number.NaN,
    heldZ: Number.NaN,
    liveX: Number.NaN,
    liveY: Number.NaN,
    liveZ: Number.NaN,
    pullX: Number.NaN,
    pullY: Number.NaN,
    pullZ: Number.NaN,
    toLead: Number.NaN,
  }
}

/** The control line as a static chain: sheet part, hitch, leads with friction, stretch, tiller. */
export function createLineSolver(line: ControlLine): LineSolver {
  const hitch = createHitch()

  /** Places the undeflected hitch for a boom angle; asked twice in a row for the same, it is already there. */
  function place(boom: number): void {
    if (hitch.boom === boom) return
    hitch.boom = boom
    const boomX = line.luffX - line.reach * cos(boom)
    const boomY = line.reach * sin(boom)
    const hx = line.blockX + line.hitchShare * (boomX - line.blockX)
    const hy = line.blockY + line.hitchShare * (boomY - line.blockY)
    const hz = line.blockZ + line.hitchShare * (line.boomZ - line.blockZ)
    hitch.heldX = line.blockX - hx
    hitch.heldY = line.blockY - hy
    hitch.heldZ = line.blockZ - hz
    hitch.liveX = boomX - hx
    hitch.liveY = boomY - hy
    hitch.liveZ = line.boomZ - hz
    const dx = line.firstX - hx
    const dy = line.firstY - hy
    const dz = line.firstZ - hz
    hitch.toLead = hypot(dx, dy, dz)
    const inverse = hitch.toLead > 0 ? 1 / hitch.toLead : 0
    hitch.pullX = dx * inverse
    hitch.pullY = dy * inverse
    hitch.pullZ = dz * inverse
  }

  /** How far the tiller has gone towards the last lead since it was amidships, negative away, m. */
  function tillerGiven(delta: number): number {
    const dx = line.lastX - line.tillerRadius * cos(delta)
    const dy = line.lastY + line.tillerRadius * sin(delta)
    const dz = line.lastZ - line.tillerZ
    return line.leadToTillerAtRest - Math.sqrt(dx * dx + dy * dy + dz * dz)
  }

  function ratioAt(out: number): number {
    const x = out * hitch.pullX
    const y = out * hitch.pullY
    const z = out * hitch.pullZ
    return pullOverTension(
      hitch.heldX - x,
      hitch.heldY - y,
      hitch.heldZ - z,
      hitch.liveX - x,
      hitch.liveY - y,
      hitch.liveZ - z,
      hitch.pullX,
      hitch.pullY,
      hitch.pullZ,
    )
  }

  /** Solves out = slack - compliance T g(out) for the hitch; out of straight is never negative. */
  function solve(boom: number, delta: number, sheet: number, gain: number): number {
    place(boom)
    const limit = 0.97 * hitch.toLead
    const asked = line.takeUp + hitch.toLead - line.hitchToLeadAtRest - tillerGiven(delta)
    if (asked <= 0) return 0
    const free = Math.min(asked, limit)
    const compliance = sheet / (line.stiffness * gain)
    if (compliance === 0) return free
    let out = free
    let miss = compliance * ratioAt(out)
    let before = Math.max(out - miss, 0)
    let missBefore = before - free + compliance * ratioAt(before)
    for (let i = 0; i < ITERATIONS && Math.abs(missBefore) > 1e-9; i++) {
      const slope = (miss - missBefore) / (out - before)
      if (!(slope > 0.5)) break
      const next = before - missBefore / slope
      out = before
      miss = missBefore
      before = next < 0 ? 0 : Math.min(next, free)
      missBefore = before - free + compliance * ratioAt(before)
    }
    return before
  }

  // Work of the pull is work of the sheet: the sheet taken is the integral of F/T over the way of the hitch,
  // at the boom's angle as trimmed.
  place(line.boomAtRest)
  const farthest = 0.97 * hitch.toLead
  const integral = new Float64Array(line.tail ? 1 : TAKEN_ROWS + 1)
  for (let i = 1; i < integral.length; i++) {
    const low = ((i - 1) * farthest) / TAKEN_ROWS
    const high = (i * farthest) / TAKEN_ROWS
    const sum = ratioAt(low) + 4 * ratioAt((low + high) / 2) + ratioAt(high)
    integral[i] = (integral[i - 1] as number) + (sum * (high - low)) / 6
  }

  /** Sheet drawn out of the part by a hitch pulled out so far, m. */
  function taken(out: number): number {
    const place = (Math.min(out, farthest) / farthest) * TAKEN_ROWS
    const row = Math.min(Math.floor(place), TAKEN_ROWS - 1)
    const low = integral[row] as number
    return low + (place - row) * ((integral[row + 1] as number) - low)
  }
  const takenAtRest = line.tail ? 0 : taken(Math.max(line.takeUp, 0))

  const solver: LineSolver = {
    hitchOut: 0,
    tension(boom, delta, sheet, friction) {
      const gain = exp(line.exponent * friction)
      if (line.tail) {
        solver.hitchOut = 0
        return sheet / gain
      }
      const out = solve(boom, delta, sheet, gain)
      solver.hitchOut = out
      return out > 0 ? (sheet * ratioAt(out)) / gain : 0
    },
    easedLength(boom, delta, sheet) {
      if (line.tail) {
        return (tillerGiven(delta) - line.takeUp + sheet / line.stiffness) / line.parts
      }
      const out = solve(boom, delta, sheet, 1)
      return (takenAtRest - taken(out)) / line.parts
    },
  }
  return solver
}
