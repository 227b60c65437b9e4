import { useId, useMemo } from 'react'
import { Balloon, balloonRadius } from './balloon'
import { alongInk, placeBalloons } from './balloon-places'
import { type DetailFrame, detailFrame } from './detail-frame'
import { DeckBlock, HitchTurns, LeadSymbol, MadeFast } from './fittings'
import { direction, onPaper, type Point, polyline, tenth } from './frame'
import { type RigGeometry, rigGeometry, tillerAngles, trimmedAngle } from './geometry'
import { HullDrawing } from './hull-drawing'
import { partNumber, partsOf } from './parts'
import { ControlLine, ElasticCord, Sheet } from './rope'
import { ScaleBar } from './scale-bar'
import { RudderBlade, Tiller } from './tiller-drawing'
import type { Anchor, PartAnchors, PartKey, Size, TillerDetailProps } from './types'

interface DetailView {
  frame: DetailFrame
  scale: number
  /** Centre of the ring. */
  centre: Anchor
  radius: number
  /** From the deck to the drawing. */
  place: (point: Point) => Anchor
}

/** Room under the ring for the scale bar and the letter. */
const footPx = 34
/** Room over the ring: the pulls stand in its corners, clear of it. */
const headPx = 40

function detailView(plan: TillerDetailProps['plan'], size: Size): DetailView {
  const frame = detailFrame(plan)
  const radius = Math.min(size.width / 2 - 2, (size.height - footPx - headPx) / 2)
  const scale = radius / frame.radiusM
  const centre = { x: size.width / 2, y: headPx + (size.height - headPx - footPx) / 2 }
  const origin = onPaper(frame.centre, scale)
  return {
    frame,
    scale,
    centre,
    radius,
    place: (point) => {
      const at = onPaper(point, scale)
      return { x: centre.x + at.x - origin.x, y: centre.y + at.y - origin.y }
    },
  }
}

/** Where the circled number of each part stands in the detail, for the notes beside it. */
export function partAnchors(
  props: Pick<TillerDetailProps, 'plan' | 'width' | 'height'>,
): PartAnchors {
  const { plan } = props
  return Object.fromEntries(
    standingNumbers(plan, detailView(plan, props)).map(({ key, at }) => [
      key,
      { x: tenth(at.x), y: tenth(at.y) },
    ]),
  )
}

/** Degrees clockwise from the top of the paper in which one point lies from another. */
function bearing(from: Anchor, to: Anchor): number {
  return (Math.atan2(to.x - from.x, from.y - to.y) * 180) / Math.PI
}

/** Detail A: tiller, leads, hitch and elastic, bow up. */
export function TillerDetail(props: TillerDetailProps) {
  const { plan, moment, measures, width, height, label, active = null } = props
  const clip = useId()
  const rig = rigGeometry(plan, moment)
  const view = useMemo(() => detailView(plan, { width, height }), [plan, width, height])
  const { centre, radius, scale, place } = view
  const stock = place({ x: 0, y: 0 })
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      className="block h-full w-full"
    >
      <clipPath id={clip}>
        <circle cx={centre.x} cy={centre.y} r={radius} />
      </clipPath>
      <g clipPath={`url(#${clip})`}>
        <g transform={`translate(${tenth(stock.x)} ${tenth(stock.y)})`}>
          <HullDrawing boat={plan.boat} scale={scale} />
          {rig && <RudderBlade boat={plan.boat} rig={rig} scale={scale} />}
          <TillerSweep
            radiusPx={plan.boat.tiller.length * scale}
            stopDeg={plan.boat.rudder.stopDeg}
          />
        </g>
        {rig && <Gear {...props} rig={rig} view={view} active={active} />}
      </g>
      <circle
        cx={centre.x}
        cy={centre.y}
        r={radius}
        className="fill-none stroke-ink-soft"
        strokeWidth={1}
        strokeDasharray="10 3 2 3"
      />
      {rig && <Pulls {...props} rig={rig} />}
      <text x={width - 2} y={height - 4} textAnchor="end">
        <tspan style={{ fontWeight: 600 }}>A</tspan>
        <tspan className="fill-ink-soft">, bow up</tspan>
      </text>
      <ScaleBar x={2} y={height - 5} scale={scale} measure={measures.length} room={width / 3} />
    </svg>
  )
}

interface GearProps extends TillerDetailProps {
  rig: RigGeometry
  view: DetailView
}

