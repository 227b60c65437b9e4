import { useCallback, useMemo, useState } from 'react'
import type { Plan } from 'sim/plan/types'
import { usePreferences } from '~/features/preferences/use-preferences'
import type { SetupEntry } from '~/features/setups/schema'
import { Masthead } from '~/features/shell/masthead'
import { Button } from '~/ui/button'
import { queryOf } from './address'
import { AdjustingProvider } from './adjusting'
import { AdjustmentList } from './adjustment-list'
import './sea-trial.css'
import { Drawings } from './drawings'
import { EventList } from './event-list'
import { firstSetup } from './first-setup'
import { measuresIn } from './measures'
import { PlayBar } from './play-bar'
import { Readings } from './readings'
import { refusalsOf, requestOf } from './request'
import { RunTools, StepTools } from './run-tools'
import { AboutSetup, Flaw, SetupPicker } from './setup-picker'
import { resultOf, type Sketch } from './sketch'
import type { TrialState } from './state'
import { TimeStrip } from './time-strip'
import { TitleBlock } from './title-block'
import { Trust } from './trust'
import { useInView } from './use-in-view'
import { usePlayback } from './use-playback'
import { useTrial } from './use-trial'
import { useTrialState } from './use-trial-state'
import { Verdict } from './verdict'
import { Weather } from './weather'
import { refusalsInWords } from './wording'

interface Props {
  entries: SetupEntry[]
  plan: Plan
  state: TrialState
  remarks: string[]
  sketch: Sketch
  sketched: TrialState
  date: string
}

export function SeaTrial(opening: Props) {
  const { entries, date } = opening
  const units = usePreferences()
  const measures = useMemo(() => measuresIn(units), [units])
  const [remarks, setRemarks] = useState(opening.remarks)
  const { history, state, kept, arrived, dispatch } = useTrialState(
    {
      plan: opening.plan,
      state: opening.state,
      setupId: firstSetup(entries)?.id ?? opening.plan.setup.id,
    },
    setRemarks,
  )

  const { changes, events, helm, solver, durationS } = state
  const request = useMemo(
    () => requestOf({ changes, events, helm, solver, durationS }, kept),
    [changes, events, helm, solver, durationS, kept],
  )
  const refusals = useMemo(
    () => refusalsInWords(refusalsOf(request), request.plan, units),
    [request, units],
  )
  const runnable = arrived && Object.keys(refusals).length === 0
  const [first] = useState(() => ({
    request: requestOf(opening.sketched, opening.plan),
    result: resultOf(opening.sketch),
  }))
  const { run, ghosts, computing, fault } = useTrial(runnable ? request : null, state.ghosts, first)
  const playback = usePlayback(run.request.durationS)
  const { ref: titleRef, inView } = useInView<HTMLDivElement>()

  const { plan } = request
  const entry = entries.find(({ id }) => id === state.setupId)
  const adjusting = useMemo(
    () => ({ kept, plan, units, refusals, dispatch }),
    [kept, plan, units, refusals, dispatch],
  )
  const letGo = useCallback(() => dispatch({ type: 'let-go' }), [dispatch])

  return (
    <AdjustingProvider value={adjusting}>
      <title>{`${plan.setup.name}, ${plan.boat.name} · Sea trial · Counterhelm`}</title>
      <Masthead query={queryOf(state)}>
        <SetupPicker
          entries={entries}
          setupId={state.setupId}
          units={units}
          onChoose={(setupId) => {
            setRemarks([])
            dispatch({ type: 'choose-setup', setupId })
          }}
        />
        <StepTools history={history} dispatch={dispatch} />
      </Masthead>
      <main data-computing={computing || undefined} onPointerUp={letGo}>
        <h1 className="sr-only">Sea trial</h1>
        {remarks.length > 0 && (
          <div
            role="status"
            className="flex items-start justify-between gap-6 border-b border-ink px-4 text-note md:px-margin"
          >
            <ul className="py-3">
              {remarks.map((remark) => (
                <li key={remark}>{remark}</li>
              ))}
            </ul>
            <Button weight="word" onClick={() => setRemarks([])}>
              Close
            </Button>
          </div>
        )}
        <noscript>
          <p className="border-b border-ink px-4 py-2 text-note md:px-margin">
            Without JavaScript this page shows the setup, her course at the start and the verdict of
            a run computed by the server. Playing and adjusting need JavaScript.
          </p>
        </noscript>
        <div className="trial-sheet px-4 pt-2 md:px-margin md:pt-4">
          <Weather />
          <Drawings run={run} ghosts={ghosts} playback={playback} measures={measures} />
          <AboutSetup entry={entry} />
          <div ref={titleRef} className="verdict">
            <Verdict run={run} units={units} refusals={refusals} fault={fault} />
            <Flaw entry={entry} className="max-xl:hidden" />
          </div>
          <div className="strip flex min-w-0 flex-col">
            <TimeStrip
              run={run}
              ghosts={ghosts}
              plan={plan}
              eventCount={state.events.length}
              playback={playback}
              measures={measures}
              dispatch={dispatch}
            />
            <RunTools history={history} run={run} dispatch={dispatch} />
          </div>
          <div className="list">
            <EventList events={state.events} durationS={state.durationS} />
            <AdjustmentList />
          </div>
          <div className="title">
            <TitleBlock run={run} units={units} date={date} />
          </div>
        </div>
        <Readings run={run} playback={playback} measures={measures} />
        <Trust run={run} state={state} units={units} />
        <PlayBar playback={playback} verdict={inView ? null : run.result.verdict.text} />
      </main>
    </AdjustingProvider>
  )
}
