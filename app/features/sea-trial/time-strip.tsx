import { type Dispatch, useState } from 'react'
import type { Plan, TrialEvent } from 'sim/plan/types'
import { clock } from '~/drawing/clock'
import { Strip } from '~/drawing/strip'
import type { Ghost, Measures, Run } from '~/drawing/types'
import { Button } from '~/ui/button'
import { freshEvent } from './event-fields'
import type { Playback } from './playback'
import { type Action, MOST_EVENTS } from './state'
import { usePlayhead } from './use-playback'
import { useSize } from './use-size'
import { eventNames } from './wording'

interface Props {
  run: Run
  ghosts: readonly Ghost[]
  plan: Plan
  eventCount: number
  playback: Playback
  measures: Measures
  dispatch: Dispatch<Action>
}

const kinds = Object.keys(eventNames) as TrialEvent['kind'][]

/** The whole run on one time axis: dragging moves the cursor, and events are dropped into it. */
export function TimeStrip({ run, ghosts, plan, eventCount, playback, measures, dispatch }: Props) {
  const { timeS } = usePlayhead(playback)
  const [taken, setTaken] = useState<TrialEvent['kind'] | null>(null)
  const { ref, size } = useSize<HTMLDivElement>({ width: 920, height: 440 })
  const full = eventCount >= MOST_EVENTS

  function drop(atS: number) {
    if (!taken) return
    dispatch({ type: 'drop', event: freshEvent(taken, Math.round(atS), plan) })
    setTaken(null)
  }

  return (
    <section aria-label="The run over time" className="flex min-h-0 flex-1 flex-col">
      <div className="flex flex-wrap items-center gap-x-4 text-note">
        <span className="text-ink-soft">Drop in</span>
        {kinds.map((kind) => (
          <Button
            key={kind}
            weight="word"
            disabled={full}
            aria-pressed={taken === kind}
            onClick={() => setTaken(taken === kind ? null : kind)}
          >
            {eventNames[kind]}
          </Button>
        ))}
        <span className="min-h-touch flex flex-1 items-center gap-3">
          {taken && (
            <>
              Touch the strip where it should come, or
              <Button weight="word" onClick={() => drop(timeS)}>
                drop it at {clock(timeS)}
              </Button>
            </>
          )}
          {full && `No more than ${MOST_EVENTS} events; remove one first.`}
        </span>
      </div>
      <div ref={ref} className="-mt-1 h-100 min-w-0 xl:h-auto xl:min-h-104 xl:flex-1">
        <Strip
          {...size}
          run={run}
          ghosts={ghosts}
          cursorS={timeS}
          measures={measures}
          label={`Course to the wind, heel, tiller and loads over ${clock(run.request.durationS)}; read in words below`}
          onScrub={taken ? drop : playback.scrub}
        />
      </div>
    </section>
  )
}
