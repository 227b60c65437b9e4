import { cos, sin } from '../elementary'
import { elasticPull } from '../steering/elastic'
import { frictionRate } from '../steering/friction'
import type { LineSolver } from './line-pull'
import {
  BEARING_FRICTION,
  BOOM,
  ELASTIC_FRICTION,
  LINE_FRICTION,
  RUDDER,
  RUDDER_RATE,
} from './state'
import type { Vessel } from './vessel'

/** Way over which bearings, leads and cord turn from one direction of friction to the other, rad and m. */
const BEARING_WAY = 0.02
const LINE_WAY = 0.006
const ELASTIC_WAY = 0.01
/** Natural frequency, rad/s, and damping over critical of the tiller against its stop. */
const STOP_FREQUENCY = 22
const STOP_DAMPING = 0.5

export interface Tiller {
  lineTension: number
  elasticTension: number
  hitchOut: number
  elasticExtension: number
  /**
   * Writes the rates of rudder and friction states into dy.
   *
   * @param stock moment of the water about the stock, N m
   * @param sheet tension of the part that gives the pull, N
   */
  update(y: Float64Array, dy: Float64Array, stock: number, sheet: number): void
}

/**
 * The tiller between control line, elastic, water, friction and stops.
 *
 * @param pull the control line, or undefined where line and elastic are cast off
 * @param fast whether the tiller is made fast, as lashed
 */
export function createTiller(vessel: Vessel, pull: LineSolver | undefined, fast: boolean): Tiller {
  const { rudder, line, source } = vessel
  const { elastic } = line
  const stopStiffness = rudder.inertia * STOP_FREQUENCY * STOP_FREQUENCY
  const stopDamping = 2 * STOP_DAMPING * rudder.inertia * STOP_FREQUENCY

  const tiller: Tiller = {
    lineTension: 0,
    elasticTension: 0,
    hitchOut: 0,
    elasticExtension: 0,
    update(y, dy, stock, sheet) {
      const delta = y[RUDDER] as number
      const rate = y[RUDDER_RATE] as number
      // The tiller goes the other way from the blade.
      const cosine = cos(delta)
      const sine = -sin(delta)
      let moment = stock
      let lineSpeed = 0
      let elasticSpeed = 0
      if (pull) {
        if (source >= 0) {
          const px = line.tillerRadius * cosine
          const py = line.tillerRadius * sine
          const dx = line.lastX - px
          const dy2 = line.lastY - py
          const dz = line.lastZ - line.tillerZ
          const reach = Math.sqrt(dx * dx + dy2 * dy2 + dz * dz)
          const lever = reach > 0 ? (px * dy2 - py * dx) / reach : 0
          const boom = y[BOOM + source] as number
          const tension = pull.tension(boom, delta, sheet, y[LINE_FRICTION] as number)
          moment += lever * tension
          lineSpeed = -lever * rate
          tiller.lineTension = tension
          tiller.hitchOut = pull.hitchOut
        }
        const px = elastic.tillerRadius * cosine
        const py = elastic.tillerRadius * sine
        const dx = elastic.anchorX - px
        const dy2 = elastic.anchorY - py
        const dz = elastic.anchorZ - line.tillerZ
        const span = Math.sqrt(dx * dx + dy2 * dy2 + dz * dz)
        const lever = span > 0 ? (px * dy2 - py * dx) / span : 0
        const extension = elastic.stretch + span - elastic.distanceAtRest
        const cord =
          elasticPull(extension, elastic.naturalLength, elastic.area, elastic.modulus) *
          (1 + elastic.hysteresis * (y[ELASTIC_FRICTION] as number))
        moment += lever * cord
        elasticSpeed = lever * rate
        tiller.elasticTension = cord
        tiller.elasticExtension = extension
      }
      let onRudder = -moment - rudder.friction * (y[BEARING_FRICTION] as number)
      const beyond = Math.abs(delta) - rudder.stop
      if (beyond > 0) {
        onRudder -= (delta < 0 ? -1 : 1) * stopStiffness * beyond + stopDamping * rate
      }
      dy[RUDDER] = fast ? 0 : rate
      dy[RUDDER_RATE] = fast ? 0 : onRudder / rudder.inertia
      dy[BEARING_FRICTION] = frictionRate(rate, y[BEARING_FRICTION] as number, BEARING_WAY)
      dy[LINE_FRICTION] = frictionRate(lineSpeed, y[LINE_FRICTION] as number, LINE_WAY)
      dy[ELASTIC_FRICTION] = frictionRate(elasticSpeed, y[ELASTIC_FRICTION] as number, ELASTIC_WAY)
    },
  }
  return tiller
}
