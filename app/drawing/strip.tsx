import { memo, type PointerEvent, useId, useMemo } from 'react'
import { judgingParameters } from 'sim/parameters/judging'
import { clock } from './clock'
import { tackOf, tenth } from './frame'
import { ghostDash } from './ghost-dash'
import { sampleAt } from './moment'
import { flagsOf, spread } from './strip-labels'
import {
  flagRow,
  type Panel,
  type StripLayout,
  stripLayout,
  type Trace,
  timeAt,
  tracesOf,
} from './strip-scales'
import { straight, tracePath } from './trace-path'
import type { Ghost, Measures, Run, StripProps } from './types'

const noGhosts: readonly Ghost[] = []

/** Ten minutes on one time axis; what is past in full ink, what is to come pale. */
export function Strip(props: StripProps) {
  const { run, ghosts = noGhosts, cursorS, measures, label, width, height, onScrub } = props
  const id = useId()
  const layout = useMemo(
    () => stripLayout(run, measures, { width, height }),
    [run, measures, width, height],
  )
  const names = useMemo(
    () => layout.panels.map((panel) => namesOn(panel, ghosts, measures)),
    [layout, ghosts, measures],
  )
  const paths = useMemo(
    () =>
      layout.panels.map((panel) => panel.traces.map((trace) => pathOn(run, layout, panel, trace))),
    [run, layout],
  )
  const cursor = tenth(layout.x(cursorS))

  function scrub(event: PointerEvent<SVGSVGElement>) {
    if (!onScrub || (event.type === 'pointermove' && event.buttons === 0)) return
    if (event.type === 'pointerdown') event.currentTarget.setPointerCapture(event.pointerId)
    const box = event.currentTarget.getBoundingClientRect()
    const x = ((event.clientX - box.left) / box.width) * width
    onScrub(timeAt(layout, x, run.request.durationS))
  }

  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      className={`block h-full w-full touch-pan-y select-none ${onScrub ? 'cursor-ew-resize' : ''}`}
      onPointerDown={scrub}
      onPointerMove={scrub}
    >
      <clipPath id={`${id}-past`}>
        <rect x={0} y={0} width={cursor} height={height} />
      </clipPath>
      <clipPath id={`${id}-future`}>
        <rect x={cursor} y={0} width={Math.max(0, width - cursor)} height={height} />
      </clipPath>
      <Ground run={run} layout={layout} clip={`${id}-plot`} />
      <Ghosts run={run} ghosts={ghosts} measures={measures} layout={layout} clip={`${id}-plot`} />
      <g clipPath={`url(#${id}-future)`}>
        <Traces layout={layout} paths={paths} clip={`${id}-plot`} past={false} />
      </g>
      <g clipPath={`url(#${id}-past)`}>
        <Traces layout={layout} paths={paths} clip={`${id}-plot`} past />
      </g>
      <EndNames layout={layout} names={names} />
      <Cursor run={run} cursorS={cursorS} width={width} layout={layout} names={names} />
    </svg>
  )
}

interface LayerProps {
  run: Run
  layout: StripLayout
  clip: string
}

/** Band, axes, ticks, titles and flags: still while playing. */
const Ground = memo(function Ground({ run, layout, clip }: LayerProps) {
  const { left, right, bottom, panels, narrow, x } = layout
  return (
    <g>
      {panels.map((panel) => (
        <clipPath key={panel.plot} id={`${clip}-${panel.plot}`}>
          <rect
            x={left}
            y={panel.top - 1}
            width={right - left}
            height={panel.bottom - panel.top + 2}
          />
        </clipPath>
      ))}
      <CourseBand run={run} layout={layout} />
      {panels.map((panel) => (
        <g key={panel.plot}>
          <path
            d={panel.ticks.map((tick) => `M${left} ${tenth(panel.y(tick))}H${right}`).join('')}
            className="fill-none stroke-hair"
            strokeWidth={0.75}
          />
          {panel.ticks.map((tick) => (
            <text
              key={tick}
              x={left - 7}
              y={tenth(panel.y(tick)) + 5}
              textAnchor="end"
              className="fill-ink-soft"
            >
              {panel.figure(tick)}
            </text>
          ))}
          <text
            x={left}
            y={panel.top - 5}
            className="fill-ink-soft stroke-paper [paint-order:stroke]"
            strokeWidth={4}
          >
            {narrow ? panel.shortTitle : panel.title}
          </text>
        </g>
      ))}
      <TimeAxis durationS={run.request.durationS} layout={layout} />
      <Flags run={run} layout={layout} />
      <path
        d={`M${tenth(x(0))} ${bottom}H${tenth(right)}`}
        className="fill-none stroke-ink"
        strokeWidth={1}
      />
    </g>
  )
})

