import { type ScaleLinear, scaleLinear } from 'd3-scale'
import { clamp, tackOf, wrapDegrees } from './frame'
import type { Measure, Measures, Run, Size } from './types'

/** A trace on a panel, in the unit shown. */
export interface Trace {
  name: string
  values: Float64Array
  ink: 'ink' | 'line' | 'elastic' | 'sheet'
}

export interface Panel {
  plot: 'course' | 'heel' | 'tiller' | 'loads'
  /** With the unit and which way is up. */
  title: string
  /** For narrow strips. */
  shortTitle: string
  measure: Measure
  top: number
  bottom: number
  y: ScaleLinear<number, number>
  ticks: number[]
  traces: Trace[]
  /** Figure of a tick or of the cursor: angles are written without their sign where it says nothing. */
  figure: (shown: number) => string
}

export interface StripLayout {
  left: number
  right: number
  top: number
  bottom: number
  x: ScaleLinear<number, number>
  panels: Panel[]
  narrow: boolean
}

/** Heights of the plots in parts of what is left under their titles. */
const shares = { course: 0.35, heel: 0.16, tiller: 0.2, loads: 0.29 } as const
export const titleRow = 19
export const flagRow = 20
const axisRow = 24

/**
 * Course to the wind on the tack asked for, positive, near the band however often she has come
 * round: up to windward, past the wind below zero.
 */
export function courseOnTack(run: Run, courseDeg: number): number {
  const tack = tackOf(run.request.conditions)
  const centre = tack * run.result.band.centreDeg
  return centre + wrapDegrees(tack * courseDeg - centre)
}

function shownColumn(values: Float64Array, change: (value: number) => number): Float64Array {
  return values.map(change)
}

function extent(values: Float64Array): [number, number] {
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]
  for (const value of values) {
    if (value < low) low = value
    if (value > high) high = value
  }
  return low <= high ? [low, high] : [0, 0]
}

/** Columns of each plot, turned so that windward is up and leeward heel is positive. */
export function tracesOf(run: Run, measures: Measures): Record<Panel['plot'], Trace[]> {
  const { series } = run.result
  const tack = tackOf(run.request.conditions)
  const { angle, force } = measures
  const load = (values: Float64Array) => shownColumn(values, (value) => value * force.factor)
  return {
    course: [
      {
        name: 'Course',
        values: shownColumn(
          series.courseToWindDeg,
          (value) => courseOnTack(run, value) * angle.factor,
        ),
        ink: 'ink',
      },
    ],
    heel: [
      {
        name: 'Heel',
        values: shownColumn(series.heelDeg, (value) => -tack * value * angle.factor),
        ink: 'ink',
      },
    ],
    tiller: [
      {
        name: 'Tiller',
        values: shownColumn(series.tillerDeg, (value) => tack * value * angle.factor),
        ink: 'ink',
      },
    ],
    loads: [
      { name: 'Sheet', values: load(series.sheetN), ink: 'sheet' },
      { name: 'Elastic', values: load(series.elasticN), ink: 'elastic' },
      { name: 'Line', values: load(series.controlLineN), ink: 'line' },
    ],
  }
}

/** Widest the course plot opens either side of the band, degrees: all the way round. */
const widestDeg = 180

function courseDomain(run: Run, trace: Trace, measure: Measure): [number, number] {
  const { band } = run.result
  const centre = tackOf(run.request.conditions) * band.centreDeg
  const least = band.halfWidthDeg * 1.5
  const [low, high] = extent(trace.values)
  const reach = (shown: number) =>
    clamp(Math.abs(shown / measure.factor - centre) + 3, least, widestDeg)
  const down = low < centre * measure.factor ? reach(low) : least
  const up = high > centre * measure.factor ? reach(high) : least
  return [(centre - down) * measure.factor, (centre + up) * measure.factor]
}

