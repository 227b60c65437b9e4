import type { TrialEvent } from 'sim/plan/types'
import { clock } from '~/drawing/clock'
import { readEntry } from '~/features/units/entry'
import { reading, shownUnit, spokenUnit } from '~/features/units/units'
import { Button } from '~/ui/button'
import { ChoiceField } from '~/ui/choice-field'
import { NumberSlider } from '~/ui/number-slider'
import { useAdjusting } from './adjusting'
import { type EventField, fieldsOf, reefable } from './event-fields'
import { eventInWords, eventNames } from './wording'

interface Props {
  events: readonly TrialEvent[]
  durationS: number
}

/** What was dropped into the run: each can be altered and taken out again. */
export function EventList({ events, durationS }: Props) {
  const { plan, units, dispatch } = useAdjusting()
  if (events.length === 0) return null
  return (
    <section aria-labelledby="events" className="py-3">
      <h2 id="events" className="text-head font-strong">
        Dropped into the run
      </h2>
      <ol className="mt-3 grid gap-8 md:grid-cols-2 xl:grid-cols-3">
        {events.map((event, index) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: an event has no identity but its place
          <li key={index} className="border-t border-ink pt-2">
            <div className="flex items-center justify-between gap-3">
              <h3 className="font-strong">
                {clock(event.atS)} {eventInWords(event, plan, units)}
              </h3>
              <Button
                weight="word"
                aria-label={`Take out: ${eventNames[event.kind]} at ${clock(event.atS)}`}
                onClick={() => dispatch({ type: 'remove-event', index })}
              >
                Take out
              </Button>
            </div>
            <div className="grid gap-3">
              {event.kind === 'reef' && <ReefedSail event={event} index={index} />}
              {fieldsOf(event.kind, durationS).map((field) => (
                <EventNumber key={field.name} event={event} index={index} field={field} />
              ))}
            </div>
          </li>
        ))}
      </ol>
    </section>
  )
}

function EventNumber(props: { event: TrialEvent; index: number; field: EventField }) {
  const { event, index, field } = props
  const { units, dispatch } = useAdjusting()
  const { name, label, unit, step, min, max } = field
  const shown = shownUnit(unit, units, step)
  const alter = (value: number) =>
    dispatch({ type: 'alter-event', index, event: { ...event, [name]: value }, drag: true })
  return (
    <NumberSlider
      label={label}
      unit={shown.name}
      unitName={spokenUnit(shown.name)}
      value={Number((event as Record<string, unknown>)[name])}
      min={min}
      max={max}
      step={step}
      format={(value) => reading(unit, value, units, step).figure}
      parse={(text) => readEntry(text, unit, shown)}
      onInput={alter}
      onCommit={(value) => {
        alter(value)
        dispatch({ type: 'let-go' })
      }}
    />
  )
}

function ReefedSail({ event, index }: { event: TrialEvent & { kind: 'reef' }; index: number }) {
  const { plan, dispatch } = useAdjusting()
  const sails = reefable(plan).map(({ id, name }) => [id, name] as const)
  return (
    <ChoiceField
      label="Sail"
      options={Object.fromEntries(sails)}
      value={event.sail}
      onChange={(sail) => dispatch({ type: 'alter-event', index, event: { ...event, sail } })}
    />
  )
}