/** The band matters most and is drawn first; it begins where the run begins to be judged. */
function CourseBand({ run, layout }: { run: Run; layout: StripLayout }) {
  const panel = layout.panels.find(({ plot }) => plot === 'course')
  if (!panel) return null
  const { factor } = panel.measure
  const centre = tackOf(run.request.conditions) * run.result.band.centreDeg
  const { halfWidthDeg } = run.result.band
  const high = tenth(panel.y((centre - halfWidthDeg) * factor))
  const low = tenth(panel.y((centre + halfWidthDeg) * factor))
  const from = tenth(layout.x(Math.min(judgingParameters.unjudgedS.default, run.request.durationS)))
  return (
    <g>
      <rect
        x={from}
        y={high}
        width={Math.max(0, layout.right - from)}
        height={low - high}
        className="fill-band"
      />
      <path
        d={`M${from} ${high}H${layout.right}M${from} ${low}H${layout.right}`}
        className="fill-none stroke-ink-soft"
        strokeWidth={1}
        strokeDasharray="1.5 5"
        strokeLinecap="round"
      />
      <path d={`M${from} ${high}V${low}`} className="stroke-ink" strokeWidth={4} />
    </g>
  )
}

const minuteSteps = [1, 2, 5, 10, 20, 30, 60]

function TimeAxis({ durationS, layout }: { durationS: number; layout: StripLayout }) {
  const { x, bottom, narrow } = layout
  const minutes = durationS / 60
  const perMinute = x(60) - x(0)
  const step = minuteSteps.find((candidate) => candidate * perMinute >= 38) ?? 120
  const marks = Array.from({ length: Math.floor(minutes / step) + 1 }, (_, index) => index * step)
  return (
    <g>
      <path
        d={marks.map((minute) => `M${tenth(x(60 * minute))} ${bottom}v5`).join('')}
        className="stroke-ink"
        strokeWidth={1}
      />
      {marks.map((minute) => (
        <text
          key={minute}
          x={tenth(x(60 * minute))}
          y={bottom + 19}
          textAnchor="middle"
          className="fill-ink-soft"
        >
          {minute}
        </text>
      ))}
      <text x={layout.right + 14} y={bottom + 19} className="fill-ink-soft">
        {narrow ? 'min' : 'minutes'}
      </text>
    </g>
  )
}

function Flags({ run, layout }: { run: Run; layout: StripLayout }) {
  const { x, right, bottom } = layout
  return flagsOf(run.result.happenings, x, right + 60).map((flag, index) => {
    const at = tenth(flag.x)
    return (
      // biome-ignore lint/suspicious/noArrayIndexKey: two of a kind may come at one moment
      <g key={index}>
        <path
          d={flag.word ? `M${at} ${flagRow - 15}V${bottom}` : `M${at} ${flagRow - 4}v6`}
          className="stroke-ink-soft"
          strokeWidth={0.9}
          strokeDasharray={flag.word ? '1.5 3' : undefined}
        />
        {flag.word && (
          <>
            <path d={`M${at} ${flagRow - 16}l7 4l-7 4Z`} className="fill-ink" />
            <text x={at + 10} y={flagRow - 7}>
              {flag.word}
            </text>
          </>
        )}
      </g>
    )
  })
}

const inks = {
  ink: { past: 'stroke-ink', future: 'stroke-ink-pale', width: 1.75, dash: undefined },
  line: { past: 'stroke-line', future: 'stroke-line-pale', width: 2, dash: undefined },
  elastic: { past: 'stroke-elastic', future: 'stroke-elastic-pale', width: 1.75, dash: '7 2.5' },
  sheet: { past: 'stroke-ink', future: 'stroke-ink-pale', width: 1, dash: undefined },
} as const

interface TracesProps extends Omit<LayerProps, 'run'> {
  /** Path data of every trace, panel by panel: the past and the future show the same. */
  paths: readonly string[][]
  past: boolean
}

const Traces = memo(function Traces({ layout, paths, clip, past }: TracesProps) {
  return layout.panels.map((panel, row) => (
    <g key={panel.plot} clipPath={`url(#${clip}-${panel.plot})`} className="fill-none">
      {panel.traces.map((trace, order) => {
        const ink = inks[trace.ink]
        return (
          <path
            key={trace.name}
            d={paths[row]?.[order]}
            className={past ? ink.past : ink.future}
            strokeWidth={past ? ink.width : Math.min(1, ink.width)}
            strokeDasharray={ink.dash}
            strokeLinejoin="round"
          />
        )
      })}
    </g>
  ))
})

function pathOn(
  run: Run,
  layout: StripLayout,
  panel: Panel,
  trace: Trace,
  untilS = Number.POSITIVE_INFINITY,
): string {
  const { timeS } = run.result.series
  const beyond = timeS.findIndex((time) => time > untilS)
  const end = beyond === -1 ? timeS.length : beyond
  return tracePath(
    timeS.subarray(0, end),
    trace.values.subarray(0, end),
    straight(layout.x),
    straight(panel.y),
    panel.plot === 'course' ? Math.abs(panel.y(180) - panel.y(0)) : undefined,
  )
}

