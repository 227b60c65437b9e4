import { type Balance, balanceOf } from '../analysis/balance'
import { environmentOf } from '../boat/environment'
import {
  BOOM,
  EAST,
  HEADING,
  HEEL,
  NORTH,
  ROLL_RATE,
  RUDDER,
  SURGE,
  SWAY,
  YAW_RATE,
} from '../boat/state'
import { stepFor } from '../boat/step'
import { createSystem, type System } from '../boat/system'
import { type Vessel, vesselOf } from '../boat/vessel'
import { DEGREE, KNOT } from '../constants'
import { atan2, hypot } from '../elementary'
import { adaptive, StepLimitError } from '../integrate/adaptive'
import { rungeKutta } from '../integrate/runge-kutta'
import { wrapAngle } from '../numbers'
import { judgingParameters } from '../parameters/judging'
import type { Plan } from '../plan/types'
import { MODEL_VERSION } from '../version'
import { type Channel, channels, type Series } from './channels'
import { metricsOf } from './metrics'
import type { Happening, Metrics, TrialRequest, TrialResult } from './types'
import { verdictOf } from './verdict'
import { WATCH_STEP, type Watch, watchOf } from './watch'

/** Clock of a run, s: every step, watch and output time is a whole number of ticks. */
export const TICK = 0.05
/** Tolerance of the adaptive solver in a run, SI on every state. */
const ADAPTIVE_TOLERANCE = 1e-7
/** Largest pull a deflected sheet is reckoned with for the step, over its tension in balance. */
const GUST_SHEET = 4

interface Run {
  plan: Plan
  vessel: Vessel
  balance: Balance
  watch: Watch
  metrics: Metrics
  asked: number
}

type Recorder = (t: number, y: Float64Array, system: System, courseToWind: number) => void

function ticksOf(seconds: number): number {
  return Math.round(seconds / TICK)
}

function outputTicksOf(request: TrialRequest): number {
  return Math.max(1, ticksOf(request.outputIntervalS))
}

/** A run from balance to the end or, where asked, to the moment it is lost. */
function sail(
  request: TrialRequest,
  stopWhenLost: boolean,
  record: (vessel: Vessel) => Recorder | undefined,
): Run {
  const plan: Plan = {
    boat: request.plan.boat,
    setup: { ...request.plan.setup, conditions: request.conditions },
  }
  const { conditions, helm, durationS } = request
  const asked = conditions.trueWindAngleDeg * DEGREE
  const vessel = vesselOf(plan)
  const environment = environmentOf(conditions, request.events, durationS, vessel.tack)
  const system = createSystem(vessel, environment, helm)
  const balance = balanceOf(plan)
  const y = Float64Array.from(balance.state)
  const rigged = helm === 'sheet-to-tiller'
  const watch = watchOf(vessel, asked, rigged)
  const recorder = record(vessel)

  const ticks = ticksOf(durationS)
  const watchTicks = Math.round(WATCH_STEP / TICK)
  const outputTicks = outputTicksOf(request)
  const substeps = Math.round(TICK / stepFor(vessel, GUST_SHEET * balance.sheetTension))
  const fixed = rungeKutta(system.size, system.derivative)
  const reference =
    request.solver === 'adaptive'
      ? adaptive(system.size, system.derivative, ADAPTIVE_TOLERANCE)
      : undefined
  const rate = new Float64Array(system.size)

  let tick = 0
  for (;;) {
    const t = tick * TICK
    const watching = tick % watchTicks === 0
    const writing = tick % outputTicks === 0 || tick === ticks
    if (watching || writing) {
      system.derivative(t, y, rate)
      if (watching) watch.see(t, y, system.observed)
      if (writing && !watch.outOfRange) recorder?.(t, y, system, watch.courseToWind)
    }
    if (tick >= ticks || watch.outOfRange || (stopWhenLost && watch.lost)) break
    if (reference) {
      const next = Math.min(
        ticks,
        (Math.floor(tick / watchTicks) + 1) * watchTicks,
        (Math.floor(tick / outputTicks) + 1) * outputTicks,
      )
      try {
        reference(t, next * TICK, y)
      } catch (error) {
        if (!(error instanceof StepLimitError)) throw error
        watch.stop(t, 'The adaptive solver could not go on')
        break
      }
      tick = next
    } else {
      const h = TICK / substeps
      for (let i = 0; i < substeps; i++) fixed(t + i * h, y, h)
      tick++
    }
  }
  const metrics = metricsOf(watch, asked, balance.speedKn, tick >= ticks)
  return { plan, vessel, balance, watch, metrics, asked }
}

/** Whether a run holds, without its traces; ends as soon as the run is lost. */
export function runHolds(request: TrialRequest): Metrics {
  return sail(request, true, () => undefined).metrics
}

