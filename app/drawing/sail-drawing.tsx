import { memo } from 'react'
import { deckPath, onPaper, type Point, tenth } from './frame'
import type { SailShape } from './sail-shape'

interface SailDrawingProps {
  shape: SailShape
  scale: number
}

/** Cloth, its sections and its boom; the rope and the deck show through the cloth. */
export function SailDrawing({ shape, scale }: SailDrawingProps) {
  const [foot, ...upper] = shape.sections
  return (
    <g className="fill-none stroke-ink" strokeLinecap="round" strokeLinejoin="round">
      <path
        d={`${deckPath(shape.cloth, scale)}Z`}
        className="fill-cloth stroke-none"
        opacity={0.82}
      />
      <path
        d={upper.map((section) => deckPath(section, scale)).join('')}
        strokeWidth={0.75}
        className="stroke-ink-soft"
      />
      <path d={deckPath(shape.leech, scale)} strokeWidth={1} />
      {shape.boom && <Boom shape={shape} scale={scale} />}
      {foot && <path d={deckPath(foot, scale)} strokeWidth={1.9} />}
    </g>
  )
}

function Boom({ shape, scale }: SailDrawingProps) {
  if (!shape.boom) return null
  const path = deckPath(shape.boom, scale)
  const width = Math.max(3, 0.1 * scale)
  return (
    <>
      <path d={path} strokeWidth={width} />
      <path d={path} strokeWidth={width - 2} className="stroke-paper" />
    </>
  )
}

/** Mast section, fore and aft longer than athwart. */
export const Mast = memo(function Mast({ x, scale }: { x: number; scale: number }) {
  const at = onPaper({ x, y: 0 }, scale)
  return (
    <ellipse
      cx={tenth(at.x)}
      cy={tenth(at.y)}
      rx={Math.max(2, 0.06 * scale)}
      ry={Math.max(2.8, 0.085 * scale)}
      className="fill-ink stroke-paper"
      strokeWidth={0.75}
    />
  )
})

interface HeldProps {
  /** From where to where on deck. */
  from: Point
  to: Point
  scale: number
}

/** A pole from the mast to a clew held to windward. */
export function Pole({ from, to, scale }: HeldProps) {
  const path = deckPath([from, to], scale)
  return (
    <g className="fill-none stroke-ink" strokeLinecap="round">
      <path d={path} strokeWidth={3} />
      <path d={path} strokeWidth={1.2} className="stroke-paper" />
    </g>
  )
}

/** A preventer from the boom to the rail ahead of it. */
export function Preventer({ from, to, scale }: HeldProps) {
  return (
    <path
      d={deckPath([from, to], scale)}
      className="fill-none stroke-ink"
      strokeWidth={1}
      strokeDasharray="5 2"
    />
  )
}
