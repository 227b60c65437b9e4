import { memo, useId } from 'react'
import { direction, polyline, radians, tackOf, tenth } from './frame'
import { ghostDash } from './ghost-dash'
import { sampleAt } from './moment'
import { ScaleBar } from './scale-bar'
import type { Anchor, Run, Size, TrackChartProps } from './types'

interface ChartView {
  /** Pixels per metre. */
  scale: number
  place: (northM: number, eastM: number) => Anchor
  start: Anchor
}

const marginPx = 18

/** Turned so that the wind the run set out in comes from the top; large enough for all of it. */
function chartView(run: Run, { width, height }: Size): ChartView {
  const { northM, eastM, headingDeg, courseToWindDeg } = run.result.series
  const up = direction((headingDeg[0] ?? 0) + (courseToWindDeg[0] ?? 0))
  const turned = (north: number, east: number): Anchor => ({
    x: east * up.x - north * up.y,
    y: -(north * up.x + east * up.y),
  })
  let [left, right, top, bottom] = [0, 0, 0, 0]
  const origin = turned(northM[0] ?? 0, eastM[0] ?? 0)
  northM.forEach((north, index) => {
    const at = turned(north, eastM[index] ?? 0)
    left = Math.min(left, at.x - origin.x)
    right = Math.max(right, at.x - origin.x)
    top = Math.min(top, at.y - origin.y)
    bottom = Math.max(bottom, at.y - origin.y)
  })
  const roomX = width - 2 * marginPx
  const roomY = height - 2 * marginPx - 24
  const scale = Math.min(roomX / Math.max(20, right - left), roomY / Math.max(20, bottom - top))
  const offsetX = marginPx + (roomX - (right - left) * scale) / 2 - left * scale
  const offsetY = marginPx + (roomY - (bottom - top) * scale) / 2 - top * scale
  return {
    scale,
    start: { x: offsetX, y: offsetY },
    place: (north, east) => {
      const at = turned(north, east)
      return { x: offsetX + (at.x - origin.x) * scale, y: offsetY + (at.y - origin.y) * scale }
    },
  }
}

/** Her track over the whole run, with the water she should have stayed in from where she began. */
export function TrackChart(props: TrackChartProps) {
  const { run, moment, ghosts = [], measures, label, width, height } = props
  const clip = useId()
  const view = chartView(run, { width, height })
  const now = view.place(moment.northM, moment.eastM)
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      className="block h-full w-full"
    >
      <clipPath id={clip}>
        <rect width={width} height={height} />
      </clipPath>
      <g clipPath={`url(#${clip})`} className="fill-none">
        <Bearing run={run} width={width} height={height} />
        {ghosts.map((ghost) => (
          <path
            key={ghost.helm}
            d={trackPath(ghost.run, view, Number.POSITIVE_INFINITY)}
            className="stroke-ink-soft"
            strokeWidth={0.9}
            strokeDasharray={ghostDash[ghost.helm]}
          />
        ))}
        <path
          d={trackPath(run, view, Number.POSITIVE_INFINITY)}
          className="stroke-ink-pale"
          strokeWidth={1}
        />
        <path
          d={trackPath(run, view, moment.timeS)}
          className="stroke-ink"
          strokeWidth={1.75}
          strokeLinejoin="round"
        />
      </g>
      <path
        d="M0 -9L4.5 7Q0 4 -4.5 7Z"
        transform={`translate(${tenth(now.x)} ${tenth(now.y)}) rotate(${tenth(-moment.courseToWindDeg)})`}
        className="fill-ink stroke-paper"
        strokeWidth={1}
      />
      <ScaleBar
        x={4}
        y={height - 4}
        scale={view.scale}
        measure={measures.length}
        room={width / 2.6}
      />
    </svg>
  )
}

/** The sector of courses asked for, from the start. */
const Bearing = memo(function Bearing({ run, width, height }: Size & { run: Run }) {
  const { start } = chartView(run, { width, height })
  const { centreDeg, halfWidthDeg } = run.result.band
  const far = width + height
  const end = (courseDeg: number) => {
    const angle = radians(-courseDeg)
    return { x: start.x + far * Math.sin(angle), y: start.y - far * Math.cos(angle) }
  }
  const tack = tackOf(run.request.conditions)
  const edges = [end(centreDeg - tack * halfWidthDeg), end(centreDeg + tack * halfWidthDeg)]
  return (
    <>
      <path d={`${polyline([start, ...edges])}Z`} className="fill-band" />
      {edges.map((edge) => (
        <path
          key={edge.x}
          d={polyline([start, edge])}
          className="stroke-ink-soft"
          strokeWidth={1}
          strokeDasharray="1.5 5"
          strokeLinecap="round"
        />
      ))}
      <circle
        cx={start.x}
        cy={start.y}
        r={3}
        className="fill-paper stroke-ink"
        strokeWidth={1.25}
      />
    </>
  )
})

/** Every few seconds is fine enough at this scale. */
const everyS = 3

function trackPath(run: Run, view: ChartView, untilS: number): string {
  const { timeS, northM, eastM } = run.result.series
  const points: Anchor[] = []
  let due = Number.NEGATIVE_INFINITY
  timeS.forEach((time, index) => {
    if (time < due || time > untilS) return
    points.push(view.place(northM[index] ?? 0, eastM[index] ?? 0))
    due = time + everyS
  })
  if (Number.isFinite(untilS)) {
    const { index, part } = sampleAt(timeS, untilS)
    const along = (values: Float64Array) =>
      (values[index] ?? 0) +
      ((values[index + 1] ?? values[index] ?? 0) - (values[index] ?? 0)) * part
    points.push(view.place(along(northM), along(eastM)))
  }
  return polyline(points)
}