/** Rope, timber and fittings, with their numbers. */
function Gear({ plan, moment, rig, view, active }: GearProps) {
  const { place, scale } = view
  const deflected = plan.setup.line.pull === 'deflected'
  const line = rig.line.map(place)
  const deck = place(rig.sheetDeck)
  const boom = place(rig.sheetBoom)
  const stock = place(rig.stock)
  return (
    <>
      <Sheet
        deck={deck}
        boom={boom}
        hitch={deflected ? place(rig.hitch) : undefined}
        parts={plan.boat.sails[plan.setup.source]?.sheetParts ?? 1}
        tensionN={moment.sheetN}
        slack={moment.sheetN < 2}
        gap={4.5}
        thin={1.4}
        thick={3.6}
      />
      {deflected && (
        <path
          d={polyline([deck, place(rig.hitchAtRest), boom])}
          className="fill-none stroke-ink-soft"
          strokeWidth={0.9}
          strokeDasharray="2 4"
        />
      )}
      <g transform={`translate(${tenth(stock.x)} ${tenth(stock.y)})`}>
        <Tiller boat={plan.boat} rig={rig} scale={scale} />
      </g>
      <Square rig={rig} place={place} />
      <ElasticCord
        anchor={place(rig.elasticAnchor)}
        cordFrom={place(rig.cordFrom)}
        tiller={place(rig.tillerElastic)}
        tensionN={moment.elasticN}
        naturalPx={plan.setup.elastic.naturalLength * scale}
        radius={7}
        width={active === 'elastic' ? 2.8 : 2}
      />
      <ControlLine
        points={line}
        tensionN={moment.controlLineN}
        thin={active === 'line' ? 3.4 : 2.4}
        thick={6}
      />
      <DeckBlock at={deck} turnDeg={bearing(deck, boom) + 90} />
      <MadeFast at={place(rig.elasticAnchor)} strong={active === 'elastic-anchor'} />
      {rig.leads.map((lead, index) => {
        const at = place(lead)
        const before = line[index] ?? at
        const after = line[index + 2] ?? at
        return (
          <LeadSymbol
            // biome-ignore lint/suspicious/noArrayIndexKey: leads have no name but their order
            key={index}
            kind={plan.setup.leads[index]?.kind ?? 'ball'}
            at={at}
            turnDeg={halfway(bearing(at, before), bearing(at, after))}
            strong={active === `lead.${index}`}
          />
        )
      })}
      {deflected && (
        <HitchTurns
          at={place(rig.hitch)}
          turnDeg={bearing(deck, boom)}
          strong={active === 'hitch'}
        />
      )}
      <Numbers plan={plan} rig={rig} view={view} active={active ?? null} />
    </>
  )
}

/** Bisector of two bearings, on the side the line turns round. */
function halfway(a: number, b: number): number {
  const [first, second] = [direction(a), direction(b)]
  return (Math.atan2(first.y + second.y, first.x + second.x) * 180) / Math.PI
}

/** Arc of the tiller's end between its stops, with a tick every ten degrees. */
function TillerSweep({ radiusPx, stopDeg }: { radiusPx: number; stopDeg: number }) {
  const at = (angle: number, radius: number) => {
    const ahead = direction(angle)
    return `${tenth(radius * ahead.y)} ${tenth(-radius * ahead.x)}`
  }
  const tens = Array.from({ length: 13 }, (_, index) => (index - 6) * 10).filter(
    (angle) => Math.abs(angle) < stopDeg,
  )
  const rim = radiusPx * 1.09
  return (
    <g className="fill-none stroke-ink-pale" strokeWidth={0.9}>
      <path d={`M${at(-stopDeg, rim)}A${tenth(rim)} ${tenth(rim)} 0 0 1 ${at(stopDeg, rim)}`} />
      <path d={tens.map((angle) => `M${at(angle, rim)}L${at(angle, rim + 5)}`).join('')} />
      <path
        d={[-stopDeg, stopDeg]
          .map((angle) => `M${at(angle, rim - 6)}L${at(angle, rim + 9)}`)
          .join('')}
        className="stroke-ink"
        strokeWidth={2.5}
      />
    </g>
  )
}

/** Squares to the tiller where line and elastic are made fast: the best pull lies along them. */
function Square({ rig, place }: { rig: RigGeometry; place: DetailView['place'] }) {
  const length = Math.hypot(rig.tillerTip.x, rig.tillerTip.y) || 1
  const across = { x: -rig.tillerTip.y / length, y: rig.tillerTip.x / length }
  const ray = (on: Point, side: number) =>
    polyline([
      place(on),
      place({ x: on.x + across.x * side * 0.4, y: on.y + across.y * side * 0.4 }),
    ])
  return (
    <path
      d={`${ray(rig.tillerLine, rig.tack)}${ray(rig.tillerElastic, -rig.tack)}`}
      className="fill-none stroke-ink-soft"
      strokeWidth={0.9}
      strokeDasharray="3 3"
    />
  )
}

