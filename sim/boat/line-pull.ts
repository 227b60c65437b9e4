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

/** The control line as a static chain: sheet part, hitch, leads with friction, stretch, tiller. */
export function createLineSolver(line: ControlLine): LineSolver {
  let ax = 0
  let ay = 0
  let az = 0
  let bx = 0
  let by = 0
  let bz = 0
  let ex = 0
  let ey = 0
  let ez = 0
  let hitchToLead = 0

  /** Places the undeflected hitch for a boom angle. */
  function place(boom: number): void {
    const boomX = line.luffX - line.reach * Math.cos(boom)
    const boomY = line.reach * Math.sin(boom)
    const hx = line.blockX + line.hitchShare * (boomX - line.blockX)
    const hy = line.blockY + line.hitchShare * (boomY - line.blockY)
    const hz = line.blockZ + line.hitchShare * (line.boomZ - line.blockZ)
    ax = line.blockX - hx
    ay = line.blockY - hy
    az = line.blockZ - hz
    bx = boomX - hx
    by = boomY - hy
    bz = line.boomZ - hz
    ex = line.firstX - hx
    ey = line.firstY - hy
    ez = line.firstZ - hz
    hitchToLead = Math.sqrt(ex * ex + ey * ey + ez * ez)
    const inverse = hitchToLead > 0 ? 1 / hitchToLead : 0
    ex *= inverse
    ey *= inverse
    ez *= inverse
  }

  /** How far the tiller has gone towards the last lead since it was amidships, negative away, m. */
  function tillerGiven(delta: number): number {
    const dx = line.lastX - line.tillerRadius * Math.cos(delta)
    const dy = line.lastY + line.tillerRadius * Math.sin(delta)
    const dz = line.lastZ - line.tillerZ
    return line.leadToTillerAtRest - Math.sqrt(dx * dx + dy * dy + dz * dz)
  }

  function ratioAt(out: number): number {
    const x = out * ex
    const y = out * ey
    const z = out * ez
    return pullOverTension(ax - x, ay - y, az - z, bx - x, by - y, bz - z, ex, ey, ez)
  }

  /** Solves out = slack - compliance T g(out) for the hitch; out of straight is never negative. */
  function solve(boom: number, delta: number, sheet: number, gain: number): number {
    place(boom)
    const limit = 0.97 * hitchToLead
    const asked = line.takeUp + hitchToLead - line.hitchToLeadAtRest - tillerGiven(delta)
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

  const solver: LineSolver = {
    hitchOut: 0,
    tension(boom, delta, sheet, friction) {
      const gain = Math.exp(line.exponent * friction)
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
      const x = out * ex
      const y = out * ey
      const z = out * ez
      const held = Math.sqrt((ax - x) ** 2 + (ay - y) ** 2 + (az - z) ** 2)
      const live = Math.sqrt((bx - x) ** 2 + (by - y) ** 2 + (bz - z) ** 2)
      const straight =
        Math.sqrt(ax * ax + ay * ay + az * az) + Math.sqrt(bx * bx + by * by + bz * bz)
      return -(held + live - straight - line.pathExtraAtRest) / line.parts
    },
  }
  return solver
}
