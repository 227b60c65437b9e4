import type { Plan, Sail } from 'sim/plan/types'
import { WindArrow } from './arrows'
import { Balloon } from './balloon'
import { detailFrame } from './detail-frame'
import { clamp, onPaper, radians, tackOf, tenth } from './frame'
import { rigGeometry, sheetLead } from './geometry'
import { ghostDash } from './ghost-dash'
import { HullDrawing } from './hull-drawing'
import { halfBreadthAt, hullOutline, mastX } from './hull-outline'
import { momentAt } from './moment'
import { partNumber, partsOf } from './parts'
import { ControlLine, ElasticCord, Sheet } from './rope'
import { Mast, Pole, Preventer, SailDrawing } from './sail-drawing'
import { type SailShape, sailShape } from './sail-shape'
import { ScaleBar } from './scale-bar'
import { RudderBlade, Tiller } from './tiller-drawing'
import type { Anchor, Moment, Run, SeaTrialSheetProps, Size } from './types'
import { Wake, Waves, windSwingDeg } from './water'
import {
  BandSector,
  CoursePointer,
  GhostPointer,
  namedCourses,
  RingFigures,
  RingGraduation,
} from './wind-ring'

/** Room over the ring for the true wind, and under it for the figure of a dead run. */
function topRoom({ width, height }: Size): number {
  return width < 600 || height < 560 ? 62 : 88
}
const footRoom = 36

/** Pixels of arrow per knot, the same for true and apparent wind. */
function arrowScale(run: Run): number {
  return clamp(50 / run.request.conditions.trueWindSpeedKn, 2.2, 5.2)
}

/** The sea trial: the wind from the top, the boat at her course to it, to scale. */
export function SeaTrialSheet(props: SeaTrialSheetProps) {
  const { run, moment, measures, ghosts = [], label, water = 'running', width, height } = props
  const { plan } = run.request
  const { hull } = plan.boat
  const top = topRoom({ width, height })
  const narrow = width < 600
  const radius = Math.round(Math.min(width / 2 - (narrow ? 58 : 76), (height - top - footRoom) / 2))
  const centre = { x: Math.round(width / 2), y: top + radius }
  const ring = { centre, radius }
  const scale = (1.5 * radius) / hull.lengthOverall
  const midships = hull.bowX - hull.lengthOverall / 2
  const turn = -moment.courseToWindDeg
  const onSheet = (point: Anchor): Anchor => turned(point, turn, centre, midships * scale)
  const gravityAt = onSheet(onPaper({ x: hull.centreOfGravityX, y: 0 }, scale))

  const shapes = sailShapes(plan, moment)
  const ghostCourses = ghosts.map(({ run: other }) => momentAt(other, moment.timeS).courseToWindDeg)
  const named = namedCourses(ring, moment.courseToWindDeg, ghostCourses)
  const written = [moment.courseToWindDeg, ...ghostCourses.filter((_, place) => named[place])]

  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      className="block h-full w-full overflow-hidden"
    >
      <Waves
        run={run}
        moment={moment}
        scale={scale}
        running={water === 'running'}
        width={width}
        height={height}
      />
      <BandSector ring={ring} band={run.result.band} />
      <RingGraduation centre={centre} radius={radius} />
      <RingFigures ring={ring} written={written} format={measures.angle.format} />
      <Wake
        run={run}
        moment={moment}
        scale={scale}
        at={gravityAt}
        sternPx={(hull.centreOfGravityX - hull.bowX + hull.lengthOverall) * scale + 4}
      />
      {ghosts.map((ghost, place) => (
        <GhostPointer
          key={ghost.helm}
          ring={ring}
          courseDeg={ghostCourses[place] ?? 0}
          label={named[place] ? ghost.label : null}
          dash={ghostDash[ghost.helm]}
        />
      ))}
      <CoursePointer
        ring={ring}
        courseDeg={moment.courseToWindDeg}
        text={`${measures.angle.format(Math.abs(moment.courseToWindDeg))}°`}
        from={(hull.lengthOverall / 2) * scale + 6}
        small={narrow}
      />
      <g
        transform={`translate(${centre.x} ${centre.y}) rotate(${tenth(turn)}) translate(0 ${tenth(midships * scale)})`}
      >
        <HullDrawing boat={plan.boat} scale={scale} />
        <Rigging {...props} scale={scale} shapes={shapes} />
      </g>
      <DetailRing {...props} scale={scale} onSheet={onSheet} />
      <SailNumbers {...props} scale={scale} onSheet={onSheet} shapes={shapes} />
      <ApparentWind {...props} scale={scale} onSheet={onSheet} turn={turn} />
      <TrueWind {...props} centre={centre} radius={radius} />
      <Going {...props} />
      <ScaleBar x={16} y={height - 14} scale={scale} measure={measures.length} room={width / 4} />
    </svg>
  )
}