interface GhostsProps extends LayerProps {
  ghosts: readonly Ghost[]
  measures: Measures
}

/** Other helms on the same seed: their courses, thin and dashed, for as long as they kept one. */
const Ghosts = memo(function Ghosts({ ghosts, measures, layout, clip }: GhostsProps) {
  return ghosts.map((ghost) => {
    const traces = tracesOf(ghost.run, measures)
    return layout.panels
      .filter(({ plot }) => plot === 'course')
      .map((panel) => (
        <g key={panel.plot} clipPath={`url(#${clip}-${panel.plot})`} className="fill-none">
          {traces[panel.plot].map((trace) => (
            <path
              key={trace.name}
              d={pathOn(ghost.run, layout, panel, trace, ghost.run.result.metrics.lastedS)}
              className="stroke-ink-soft"
              strokeWidth={0.9}
              strokeDasharray={ghostDash[ghost.helm]}
            />
          ))}
        </g>
      ))
  })
})

interface EndName {
  key: string
  text: string
  y: number
  className: string
}

/** Height of a trace's end on its panel, kept on it. */
function endOn(panel: Panel, trace: Trace | undefined): number {
  const last = trace?.values[trace.values.length - 1] ?? 0
  return Math.min(panel.bottom, Math.max(panel.top, panel.y(last)))
}

function namesOn(panel: Panel, ghosts: readonly Ghost[], measures: Measures): EndName[] {
  const names: EndName[] = panel.traces.map((trace) => ({
    key: trace.name,
    text: trace.name,
    y: endOn(panel, trace),
    className:
      trace.ink === 'line' ? 'fill-line' : trace.ink === 'elastic' ? 'fill-elastic' : 'fill-ink',
  }))
  if (panel.plot === 'course')
    for (const ghost of ghosts)
      names.push({
        key: ghost.helm,
        text: ghostName(ghost),
        y: endOn(panel, tracesOf(ghost.run, measures).course[0]),
        className: 'fill-ink-soft',
      })
  const heights = spread(
    names.map(({ y }) => y),
    17,
    panel.top + 3,
    panel.bottom - 4,
  )
  return names.map((name, index) => ({ ...name, y: heights[index] ?? name.y }))
}

/** With the moment until which she kept a course, if she lost it: her trace ends there. */
function ghostName({ label, run }: Ghost): string {
  const { lastedS } = run.result.metrics
  return lastedS < run.request.durationS - 1 ? `${label} to ${clock(lastedS)}` : label
}

interface EndNamesProps {
  layout: StripLayout
  /** Per panel, its traces first and in their order. */
  names: readonly EndName[][]
}

/** Each line carries its own name at its end. */
const EndNames = memo(function EndNames({ layout, names }: EndNamesProps) {
  return layout.panels.map((panel, row) =>
    names[row]?.map((name) => (
      <text
        key={`${panel.plot} ${name.key}`}
        x={layout.right + 8}
        y={tenth(name.y) + 5}
        className={name.className}
      >
        {name.text}
      </text>
    )),
  )
})

interface CursorProps extends EndNamesProps {
  run: Run
  cursorS: number
  width: number
}

/** The moment in hand: a line through all plots, a dot on each trace, its figure beside the name. */
function Cursor({ run, cursorS, width, layout, names }: CursorProps) {
  const at = tenth(layout.x(cursorS))
  const { index, part } = sampleAt(run.result.series.timeS, cursorS)
  const atCursor = (trace: Trace) => {
    const here = trace.values[index] ?? 0
    return here + ((trace.values[index + 1] ?? here) - here) * part
  }
  return (
    <g>
      <path
        d={`M${at} ${flagRow}V${layout.bottom + 4}`}
        className="stroke-ink"
        strokeWidth={1.25}
      />
      <path d={`M${at} ${layout.bottom}l5 8h-10Z`} className="fill-ink" />
      {layout.panels.map((panel, row) => {
        const placed = names[row]
        return panel.traces.map((trace, order) => {
          const value = atCursor(trace)
          const y = Math.min(panel.bottom, Math.max(panel.top, panel.y(value)))
          return (
            <g key={trace.name}>
              <circle
                cx={at}
                cy={tenth(y)}
                r={2.6}
                className={
                  trace.ink === 'line'
                    ? 'fill-line'
                    : trace.ink === 'elastic'
                      ? 'fill-elastic'
                      : 'fill-ink'
                }
              />
              <text
                x={width - 2}
                y={tenth(placed?.[order]?.y ?? y) + 5}
                textAnchor="end"
                style={{ fontWeight: 600 }}
              >
                {panel.figure(value)}
              </text>
            </g>
          )
        })
      })}
    </g>
  )
}
