import { memo } from 'react'
import { tenth } from './frame'
import type { Measure } from './types'

interface ScaleBarProps {
  x: number
  y: number
  /** Pixels per metre. */
  scale: number
  measure: Measure
  /** The bar is at most this long. */
  room: number
}

const roundLengths = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10000]

/** Four divisions, filled in turn, with the length of the whole bar in the visitor's unit. */
export const ScaleBar = memo(function ScaleBar({ x, y, scale, measure, room }: ScaleBarProps) {
  const perUnit = scale / measure.factor
  const shown = roundLengths.filter((length) => length * perUnit <= room).pop() ?? 0.1
  const long = shown * perUnit
  const division = long / 4
  return (
    <g transform={`translate(${x} ${y})`} className="fill-none stroke-ink">
      <rect x={0.5} y={-5} width={tenth(long)} height={5} strokeWidth={1} className="fill-paper" />
      <path
        d={`M0.5 -5h${tenth(division)}v5h${tenth(-division)}ZM${tenth(0.5 + 2 * division)} -5h${tenth(division)}v5h${tenth(-division)}Z`}
        className="fill-ink stroke-none"
      />
      <text x={0} y={-11} className="fill-ink-soft stroke-none">
        0
      </text>
      <text x={tenth(long)} y={-11} textAnchor="middle" className="fill-ink-soft stroke-none">
        {shown} {measure.unit}
      </text>
    </g>
  )
})