/**
 * Sails a boat under a setup for a time and judges her.
 *
 * Pure: the same request gives the same result. The plan must be free of problems (see plan/problems).
 * Output times are rounded to the clock of the run, a twentieth of a second.
 */
export function runTrial(request: TrialRequest): TrialResult {
  const columns = Math.ceil(ticksOf(request.durationS) / outputTicksOf(request)) + 2
  const series = {} as Series
  for (const key of Object.keys(channels) as Channel[]) series[key] = new Float64Array(columns)
  const boomDeg: Record<string, Float64Array> = {}
  const drawing: Record<string, Float64Array> = {}
  let row = 0
  const run = sail(request, false, (vessel) => {
    for (const { id } of vessel.sails) {
      boomDeg[id] = new Float64Array(columns)
      drawing[id] = new Float64Array(columns)
    }
    return (t, y, system, courseToWind) => {
      writeRow(series, row, t, y, system, courseToWind)
      vessel.sails.forEach(({ id }, k) => {
        ;(boomDeg[id] as Float64Array)[row] = (y[BOOM + k] as number) / DEGREE
        ;(drawing[id] as Float64Array)[row] = system.observed.drawing[k] as number
      })
      row++
    }
  })
  const cut = <T extends Record<string, Float64Array>>(table: T): T =>
    Object.fromEntries(
      Object.entries(table).map(([key, column]) => [key, column.slice(0, row)]),
    ) as T
  const { watch, metrics, asked, balance } = run
  return {
    modelVersion: MODEL_VERSION,
    verdict: verdictOf(watch, metrics, asked, request.helm, balance),
    metrics,
    happenings: [...watch.happenings, ...planned(request)].sort((a, b) => a.atS - b.atS),
    band: {
      centreDeg: request.conditions.trueWindAngleDeg,
      halfWidthDeg: judgingParameters.bandDeg.default,
    },
    balance: {
      found: balance.found,
      speedKn: balance.speedKn,
      heelDeg: balance.heelDeg,
      leewayDeg: balance.leewayDeg,
      tillerDeg: balance.tillerDeg,
      rudderMomentNm: balance.rudderMoment,
    },
    series: cut(series),
    boomDeg: cut(boomDeg),
    drawing: cut(drawing),
  }
}

function writeRow(
  series: Series,
  row: number,
  t: number,
  y: Float64Array,
  system: System,
  courseToWind: number,
): void {
  const seen = system.observed
  const u = y[SURGE] as number
  const v = y[SWAY] as number
  series.timeS[row] = t
  series.courseToWindDeg[row] = courseToWind / DEGREE
  series.headingDeg[row] = wrapAngle(y[HEADING] as number) / DEGREE
  series.heelDeg[row] = (y[HEEL] as number) / DEGREE
  series.speedKn[row] = hypot(u, v) / KNOT
  series.leewayDeg[row] = atan2(v, u) / DEGREE
  series.rollRateDegS[row] = (y[ROLL_RATE] as number) / DEGREE
  series.yawRateDegS[row] = (y[YAW_RATE] as number) / DEGREE
  series.tillerDeg[row] = -(y[RUDDER] as number) / DEGREE
  series.controlLineN[row] = seen.lineTension
  series.elasticN[row] = seen.elasticTension
  series.sheetN[row] = seen.sheetTension
  series.northM[row] = y[NORTH] as number
  series.eastM[row] = y[EAST] as number
  series.windDirectionDeg[row] = atan2(-seen.windEast, -seen.windNorth) / DEGREE
  series.windSpeedKn[row] = hypot(seen.windNorth, seen.windEast) / KNOT
  series.apparentWindAngleDeg[row] = seen.apparentAngle / DEGREE
  series.apparentWindSpeedKn[row] = seen.apparentSpeed / KNOT
  series.hitchOutM[row] = seen.hitchOut
  series.elasticStretchM[row] = seen.elasticExtension
  series.waveM[row] = seen.surface
}

/** The events asked for, told among what happened. */
function planned(request: TrialRequest): Happening[] {
  return request.events
    .filter((event) => event.atS <= request.durationS)
    .map((event) => {
      const { atS, kind } = event
      if (kind === 'gust') {
        const word = event.strengthKn < 0 ? 'Lull' : 'Gust'
        return { atS, code: kind, text: `${word} of ${Math.abs(event.strengthKn)} kn` }
      }
      if (kind === 'wind-shift') {
        const way = event.angleDeg < 0 ? 'backs' : 'veers'
        return { atS, code: kind, text: `Wind ${way} ${Math.abs(event.angleDeg)} degrees` }
      }
      if (kind === 'wave-set')
        return { atS, code: kind, text: `Wave set, ${event.heightM} m higher` }
      const name = request.plan.boat.sails[event.sail]?.name ?? event.sail
      return { atS, code: kind, text: `${name} reefed, ${event.percent} % of it taken in` }
    })
}
