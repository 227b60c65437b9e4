import { tenth } from './frame'

interface WindArrowProps {
  /** Where the arrow points to. */
  tipX: number
  tipY: number
  /** Degrees clockwise from the top of the sheet that the wind comes from. */
  fromDeg: number
  length: number
  kind: 'true' | 'apparent'
}

/** True wind: a broad shaft of three strokes. Apparent wind: one thin stroke. */
export function WindArrow({ tipX, tipY, fromDeg, length, kind }: WindArrowProps) {
  const heavy = kind === 'true'
  const head = heavy ? 13 : 9
  const long = tenth(length)
  return (
    <g
      transform={`translate(${tenth(tipX)} ${tenth(tipY)}) rotate(${tenth(fromDeg)})`}
      className={heavy ? 'fill-ink stroke-ink' : 'fill-ink-soft stroke-ink-soft'}
      strokeLinecap="round"
    >
      <path
        d={heavy ? `M-3.5 ${-head}V${-long}M3.5 ${-head}V${-long}` : `M0 ${-head}V${-long}`}
        strokeWidth={heavy ? 1.75 : 1.1}
        fill="none"
      />
      <path
        d={heavy ? `M0 0L${head * 0.62} ${-head}H${-head * 0.62}Z` : `M0 0L3.6 ${-head}H-3.6Z`}
        stroke="none"
      />
    </g>
  )
}
