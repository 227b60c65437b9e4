import type { Lead } from 'sim/plan/types'
import { tenth } from './frame'
import type { Anchor } from './types'

interface LeadSymbolProps {
  kind: Lead['kind']
  at: Anchor
  /** Way the line leaves the lead, degrees clockwise from the top. */
  turnDeg: number
  size?: number
  strong?: boolean
}

const balls = Array.from({ length: 8 }, (_, index) => {
  const angle = (index * Math.PI) / 4
  return { x: Math.cos(angle), y: Math.sin(angle) }
})

/** A lead by how it turns the line: sheave on balls, plain sheave, ring, bare edge. */
export function LeadSymbol({ kind, at, turnDeg, size = 9, strong = false }: LeadSymbolProps) {
  const place = `translate(${tenth(at.x)} ${tenth(at.y)}) rotate(${tenth(turnDeg)})`
  const width = strong ? 2.2 : 1.4
  if (kind === 'rub')
    return (
      <g transform={place} className="fill-none stroke-ink" strokeWidth={width}>
        <path d={`M${-size * 1.4} 0H${size * 1.4}`} strokeWidth={width + 1} />
        <path
          d={`M${-size} 0l-4 6M${-size / 3} 0l-4 6M${size / 3} 0l-4 6M${size} 0l-4 6`}
          strokeWidth={0.9}
        />
      </g>
    )
  if (kind === 'fairlead')
    return (
      <g transform={place} className="fill-paper stroke-ink" strokeWidth={width}>
        <circle r={size * 0.75} />
        <path d={`M${-size * 1.3} 0H${-size * 0.75}M${size * 0.75} 0H${size * 1.3}`} />
      </g>
    )
  return (
    <g transform={place} className="fill-paper stroke-ink" strokeWidth={width}>
      <path
        d={`M${-size * 0.55} ${-size * 0.5}L${-2} ${size * 1.5}H2L${size * 0.55} ${-size * 0.5}Z`}
        strokeLinejoin="round"
      />
      <circle r={size} />
      {kind === 'ball' ? (
        balls.map((ball) => (
          <circle
            key={`${ball.x} ${ball.y}`}
            cx={tenth(ball.x * size * 0.6)}
            cy={tenth(ball.y * size * 0.6)}
            r={size * 0.13}
            className="fill-ink stroke-none"
          />
        ))
      ) : (
        <circle r={size * 0.5} strokeWidth={0.9} />
      )}
      <circle r={size * 0.2} className="fill-ink stroke-none" />
    </g>
  )
}

/** Deck block of the sheet: a sheave seen from above. */
export function DeckBlock({ at, turnDeg }: { at: Anchor; turnDeg: number }) {
  return (
    <g
      transform={`translate(${tenth(at.x)} ${tenth(at.y)}) rotate(${tenth(turnDeg)})`}
      className="fill-cloth stroke-ink"
      strokeWidth={1.4}
    >
      <rect x={-4.5} y={-9} width={9} height={18} rx={4.5} />
      <path d="M-2 -6V6M2 -6V6" strokeWidth={0.9} />
    </g>
  )
}

/** Where a line is made fast: eye on a plate. */
export function MadeFast({ at, strong = false }: { at: Anchor; strong?: boolean }) {
  return (
    <g
      transform={`translate(${tenth(at.x)} ${tenth(at.y)})`}
      className="fill-cloth stroke-ink"
      strokeWidth={strong ? 2.2 : 1.4}
    >
      <rect x={-6} y={-6} width={12} height={12} />
      <circle r={2.6} />
    </g>
  )
}

/** A rolling hitch: turns of the control line round the sheet. */
export function HitchTurns({
  at,
  turnDeg,
  strong = false,
}: {
  at: Anchor
  turnDeg: number
  strong?: boolean
}) {
  return (
    <g
      transform={`translate(${tenth(at.x)} ${tenth(at.y)}) rotate(${tenth(turnDeg)})`}
      className="fill-none stroke-line"
      strokeLinecap="round"
      strokeWidth={strong ? 3.4 : 2.6}
    >
      <path d="M-5 -4.5L5 -7M-5 0.5L5 -2M-5 5.5L5 3" />
    </g>
  )
}
