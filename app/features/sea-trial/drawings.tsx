import { useMemo, useState } from 'react'
import { balloonRadius } from '~/drawing/balloon'
import { tenth } from '~/drawing/frame'
import { SeaTrialSheet } from '~/drawing/sea-trial-sheet'
import { SternView } from '~/drawing/stern-view'
import { partAnchors, TillerDetail } from '~/drawing/tiller-detail'
import type { Anchor, Ghost, Measures, PartAnchors, PartKey, Run, Size } from '~/drawing/types'
import { useAdjusting } from './adjusting'
import { adjustable } from './adjustments'
import { NOTE, type NotePlace, notePlaces } from './note-places'
import { PartNote } from './notes'
import type { Playback } from './playback'
import { useMoment } from './use-playback'
import { useSize } from './use-size'
import { courseInWords } from './wording'

interface Props {
  run: Run
  ghosts: readonly Ghost[]
  playback: Playback
  measures: Measures
}

/** The boat from above, from astern, and her steering gear with a note on each part. */
export function Drawings(props: Props) {
  const { ref, size } = useSize<HTMLDivElement>({ width: 684, height: 468 })
  return (
    <>
      <div className="sheet relative min-w-0">
        <div ref={ref} className="h-full">
          <FromAbove {...props} size={size} />
        </div>
        <FromAstern {...props} />
      </div>
      <SteeringGear {...props} />
    </>
  )
}

function FromAbove({ run, ghosts, playback, measures, size }: Props & { size: Size }) {
  const { moment, water } = useMoment(run, playback)
  const { boat, setup } = run.request.plan
  const asked = courseInWords(run.request.conditions.trueWindAngleDeg)
  return (
    <SeaTrialSheet
      {...size}
      run={run}
      moment={moment}
      measures={measures}
      ghosts={ghosts}
      water={water}
      label={`${boat.name} from above with the wind from the top of the sheet: ${setup.name}, asked to hold ${asked}`}
    />
  )
}

/** In the corner she points away from. */
function FromAstern({ run, playback, measures }: Props) {
  const { moment } = useMoment(run, playback)
  const { ref, size } = useSize<HTMLDivElement>({ width: 160, height: 128 })
  const corner = run.request.conditions.trueWindAngleDeg < 0 ? 'left-0' : 'right-0'
  return (
    <div ref={ref} className={`absolute top-0 h-22 w-24 md:h-28 md:w-28 xl:h-32 xl:w-40 ${corner}`}>
      <SternView
        {...size}
        plan={run.request.plan}
        moment={moment}
        measures={measures}
        label="Heel, seen from astern"
      />
    </div>
  )
}

const openedNote = 'z-20 max-h-[70dvh] w-80 overflow-y-auto bg-cloth px-3 outline outline-ink'

function SteeringGear({ run, playback, measures }: Props) {
  const { plan } = useAdjusting()
  const [open, setOpen] = useState<PartKey | null>(null)
  const { ref, size, measured } = useSize<HTMLDivElement>({ width: 292, height: 414 })
  const { parts } = adjustable(plan)
  const anchors = useMemo(() => partAnchors({ plan, ...size }), [plan, size])
  const places = notePlaces(
    parts.map(({ key }) => key),
    anchors,
    size,
  )
  const toggle = (key: PartKey) => setOpen(open === key ? null : key)
  const sails = parts.filter(({ key }) => key.startsWith('sail.'))
  return (
    <section aria-label="Steering gear" className="gear flex min-w-0 flex-col">
      <div className="relative grid min-h-0 flex-1 grid-cols-1 gap-x-3 xl:grid-cols-[11.5rem_1fr_11.5rem]">
        <div ref={ref} className="min-h-0 min-w-0 xl:col-start-2">
          <Detail
            run={run}
            playback={playback}
            measures={measures}
            size={size}
            anchors={anchors}
            places={measured ? places : []}
            active={open}
          />
        </div>
        <div className="max-xl:hidden">
          {places.map(({ part: key, side, top }) => {
            const part = parts.find((other) => other.key === key)
            if (!part) return null
            return (
              <div
                key={key}
                className={`absolute ${side === 'left' ? 'right-[calc(100%-11.5rem)]' : 'right-0'} ${open === key ? openedNote : ''}`}
                style={{ top, width: open === key ? undefined : NOTE.width }}
              >
                <PartNote part={part} open={open === key} onToggle={() => toggle(key)} leadsIn />
              </div>
            )
          })}
        </div>
      </div>
      <div className="mt-2 grid grid-cols-3 gap-4 max-xl:hidden">
        {sails.map((part) => (
          <div key={part.key} className="relative h-touch">
            <div className={open === part.key ? `absolute bottom-0 left-0 ${openedNote}` : ''}>
              <PartNote
                part={part}
                open={open === part.key}
                onToggle={() => toggle(part.key)}
                leadsIn
              />
            </div>
          </div>
        ))}
      </div>
    </section>
  )
}

interface DetailProps extends Omit<Props, 'ghosts'> {
  size: Size
  anchors: PartAnchors
  /** Of the notes that leader lines run to: none while the page does not know its size. */
  places: readonly NotePlace[]
  active: PartKey | null
}

function Detail({ run, playback, measures, size, anchors, places, active }: DetailProps) {
  const { plan } = useAdjusting()
  const { moment } = useMoment(run, playback)
  return (
    <div className="relative h-full">
      <TillerDetail
        {...size}
        plan={plan}
        moment={moment}
        measures={measures}
        active={active}
        label="Detail A: tiller, control line, leads and elastic from above, bow up"
      />
      <svg
        aria-hidden="true"
        className="pointer-events-none absolute inset-0 h-full w-full overflow-visible max-xl:hidden"
      >
        {places.map(({ part, side, top }) => {
          const at = anchors[part]
          if (!at) return null
          const x = side === 'left' ? -10 : size.width + 10
          return (
            <path
              key={part}
              d={leader({ x, y: top + NOTE.height / 2 }, at)}
              className={active === part ? 'stroke-ink' : 'stroke-ink-pale'}
              strokeWidth={1}
            />
          )
        })}
      </svg>
    </div>
  )
}

/** From a note to the rim of its circled number. */
function leader(from: Anchor, to: Anchor): string {
  const [dx, dy] = [to.x - from.x, to.y - from.y]
  const part = 1 - balloonRadius / (Math.hypot(dx, dy) || 1)
  return `M${from.x} ${from.y}L${tenth(from.x + dx * part)} ${tenth(from.y + dy * part)}`
}
