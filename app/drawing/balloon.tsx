import { tenth } from './frame'
import type { Anchor } from './types'

interface BalloonProps {
  /** The part itself. */
  part: Anchor
  /** Centre of the circled number. */
  at: Anchor
  text: string
  strong?: boolean
}

export const balloonRadius = 11

/** A circled part number with its leader line. */
export function Balloon({ part, at, text, strong = false }: BalloonProps) {
  const length = Math.hypot(part.x - at.x, part.y - at.y)
  const reach = length > balloonRadius ? balloonRadius / length : 0
  const startX = at.x + (part.x - at.x) * reach
  const startY = at.y + (part.y - at.y) * reach
  return (
    <g className="fill-none stroke-ink-soft" strokeWidth={strong ? 1.5 : 0.9}>
      {reach > 0 && (
        <>
          <path d={`M${tenth(startX)} ${tenth(startY)}L${tenth(part.x)} ${tenth(part.y)}`} />
          <circle cx={tenth(part.x)} cy={tenth(part.y)} r={1.8} className="fill-ink stroke-none" />
        </>
      )}
      <circle
        cx={tenth(at.x)}
        cy={tenth(at.y)}
        r={balloonRadius}
        className={strong ? 'fill-ink' : 'fill-paper'}
      />
      <text
        x={tenth(at.x)}
        y={tenth(at.y + 5)}
        textAnchor="middle"
        className={strong ? 'fill-paper stroke-none' : 'fill-ink stroke-none'}
      >
        {text}
      </text>
    </g>
  )
}
