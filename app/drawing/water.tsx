import { memo } from 'react'
import type { Conditions } from 'sim/plan/types'
import { clamp, direction, polyline, tenth, wrapDegrees } from './frame'
import { sampleAt } from './moment'
import type { Anchor, Moment, Run, Size } from './types'

const gravity = 9.80665

/** Pieces of one crest: where each begins along it and how long it is, metres; and how far ahead. */
const crestPieces = [
  [0.4, 5.6, 0],
  [6.9, 1.4, 0.02],
  [9.4, 6.8, -0.01],
  [17, 2.6, 0.015],
  [19.2, 1.7, 0.24],
  [2.6, 2.1, 0.34],
  [7.7, 1.2, 0.47],
  [11.4, 2.9, 0.55],
  [16.2, 1.3, 0.66],
  [4.4, 1.6, 0.79],
  [13.5, 1.1, 0.86],
] as const
const repeatAcross = 21

interface WavesProps extends Size {
  run: Run
  moment: Moment
  scale: number
  running: boolean
}

/** Deep-water length and speed of the sea's dominant waves. */
function dominantWave(conditions: Conditions) {
  const length = (gravity * conditions.peakWavePeriodS ** 2) / (2 * Math.PI)
  return { length, speed: length / conditions.peakWavePeriodS }
}

/** Crests to scale apart, heavier in a higher sea; they pass as she meets them. */
export function Waves({ run, moment, scale, running, width, height }: WavesProps) {
  const { conditions } = run.request
  if (conditions.significantWaveHeightM <= 0) return null
  const { length, speed } = dominantWave(conditions)
  const from = startOfWind(run) + conditions.waveAngleDeg
  const towards = direction(from + 180)
  const along = moment.northM * towards.x + moment.eastM * towards.y
  const across = moment.eastM * towards.x - moment.northM * towards.y
  const phase = running ? speed * moment.timeS - along : 0
  const drift = running ? -across : 0
  const shift = (value: number, period: number) =>
    tenth((((value % period) + period) % period) * scale)
  return (
    <g transform={`translate(${width / 2} ${height / 2}) rotate(${conditions.waveAngleDeg})`}>
      <g transform={`translate(${-shift(drift, repeatAcross)} ${shift(phase, 2 * length)})`}>
        <Crests
          reach={Math.hypot(width, height) / 2 + 20}
          spacing={length * scale}
          scale={scale}
          weight={tenth(clamp(0.6 + 0.5 * conditions.significantWaveHeightM, 0.6, 1.8))}
        />
      </g>
    </g>
  )
}

interface CrestsProps {
  reach: number
  spacing: number
  scale: number
  weight: number
}

const Crests = memo(function Crests({ reach, spacing, scale, weight }: CrestsProps) {
  const across = repeatAcross * scale
  const rows = Math.ceil(reach / spacing) + 1
  const columns = Math.ceil(reach / across) + 1
  let path = ''
  for (let row = -rows - 2; row <= rows; row++)
    for (let column = -columns; column <= columns; column++)
      for (const [start, length, ahead] of crestPieces) {
        const x = (column * repeatAcross + start + (row % 2 ? 7 : 0)) * scale
        const y = (row + ahead) * spacing
        const long = length * scale
        path += `M${tenth(x)} ${tenth(y)}q${tenth(long / 2)} ${tenth(-0.06 * long)} ${tenth(long)} 0`
      }
  return (
    <path d={path} className="fill-none stroke-hair" strokeWidth={weight} strokeLinecap="round" />
  )
})

/** Mean wind direction the run set out in. */
function startOfWind(run: Run): number {
  const { series } = run.result
  return (series.headingDeg[0] ?? 0) + (series.courseToWindDeg[0] ?? 0)
}

const trackS = 30
/** Seconds for which her wave crests are still seen. */
const crestS = 9
/** Half the angle of a ship's wave wedge, arcsin(1/3). */
const wedge = Math.asin(1 / 3)

interface WakeProps {
  run: Run
  moment: Moment
  scale: number
  /** Where the boat's centre of gravity lies on the sheet. */
  at: Anchor
  /** Stern, pixels abaft the centre of gravity: nothing is drawn under the hull. */
  sternPx: number
}

/** Where she came from: her track, with a pair of wave crests for every second behind her. */
export function Wake({ run, moment, scale, at, sternPx }: WakeProps) {
  const trail = trailBehind(run, moment, scale, at)
  const seen = trail.filter((point) => Math.hypot(point.x - at.x, point.y - at.y) > sternPx)
  if (seen.length < 2) return null
  const crests = seen
    .filter((point) => point.age <= crestS)
    .map((point) => crestPair(point, trail[point.age - 1] ?? point, scale))
  return (
    <g className="fill-none" strokeLinecap="round">
      <path d={polyline(seen)} className="stroke-ink-soft" strokeWidth={1} />
      <path d={crests.slice(0, 4).join('')} className="stroke-ink-soft" strokeWidth={1} />
      <path d={crests.slice(4).join('')} className="stroke-ink-pale" strokeWidth={0.75} />
    </g>
  )
}

/** Two strokes that open aft, wider apart the longer ago. */
function crestPair(here: TrailPoint, newer: TrailPoint, scale: number): string {
  const length = Math.hypot(newer.x - here.x, newer.y - here.y) || 1
  const [ux, uy] = [(newer.x - here.x) / length, (newer.y - here.y) / length]
  const inner = (0.3 + 0.035 * here.age) * scale
  const outer = inner + (0.34 + 0.05 * here.age) * scale
  let path = ''
  for (const side of [1, -1]) {
    const point = (out: number, aft: number) =>
      `${tenth(here.x - side * uy * out - ux * aft)} ${tenth(here.y + side * ux * out - uy * aft)}`
    const back = (outer - inner) / Math.tan(wedge) / 2
    path += `M${point(inner, 0)}Q${point((inner + outer) / 2, back * 0.62)} ${point(outer, back)}`
  }
  return path
}

interface TrailPoint extends Anchor {
  /** Seconds ago. */
  age: number
}

/** Her track turned so that the wind of this moment comes from the top, newest first. */
function trailBehind(run: Run, moment: Moment, scale: number, at: Anchor): TrailPoint[] {
  const { series } = run.result
  const up = direction(moment.headingDeg + moment.courseToWindDeg)
  const trail: TrailPoint[] = []
  for (let age = 0; age <= trackS; age += 1) {
    const timeS = moment.timeS - age
    if (timeS < (series.timeS[0] ?? 0)) break
    const { index, part } = sampleAt(series.timeS, timeS)
    const north = between(series.northM, index, part) - moment.northM
    const east = between(series.eastM, index, part) - moment.eastM
    trail.push({
      age,
      x: at.x + (east * up.x - north * up.y) * scale,
      y: at.y - (north * up.x + east * up.y) * scale,
    })
  }
  return trail
}

function between(values: Float64Array, index: number, part: number): number {
  const here = values[index] ?? 0
  return here + ((values[index + 1] ?? here) - here) * part
}

/** Angle by which the wind of this moment lies off the mean the course is reckoned from. */
export function windSwingDeg(moment: Moment): number {
  return wrapDegrees(moment.windDirectionDeg - moment.headingDeg - moment.courseToWindDeg)
}