export function stripLayout(run: Run, measures: Measures, size: Size): StripLayout {
  const narrow = size.width < 600
  const left = narrow ? 32 : 44
  const right = size.width - (narrow ? 86 : 112)
  const top = flagRow
  const bottom = size.height - axisRow
  const traces = tracesOf(run, measures)
  const { angle, force } = measures
  const [course] = traces.course
  const [heel] = traces.heel
  const [tiller] = traces.tiller
  const heelMost = Math.max(15, ...(heel ? extent(heel.values) : []))
  const heelLeast = Math.min(0, ...(heel ? extent(heel.values) : []))
  const tillerMost = Math.max(10, ...(tiller ? extent(tiller.values).map(Math.abs) : []))
  const loadMost = Math.max(
    20 * force.factor,
    ...traces.loads.flatMap((trace) => extent(trace.values)),
  )
  const [courseUp, courseDown] = course ? courseDomain(run, course, angle) : [0, 90]

  const unit = angle.unit
  const plain = (measure: Measure) => (shown: number) => measure.format(shown / measure.factor)
  const unsigned = (shown: number) => angle.format(Math.abs(wrapDegrees(shown / angle.factor)))
  const rows: Omit<Panel, 'top' | 'bottom' | 'y' | 'ticks'>[] = [
    {
      plot: 'course',
      title: `Course to the wind, ${unit}, to windward upwards`,
      shortTitle: `Course to the wind, ${unit}`,
      measure: angle,
      traces: traces.course,
      figure: unsigned,
    },
    {
      plot: 'heel',
      title: `Heel, ${unit}, to leeward`,
      shortTitle: `Heel, ${unit}`,
      measure: angle,
      traces: traces.heel,
      figure: plain(angle),
    },
    {
      plot: 'tiller',
      title: `Tiller, ${unit}, to windward upwards`,
      shortTitle: `Tiller, ${unit}, windward up`,
      measure: angle,
      traces: traces.tiller,
      figure: plain(angle),
    },
    {
      plot: 'loads',
      title: `Loads, ${force.unit}`,
      shortTitle: `Loads, ${force.unit}`,
      measure: force,
      traces: traces.loads,
      figure: plain(force),
    },
  ]
  const domains: Record<Panel['plot'], [number, number]> = {
    course: [courseDown, courseUp],
    heel: [heelLeast, heelMost * 1.05],
    tiller: [-tillerMost * 1.05, tillerMost * 1.05],
    loads: [0, loadMost * 1.04],
  }
  const room = Math.max(40, bottom - top - rows.length * titleRow)
  let edge = top
  const panels = rows.map((row): Panel => {
    const height = room * shares[row.plot]
    const panelTop = Math.round(edge + titleRow)
    edge += titleRow + height
    const panelBottom = Math.round(edge)
    const y = scaleLinear(domains[row.plot], [panelBottom, panelTop])
    return {
      ...row,
      top: panelTop,
      bottom: panelBottom,
      y,
      ticks: roundTicks(y, row.plot === 'loads' || row.plot === 'course' ? 22 : 15),
    }
  })
  return {
    left,
    right,
    top,
    bottom,
    x: scaleLinear([0, run.request.durationS], [left, right]),
    panels,
    narrow,
  }
}

const roundSteps = [1, 2, 5, 10, 15, 20, 30, 45, 60, 90]

/** Ticks at multiples of the smallest round step that leaves room for its figures. */
function roundTicks(y: ScaleLinear<number, number>, gapPx: number): number[] {
  const [from = 0, to = 1] = y.domain()
  const [low, high] = [Math.min(from, to), Math.max(from, to)]
  const perUnit = Math.abs(y(1) - y(0))
  const decade = 10 ** Math.max(0, Math.floor(Math.log10(gapPx / perUnit)) - 1)
  const fine = roundSteps.map((step) => step * decade)
  const step = fine.find((candidate) => candidate * perUnit >= gapPx) ?? high - low
  const ticks: number[] = []
  for (let tick = Math.ceil(low / step) * step; tick <= high; tick += step) ticks.push(tick)
  return ticks
}

/** Moment under a place on the strip, seconds, kept within the run. */
export function timeAt(layout: StripLayout, x: number, durationS: number): number {
  return clamp(layout.x.invert(x), 0, durationS)
}