/** From the boat's own paper, bow up and stock at the origin, to the sheet. */
function turned(point: Anchor, turnDeg: number, centre: Anchor, midshipsPx: number): Anchor {
  const [sin, cos] = [Math.sin(radians(turnDeg)), Math.cos(radians(turnDeg))]
  const y = point.y + midshipsPx
  return { x: centre.x + point.x * cos - y * sin, y: centre.y + point.x * sin + y * cos }
}

interface PlacedProps extends SeaTrialSheetProps {
  scale: number
  onSheet: (point: Anchor) => Anchor
}

/** Shapes of the sails that are set, foremost first. */
type Shapes = readonly { id: string; sail: Sail; shape: SailShape }[]

function sailShapes(plan: Plan, moment: Moment): Shapes {
  return Object.entries(plan.boat.sails)
    .sort(([, a], [, b]) => b.luffX - a.luffX)
    .flatMap(([id, sail]) => {
      const shape = moment.boomDeg[id] === undefined ? undefined : sailShape(plan, id, moment)
      return shape ? [{ id, sail, shape }] : []
    })
}

/** One line for all its parts: the detail shows them, and several side by side look like a spar. */
const sheetInk = { parts: 1, gap: 0, thin: 0.8, thick: 1.8 } as const

/** Everything rigged that moves, from the deck upwards. */
function Rigging(props: SeaTrialSheetProps & { scale: number; shapes: Shapes }) {
  const { run, moment, scale, shapes } = props
  const { plan } = run.request
  const rig = rigGeometry(plan, moment)
  const paper = (point: { x: number; y: number }) => onPaper(point, scale)
  const source = shapes.find(({ id }) => id === plan.setup.source)?.shape
  // The model leaves the sheet of a part-rolled headsail where the whole sail's is.
  const clew = source && !source.boom ? source.clew : undefined
  const masts = Object.values(plan.boat.sails).filter(
    ({ kind }) => kind === 'main' || kind === 'mizzen',
  )
  return (
    <>
      {rig && <RudderBlade boat={plan.boat} rig={rig} scale={scale} />}
      {shapes.map(({ id, sail, shape }) => {
        const deck = sheetLead(plan, id)
        if (!deck || id === plan.setup.source) return null
        const boom = shape.boom
          ? alongBoom(shape.boom, sail.sheetReach / sail.footLength)
          : shape.clew
        return (
          <Sheet
            key={id}
            deck={paper(deck)}
            boom={paper(boom)}
            tensionN={90}
            slack={(moment.drawing[id] ?? 0) < 0.05}
            {...sheetInk}
          />
        )
      })}
      {rig && (
        <>
          <Sheet
            deck={paper(rig.sheetDeck)}
            boom={paper(clew ?? rig.sheetBoom)}
            hitch={plan.setup.line.pull === 'deflected' ? paper(rig.hitch) : undefined}
            tensionN={moment.sheetN}
            slack={moment.sheetN < 2}
            {...sheetInk}
          />
          <Tiller boat={plan.boat} rig={rig} scale={scale} />
          <ElasticCord
            anchor={paper(rig.elasticAnchor)}
            cordFrom={paper(rig.cordFrom)}
            tiller={paper(rig.tillerElastic)}
            tensionN={moment.elasticN}
            naturalPx={plan.setup.elastic.naturalLength * scale}
            radius={3.2}
          />
          <ControlLine points={rig.line.map(paper)} tensionN={moment.controlLineN} />
        </>
      )}
      {shapes.map(({ id, shape }) => (
        <g key={id}>
          <SailDrawing shape={shape} scale={scale} />
          <Held plan={plan} sailId={id} shape={shape} scale={scale} />
        </g>
      ))}
      {masts.map((sail) => (
        <Mast key={sail.name} x={sail.luffX} scale={scale} />
      ))}
    </>
  )
}

