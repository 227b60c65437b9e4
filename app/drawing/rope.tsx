import { clamp, tenth } from './frame'
import type { Anchor } from './types'

/**
 * Rope as it is drawn: straight and thicker under load, sagging when slack. The control line is
 * solid with tracer flecks, the elastic a coil whose turns open as it stretches.
 */

/** Below this a line hangs slack. */
const slackBelowN = 4
/** Load at which a line is two thirds of the way to its greatest thickness. */
const loadedN = 140

export function slackness(tensionN: number): number {
  return clamp(1 - tensionN / slackBelowN, 0, 1)
}

/** Stroke width between a thin and a thick line, pixels. */
export function loadWidth(tensionN: number, thin: number, thick: number): number {
  return tenth(thin + (thick - thin) * (1 - Math.exp(-Math.max(0, tensionN) / loadedN)))
}

/** Straight under load; a hanging curve when slack. */
export function ropePath(points: readonly Anchor[], slack: number): string {
  let path = ''
  let before: Anchor | undefined
  for (const point of points) {
    if (!before) path = `M${tenth(point.x)} ${tenth(point.y)}`
    else if (slack === 0) path += `L${tenth(point.x)} ${tenth(point.y)}`
    else {
      const [dx, dy] = [point.x - before.x, point.y - before.y]
      const sag = 0.16 * slack
      path += `Q${tenth(before.x + dx / 2 - dy * sag)} ${tenth(before.y + dy / 2 + dx * sag)} ${tenth(point.x)} ${tenth(point.y)}`
    }
    before = point
  }
  return path
}

const samplesPerTurn = 10

/**
 * A coil seen from the side: loops that overlap when it is short and open into a wave as it
 * stretches, the number of turns and the cord's thickness across staying its own.
 */
export function coilPath(from: Anchor, to: Anchor, turns: number, radius: number): string {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  if (length < 1) return `M${tenth(from.x)} ${tenth(from.y)}`
  const ux = (to.x - from.x) / length
  const uy = (to.y - from.y) / length
  const steps = turns * samplesPerTurn
  let path = `M${tenth(from.x)} ${tenth(from.y)}`
  for (let step = 0; step <= steps; step++) {
    const angle = (2 * Math.PI * step) / samplesPerTurn
    const end = Math.min(1, Math.min(step, steps - step) / (samplesPerTurn / 2))
    const along = (length * step) / steps + 0.85 * radius * end * Math.sin(angle)
    const across = radius * end * Math.cos(angle)
    path += `L${tenth(from.x + ux * along - uy * across)} ${tenth(from.y + uy * along + ux * across)}`
  }
  return `${path}L${tenth(to.x)} ${tenth(to.y)}`
}

interface ControlLineProps {
  points: readonly Anchor[]
  tensionN: number
  thin?: number
  thick?: number
}

export function ControlLine({ points, tensionN, thin = 1.8, thick = 4 }: ControlLineProps) {
  const path = ropePath(points, slackness(tensionN))
  const width = loadWidth(tensionN, thin, thick)
  return (
    <g className="fill-none" strokeLinejoin="round" strokeLinecap="round">
      <path d={path} strokeWidth={width} className="stroke-line" />
      <path
        d={path}
        strokeWidth={Math.max(1, width * 0.42)}
        strokeLinecap="butt"
        strokeDasharray="2.5 8"
        className="stroke-paper"
      />
    </g>
  )
}

interface ElasticCordProps {
  /** Where it is made fast, where the cord begins, and the tiller. */
  anchor: Anchor
  cordFrom: Anchor
  tiller: Anchor
  tensionN: number
  /** Slack length of the cord in pixels: gives the number of turns. */
  naturalPx: number
  /** Radius of the coil while slack, pixels. */
  radius: number
  width?: number
}

export function ElasticCord(props: ElasticCordProps) {
  const { anchor, cordFrom, tiller, tensionN, naturalPx, radius, width = 1.4 } = props
  const turns = clamp(Math.round(naturalPx / (radius * 2.1)), 5, 18)
  const length = Math.hypot(tiller.x - cordFrom.x, tiller.y - cordFrom.y)
  const thinner = clamp(Math.sqrt(naturalPx / Math.max(length, 1)), 0.6, 1.05)
  return (
    <g className="fill-none stroke-elastic" strokeLinejoin="round" strokeLinecap="round">
      <path d={ropePath([anchor, cordFrom], slackness(tensionN))} strokeWidth={width} />
      <path
        d={coilPath(cordFrom, tiller, turns, radius * thinner)}
        strokeWidth={loadWidth(tensionN, width, width * 1.5)}
      />
    </g>
  )
}

interface SheetProps {
  deck: Anchor
  boom: Anchor
  /** The part that carries the hitch, when one does. */
  hitch?: Anchor | undefined
  parts: number
  tensionN: number
  slack?: boolean
  /** Pixels between parts. */
  gap: number
  thin?: number
  thick?: number
}

/** All parts of a sheet side by side; the one with the hitch is bent by it. */
export function Sheet(props: SheetProps) {
  const { deck, boom, hitch, parts, tensionN, gap, slack = false, thin = 1, thick = 2.6 } = props
  const length = Math.hypot(boom.x - deck.x, boom.y - deck.y) || 1
  const across = { x: -(boom.y - deck.y) / length, y: (boom.x - deck.x) / length }
  const width = loadWidth(tensionN, thin, thick)
  const others = Array.from({ length: Math.max(0, parts - 1) }, (_, index) => {
    const offset = gap * (index - (parts - 2) / 2)
    return ropePath(
      [
        { x: deck.x + across.x * offset, y: deck.y + across.y * offset },
        { x: boom.x + across.x * offset, y: boom.y + across.y * offset },
      ],
      slack ? 1 : 0,
    )
  })
  return (
    <g className="fill-none stroke-ink" strokeLinecap="round" strokeLinejoin="round">
      {others.length > 0 && <path d={others.join('')} strokeWidth={Math.max(0.8, width * 0.6)} />}
      <path
        d={ropePath(hitch ? [deck, hitch, boom] : [deck, boom], slack && !hitch ? 1 : 0)}
        strokeWidth={width}
      />
    </g>
  )
}