interface NumbersProps {
  plan: TillerDetailProps['plan']
  rig: RigGeometry
  view: DetailView
  active: PartKey | null
}

/** Circled numbers: they stand still for a setup, only their leader lines follow the parts. */
function Numbers({ plan, rig, view, active }: NumbersProps) {
  const parts = partsOf(plan)
  const standing = useMemo(() => standingNumbers(plan, view), [plan, view])
  const now = numberedPoints(rig)
  return standing.map(({ key, at }) => {
    const number = partNumber(parts, key)
    const point = now.get(key)
    if (number === undefined || !point) return null
    return (
      <Balloon
        key={key}
        part={view.place(point)}
        at={at}
        text={String(number)}
        strong={active === key}
      />
    )
  })
}

/** The point of each part that its number points to. */
function numberedPoints(rig: RigGeometry): Map<PartKey, Point> {
  const first = rig.line[1] ?? rig.tillerLine
  const points: [PartKey, Point][] = [
    ['sheet', mid(rig.hitch, rig.sheetBoom, 0.3)],
    ['hitch', rig.hitch],
    ['line', mid(rig.hitch, first, 0.5)],
    ['tiller', { x: rig.tillerTip.x * 0.42, y: rig.tillerTip.y * 0.42 }],
    ['elastic', mid(rig.cordFrom, rig.tillerElastic, 0.45)],
    ['elastic-anchor', rig.elasticAnchor],
    ...rig.leads.map((lead, index): [PartKey, Point] => [`lead.${index}`, lead]),
  ]
  return new Map(points)
}

function standingNumbers(plan: TillerDetailProps['plan'], view: DetailView) {
  const rest = {
    boomDeg: { [plan.setup.source]: trimmedAngle(plan, plan.setup.source) },
    tillerDeg: 0,
    hitchOutM: Math.max(0, plan.setup.line.takeUp),
    elasticStretchM: plan.setup.elastic.stretch,
  }
  const rig = rigGeometry(plan, rest)
  if (!rig) return []
  const { place, centre, radius } = view
  const wanted = [...numberedPoints(rig)]
    .filter(([key]) => key !== 'hitch' || plan.setup.line.pull === 'deflected')
    .map(([key, point]) => {
      const part = place(point)
      const out = key === 'line' || key === 'hitch' || key === 'sheet' ? -1 : 1
      return { key, part, at: { x: part.x + 26 * Math.sign(point.y || 1), y: part.y + 16 * out } }
    })
  const ends = [...rig.line, rig.tillerTip, rig.stock]
  const ink = [
    ...ends.flatMap((point, index) => {
      const before = ends[index - 1]
      return before ? alongInk(place(before), place(point)) : []
    }),
    ...alongInk(place(rig.sheetDeck), place(rig.sheetBoom)),
    ...[-9, 9].flatMap((offset) =>
      alongInk(
        lowered(place(rig.elasticAnchor), offset),
        lowered(place(rig.tillerElastic), offset),
      ),
    ),
  ]
  const places = placeBalloons(wanted, ink, centre, radius - balloonRadius - 4)
  return wanted.map(({ key }, index) => ({ key, at: places[index] ?? centre }))
}

function lowered(at: Anchor, by: number): Anchor {
  return { x: at.x, y: at.y + by }
}

function mid(a: Point, b: Point, part: number): Point {
  return { x: a.x + (b.x - a.x) * part, y: a.y + (b.y - a.y) * part }
}

/** What pulls, and how far from square, in the corners over the ring. */
function Pulls({ moment, measures, rig, width }: Omit<GearProps, 'view'>) {
  const angles = tillerAngles(rig)
  const { force, angle } = measures
  const line = { name: 'Line', newtons: moment.controlLineN, off: angles.line, ink: 'fill-line' }
  const elastic = {
    name: 'Elastic',
    newtons: moment.elasticN,
    off: angles.elastic,
    ink: 'fill-elastic',
  }
  const sides = rig.tack === 1 ? [elastic, line] : [line, elastic]
  return sides.map(({ name, newtons, off, ink }, index) => {
    const x = index === 0 ? 2 : width - 96
    return (
      <g key={name}>
        <text x={x} y={14} className={ink}>
          {`${name} `}
          <tspan className={ink} style={{ fontWeight: 600 }}>
            {force.format(newtons)}
          </tspan>
          {` ${force.unit}`}
        </text>
        <text x={x} y={33} className="fill-ink-soft">
          {`${angle.format(off)}° off square`}
        </text>
      </g>
    )
  })
}