/** What holds a sail besides its sheet. */
function Held(props: { plan: Plan; sailId: string; shape: SailShape; scale: number }) {
  const { plan, sailId, shape, scale } = props
  const held = plan.setup.trim[sailId]?.held
  if (held === 'pole' && !shape.boom)
    return <Pole from={{ x: mastX(plan.boat), y: 0 }} to={shape.clew} scale={scale} />
  if (held !== 'preventer' || !shape.boom) return null
  const from = alongBoom(shape.boom, 0.7)
  const outline = hullOutline(plan.boat)
  const x = Math.min(shape.boom[0].x + 1.2, outline.stem.x - 1)
  const y = Math.sign(from.y || 1) * (halfBreadthAt(outline, x) - 0.08)
  return <Preventer from={from} to={{ x, y }} scale={scale} />
}

function alongBoom(
  boom: readonly [{ x: number; y: number }, { x: number; y: number }],
  part: number,
) {
  const [gooseneck, end] = boom
  const share = part / 1.05
  return {
    x: gooseneck.x + (end.x - gooseneck.x) * share,
    y: gooseneck.y + (end.y - gooseneck.y) * share,
  }
}

/** The ring round what the detail shows. */
function DetailRing({ run, scale, onSheet }: PlacedProps) {
  const frame = detailFrame(run.request.plan)
  const at = onSheet(onPaper(frame.centre, scale))
  const radius = frame.radiusM * scale
  const away = tackOf(run.request.plan.setup.conditions) * -0.72
  const edge = {
    x: frame.centre.x - 0.69 * (frame.radiusM + 14 / scale),
    y: frame.centre.y + away * (frame.radiusM + 14 / scale),
  }
  const letter = onSheet(onPaper(edge, scale))
  return (
    <g className="fill-none stroke-ink-soft">
      <circle
        cx={tenth(at.x)}
        cy={tenth(at.y)}
        r={tenth(radius)}
        strokeWidth={1}
        strokeDasharray="10 3 2 3"
      />
      <text
        x={tenth(letter.x)}
        y={tenth(letter.y + 5)}
        textAnchor="middle"
        className="fill-ink stroke-paper [paint-order:stroke]"
        strokeWidth={4}
        style={{ fontWeight: 600 }}
      >
        A
      </text>
    </g>
  )
}

/** Circled numbers of the sails, to leeward of each. */
function SailNumbers(props: PlacedProps & { shapes: Shapes }) {
  const { run, moment, scale, onSheet, shapes } = props
  const parts = partsOf(run.request.plan)
  return shapes.map(({ id, shape }) => {
    const middle = shape.sections[0]?.[7]
    const number = partNumber(parts, `sail.${id}`)
    if (!middle || number === undefined) return null
    const side = (moment.boomDeg[id] ?? 0) < 0 ? -1 : 1
    const at = { x: middle.x + 0.1, y: middle.y + side * (30 / scale) }
    return (
      <Balloon
        key={id}
        part={onSheet(onPaper(middle, scale))}
        at={onSheet(onPaper(at, scale))}
        text={String(number)}
      />
    )
  })
}

