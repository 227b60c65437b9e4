import { memo } from 'react'
import type { Boat, HardwarePoint } from 'sim/plan/types'
import { clamp, deckPath, onPaper, type Point, tenth } from './frame'
import { type Cubic, type HullOutline, halfBreadthAt, hullOutline, mastX } from './hull-outline'

interface HullDrawingProps {
  boat: Boat
  /** Pixels per metre. */
  scale: number
}

function mirrored(point: Point): Point {
  return { x: point.x, y: -point.y }
}

function pair(point: Point, scale: number): string {
  const paper = onPaper(point, scale)
  return `${tenth(paper.x)} ${tenth(paper.y)}`
}

function curveTo(curve: Cubic, scale: number): string {
  return `C${pair(curve[1], scale)} ${pair(curve[2], scale)} ${pair(curve[3], scale)}`
}

/** Deck edge as one closed path, inset by a toe rail's width when asked. */
export function outlinePath(outline: HullOutline, scale: number): string {
  const [fore, aft] = outline.starboard
  const back = (curve: Cubic): Cubic => [
    mirrored(curve[3]),
    mirrored(curve[2]),
    mirrored(curve[1]),
    mirrored(curve[0]),
  ]
  return [
    `M${pair(outline.stem, scale)}`,
    curveTo(fore, scale),
    curveTo(aft, scale),
    `Q${pair({ x: 2 * outline.transomRound.x - outline.sternX, y: 0 }, scale)} ${pair(mirrored(aft[3]), scale)}`,
    curveTo(back(aft), scale),
    curveTo(back(fore), scale),
    'Z',
  ].join('')
}

/** Corners rounded at the fore end, square aft: coachroof and cockpit alike. */
function trunkPath(
  trunk: { aftX: number; foreX: number; aftHalf: number; foreHalf: number },
  scale: number,
  crown: number,
): string {
  const { aftX, foreX, aftHalf, foreHalf } = trunk
  return [
    `M${pair({ x: aftX, y: aftHalf }, scale)}`,
    `L${pair({ x: foreX - crown, y: foreHalf + 0.04 }, scale)}`,
    `Q${pair({ x: foreX + 0.02, y: foreHalf * 0.8 }, scale)} ${pair({ x: foreX + crown * 0.4, y: 0 }, scale)}`,
    `Q${pair({ x: foreX + 0.02, y: -foreHalf * 0.8 }, scale)} ${pair({ x: foreX - crown, y: -foreHalf - 0.04 }, scale)}`,
    `L${pair({ x: aftX, y: -aftHalf }, scale)}`,
    'Z',
  ].join('')
}

function box(aftX: number, foreX: number, aftHalf: number, foreHalf: number, scale: number) {
  const corners = [
    { x: aftX, y: aftHalf },
    { x: foreX, y: foreHalf },
    { x: foreX, y: -foreHalf },
    { x: aftX, y: -aftHalf },
  ]
  return `${deckPath(corners, scale)}Z`
}

/** Deck, coachroof, cockpit and what is bolted to them. Bow up, the rudder stock at the origin. */
export const HullDrawing = memo(function HullDrawing({ boat, scale }: HullDrawingProps) {
  const outline = hullOutline(boat)
  const { cockpit, roof, hatch } = outline
  const rail = 1 - 0.11 / outline.halfBeam
  const middle = onPaper({ x: outline.stem.x - boat.hull.lengthOverall / 2, y: 0 }, scale)
  const path = outlinePath(outline, scale)
  const mast = onPaper({ x: mastX(boat), y: 0 }, scale)
  const chainplate = halfBreadthAt(outline, mastX(boat) - 0.15) - 0.12
  return (
    <g className="fill-none stroke-ink">
      <path d={path} className="fill-deck" strokeWidth={1.75} strokeLinejoin="round" />
      <path
        d={path}
        strokeWidth={0.75}
        className="stroke-ink-pale"
        transform={`translate(0 ${tenth(middle.y * (1 - 0.985))}) scale(${rail} 0.985)`}
      />
      <path d={trunkPath(roof, scale, 0.5)} strokeWidth={1} className="fill-deck stroke-ink-soft" />
      <path
        d={box(cockpit.aftX, cockpit.foreX, cockpit.aftHalf, cockpit.foreHalf, scale)}
        strokeWidth={1}
        className="fill-paper stroke-ink-soft"
      />
      <path
        d={box(
          cockpit.aftX + 0.12,
          cockpit.foreX - 0.04,
          cockpit.aftHalf * 0.48,
          cockpit.foreHalf * 0.48,
          scale,
        )}
        strokeWidth={0.75}
        className="stroke-ink-pale"
      />
      <path
        d={box(roof.aftX, roof.aftX + 0.75, 0.32, 0.3, scale)}
        strokeWidth={0.75}
        className="stroke-ink-pale"
      />
      <path
        d={box(hatch.x - hatch.half, hatch.x + hatch.half, hatch.half, hatch.half * 0.9, scale)}
        strokeWidth={0.75}
        className="stroke-ink-pale"
      />
      {boat.hardware.map((point) => (
        <Fitting key={`${point.name} ${point.x} ${point.y}`} point={point} scale={scale} />
      ))}
      {[1, -1].map((side) => {
        const foot = onPaper({ x: mastX(boat) - 0.15, y: side * chainplate }, scale)
        return (
          <path
            key={side}
            d={`M${tenth(mast.x)} ${tenth(mast.y)}L${tenth(foot.x)} ${tenth(foot.y)}`}
            strokeWidth={0.6}
            className="stroke-ink-pale"
          />
        )
      })}
      <Sidelights outline={outline} scale={scale} />
    </g>
  )
})

/** Red and green where a boat carries them; the port one is filled, the starboard one open. */
function Sidelights({ outline, scale }: { outline: HullOutline; scale: number }) {
  const x = outline.stem.x - 0.075 * (outline.stem.x - outline.sternX)
  const half = halfBreadthAt(outline, x)
  const size = Math.max(2.2, 0.075 * scale)
  const port = onPaper({ x, y: -half }, scale)
  const starboard = onPaper({ x, y: half }, scale)
  return (
    <>
      <circle cx={port.x} cy={port.y} r={size} className="fill-port stroke-port" />
      <circle
        cx={starboard.x}
        cy={starboard.y}
        r={size}
        strokeWidth={1.5}
        className="fill-paper stroke-starboard"
      />
    </>
  )
}

function Fitting({ point, scale }: { point: HardwarePoint; scale: number }) {
  const { x, y } = onPaper(point, scale)
  const size = clamp(0.045 * scale, 1.4, 4)
  const at = `translate(${tenth(x)} ${tenth(y)})`
  switch (point.kind) {
    case 'winch':
      return (
        <g transform={at} strokeWidth={0.9} className="stroke-ink-soft">
          <circle r={size * 1.7} className="fill-cloth" />
          <circle r={size * 0.8} />
        </g>
      )
    case 'cleat':
      return (
        <path
          d={`M0 ${-size * 1.6}V${size * 1.6}M${-size * 0.6} 0H${size * 0.6}`}
          transform={at}
          strokeWidth={1.4}
          className="stroke-ink-soft"
        />
      )
    case 'toe-rail':
      return (
        <path
          d={`M0 ${-size * 2}V${size * 2}`}
          transform={at}
          strokeWidth={1.2}
          className="stroke-ink-soft"
        />
      )
    case 'block':
      return (
        <circle r={size} transform={at} strokeWidth={1} className="fill-cloth stroke-ink-soft" />
      )
    default:
      return <circle r={size * 0.7} transform={at} className="fill-ink-soft stroke-none" />
  }
}
