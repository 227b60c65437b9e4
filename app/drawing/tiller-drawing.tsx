import type { Boat } from 'sim/plan/types'
import { onPaper, tenth } from './frame'
import type { RigGeometry } from './geometry'

interface TillerDrawingProps {
  boat: Boat
  rig: RigGeometry
  scale: number
}

/** Blade abaft the stock, dashed where the hull hides it; it trails opposite to the tiller. */
export function RudderBlade({ boat, rig, scale }: TillerDrawingProps) {
  const chord = boat.rudder.area / boat.rudder.span
  const { balance } = boat.rudder
  const half = Math.max(0.07 * chord, 1.5 / scale)
  const at = (along: number, across: number) => tillerAxis(rig, along * chord, scale, across)
  const hung = boat.rudder.kind === 'outboard'
  return (
    <path
      d={`M${at(balance, 0)}Q${at(balance - 0.05, half)} ${at(balance - 0.35, half)}L${at(balance - 1, 0)}L${at(balance - 0.35, -half)}Q${at(balance - 0.05, -half)} ${at(balance, 0)}Z`}
      className={hung ? 'fill-cloth stroke-ink' : 'fill-none stroke-ink-soft'}
      strokeWidth={1}
      strokeDasharray={hung ? undefined : '3 2'}
    />
  )
}

function tillerAxis(rig: RigGeometry, along: number, scale: number, across = 0): string {
  const length = Math.hypot(rig.tillerTip.x, rig.tillerTip.y) || 1
  const ux = rig.tillerTip.x / length
  const uy = rig.tillerTip.y / length
  const paper = onPaper({ x: ux * along - uy * across, y: uy * along + ux * across }, scale)
  return `${tenth(paper.x)} ${tenth(paper.y)}`
}

/** The tiller as a piece of wood: broad at the stock, a knob at the hand. */
export function Tiller({ boat, rig, scale }: TillerDrawingProps) {
  const { length } = boat.tiller
  const broad = Math.max(0.045, 2.2 / scale)
  const fine = Math.max(0.022, 1.2 / scale)
  const at = (along: number, across: number) => tillerAxis(rig, along, scale, across)
  return (
    <g
      className="fill-cloth stroke-ink"
      strokeWidth={scale > 60 ? 1.5 : 1.2}
      strokeLinejoin="round"
    >
      <path
        d={`M${at(-0.06, broad)}L${at(0.3 * length, broad)}Q${at(0.6 * length, fine)} ${at(0.9 * length, fine)}Q${at(length * 1.03, fine * 2.4)} ${at(length * 1.03, 0)}Q${at(length * 1.03, -fine * 2.4)} ${at(0.9 * length, -fine)}Q${at(0.6 * length, -fine)} ${at(0.3 * length, -broad)}L${at(-0.06, -broad)}Z`}
      />
      <circle r={Math.max(1.6, 0.028 * scale)} className="fill-ink stroke-none" />
    </g>
  )
}