function ApparentWind(props: PlacedProps & { turn: number }) {
  const { run, moment, scale, onSheet, turn } = props
  const { boat } = run.request.plan
  const mast = onSheet(onPaper({ x: mastX(boat), y: 0 }, scale))
  const fromDeg = turn + moment.apparentWindAngleDeg
  const length = clamp(moment.apparentWindSpeedKn * arrowScale(run), 14, 130)
  const away = { x: Math.sin(radians(fromDeg)), y: -Math.cos(radians(fromDeg)) }
  const tip = { x: mast.x + away.x * 7, y: mast.y + away.y * 7 }
  const tail = { x: tip.x + away.x * (length + 12), y: tip.y + away.y * (length + 12) }
  // Further aft the arrow lies along the deck, where a word would hide what is rigged.
  const overWater = Math.abs(moment.apparentWindAngleDeg) < 105
  return (
    <g>
      <WindArrow tipX={tip.x} tipY={tip.y} fromDeg={fromDeg} length={length} kind="apparent" />
      {overWater && (
        <text
          x={tenth(tail.x)}
          y={tenth(tail.y + 5)}
          textAnchor={Math.abs(away.x) < 0.5 ? 'middle' : away.x > 0 ? 'start' : 'end'}
          className="fill-ink-soft stroke-paper [paint-order:stroke]"
          strokeWidth={4}
        >
          apparent
        </text>
      )}
    </g>
  )
}

interface TrueWindProps extends SeaTrialSheetProps {
  centre: Anchor
  radius: number
}

/** At the top of the ring; it leans as the wind of the moment swings about the mean. Its words are
 * on the side she points to, the view from astern is on the other. */
function TrueWind({ run, moment, measures, centre, radius, width, height }: TrueWindProps) {
  const length = clamp(moment.windSpeedKn * arrowScale(run), 16, topRoom({ width, height }) - 20)
  const side = -tackOf(run.request.conditions)
  return (
    <g>
      <WindArrow
        tipX={centre.x}
        tipY={centre.y - radius - 14}
        fromDeg={windSwingDeg(moment)}
        length={length}
        kind="true"
      />
      <text
        x={centre.x + side * 24}
        y={20}
        textAnchor={side > 0 ? 'start' : 'end'}
        className="fill-ink stroke-paper [paint-order:stroke]"
        strokeWidth={4}
        style={{ fontWeight: 600 }}
      >
        {`${measures.windSpeed.format(moment.windSpeedKn)} `}
        <tspan className="fill-ink-soft" style={{ fontWeight: 400 }}>
          {measures.windSpeed.unit}, true wind
        </tspan>
      </text>
    </g>
  )
}

/** Speed, leeway and apparent wind in figures, in the lower right corner. */
function Going({ moment, measures, width, height }: SeaTrialSheetProps) {
  const { boatSpeed, windSpeed, angle } = measures
  const leeway = Math.abs(moment.leewayDeg)
  const astern = leeway > 90
  const apparent = angle.format(Math.abs(moment.apparentWindAngleDeg))
  const narrow = width < 400
  const edge = width - (narrow ? 38 : 70)
  const rows = [
    {
      name: 'Apparent',
      figure: windSpeed.format(moment.apparentWindSpeedKn),
      unit: narrow ? windSpeed.unit : `${windSpeed.unit}, ${apparent}°`,
    },
    {
      name: astern ? 'Sternway' : 'Speed',
      figure: boatSpeed.format(moment.speedKn),
      unit: boatSpeed.unit,
    },
    { name: 'Leeway', figure: angle.format(astern ? 180 - leeway : leeway), unit: angle.unit },
  ]
  return rows.map(({ name, figure, unit }, index) => {
    const y = height - 46 + 18 * index
    return (
      <g key={name} className="stroke-paper [paint-order:stroke]" strokeWidth={4}>
        <text x={edge - 94} y={y} className="fill-ink-soft">
          {name}
        </text>
        <text x={edge - 6} y={y} textAnchor="end" style={{ fontWeight: 600 }}>
          {figure}
        </text>
        <text x={unit === '°' ? edge - 5 : edge} y={y} className="fill-ink-soft">
          {unit}
        </text>
      </g>
    )
  })
}
