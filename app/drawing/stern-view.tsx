import { memo } from 'react'
import { clamp, direction, radians, tenth } from './frame'
import type { SternViewProps } from './types'

/** From astern, looking forward: how far she heels, with the water level. */
export function SternView({ plan, moment, measures, width, height, label }: SternViewProps) {
  const { hull, keel } = plan.boat
  const mastM = 0.62 * hull.lengthOverall
  const depthM = hull.canoeBodyDraught + keel.span
  const scale = Math.min((height - 26) / (mastM + depthM + 0.3), width / (mastM * 1.5))
  const waterY = tenth(height - 6 - depthM * scale * 1.04)
  const arcRadius = 0.86 * mastM * scale
  const heel = clamp(moment.heelDeg, -90, 90)
  const tip = direction(heel)
  const side = heel < 0 ? -1 : 1
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      className="block h-full w-full"
    >
      <g transform={`translate(${width / 2} ${waterY})`} className="fill-none stroke-ink">
        <path
          d={`M0 0V${tenth(-mastM * scale)}`}
          className="stroke-ink-pale"
          strokeDasharray="12 3 2 3"
          strokeWidth={0.9}
        />
        <path
          d={`M0 ${tenth(-arcRadius)}A${tenth(arcRadius)} ${tenth(arcRadius)} 0 0 ${side > 0 ? 1 : 0} ${tenth(arcRadius * tip.y)} ${tenth(-arcRadius * tip.x)}`}
          strokeWidth={1}
          className="stroke-ink-soft"
        />
        <g transform={`rotate(${tenth(heel)})`}>
          <Section plan={plan} scale={scale} mastM={mastM} depthM={depthM} />
        </g>
        <path
          d={`M${-width / 2 + 2} 0H${tenth(-hull.waterlineBeam * 0.62 * scale)}M${tenth(hull.waterlineBeam * 0.62 * scale)} 0H${width / 2 - 2}`}
          strokeWidth={1}
        />
        <path
          d={`M${-width / 2 + 14} 4h10M${-width / 2 + 18} 8h5M${width / 2 - 24} 4h10M${width / 2 - 22} 8h5`}
          strokeWidth={0.8}
          className="stroke-ink-pale"
        />
      </g>
      <text
        x={tenth(
          width / 2 + side * (arcRadius * Math.sin(radians(Math.min(45, Math.abs(heel)))) + 12),
        )}
        y={tenth(waterY - arcRadius - 4 + 16)}
        textAnchor={side > 0 ? 'start' : 'end'}
      >
        <tspan
          style={{ fontWeight: 600 }}
        >{`${measures.angle.format(Math.abs(moment.heelDeg))}°`}</tspan>
      </text>
    </svg>
  )
}

interface SectionProps {
  plan: SternViewProps['plan']
  scale: number
  mastM: number
  depthM: number
}

/** Midship section, keel by its kind, mast, and the lights of either side. */
const Section = memo(function Section({ plan, scale, mastM, depthM }: SectionProps) {
  const { hull, keel } = plan.boat
  const half = (hull.beamOverall / 2) * scale
  const water = (hull.waterlineBeam / 2) * scale
  const free = hull.freeboard * scale
  const body = hull.canoeBodyDraught * scale
  const deep = depthM * scale
  const root = keel.kind === 'long' ? 0.2 * half : 0.07 * half
  const n = tenth
  const starboard = `C${n(half * 1.02)} ${n(-free * 0.3)} ${n(water * 0.98)} ${n(body * 0.5)} ${n(root + water * 0.3)} ${n(body * 0.86)}`
  const port = `C${n(-water * 0.98)} ${n(body * 0.5)} ${n(-half * 1.02)} ${n(-free * 0.3)} ${n(-half)} ${n(-free)}`
  return (
    <g className="fill-deck stroke-ink" strokeWidth={1.5} strokeLinejoin="round">
      <path d={`M0 ${n(-free)}V${n(-mastM * scale)}`} strokeWidth={2} />
      <path
        d={`M${n(-half)} ${n(-free)}Q0 ${n(-free - 0.1 * half)} ${n(half)} ${n(-free)}${starboard}Q${n(root)} ${n(body)} ${n(root)} ${n(deep * 0.72)}L${n(root * 0.7)} ${n(deep)}H${n(-root * 0.7)}L${n(-root)} ${n(deep * 0.72)}Q${n(-root)} ${n(body)} ${n(-root - water * 0.3)} ${n(body * 0.86)}${port}Z`}
      />
      <circle cx={n(-half)} cy={n(-free - 3)} r={2.6} className="fill-port stroke-port" />
      <circle
        cx={n(half)}
        cy={n(-free - 3)}
        r={2.6}
        strokeWidth={1.4}
        className="fill-paper stroke-starboard"
      />
    </g>
  )
})
