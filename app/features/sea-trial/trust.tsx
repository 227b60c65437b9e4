import { useMutation } from '@tanstack/react-query'
import { proxy } from 'comlink'
import { type ReactNode, useState } from 'react'
import type { HoldRate } from 'sim/trial/hold-rate'
import { clock } from '~/drawing/clock'
import type { Run } from '~/drawing/types'
import { simulateAnswerSchema } from '~/features/simulate/answer'
import type { SimulateBody } from '~/features/simulate/schema'
import { inWords, rounded, type Units } from '~/features/units/units'
import { Button } from '~/ui/button'
import { type Difference, differenceOf, isSame } from './difference'
import type { TrialState } from './state'
import { useLongJob } from './use-long-job'

const SEEDS = 10

interface Props {
  run: Run
  state: TrialState
  units: Units
}

/** What one run on one seed is worth: other seeds, a finer solver, another machine. */
export function Trust(props: Props) {
  return (
    <section aria-labelledby="trust" className="border-t border-hair px-4 py-6 md:px-margin">
      <h2 id="trust" className="text-head font-strong">
        How far to trust this run
      </h2>
      <div className="mt-3 grid gap-6 md:grid-cols-3">
        <OtherSeeds {...props} />
        <FinerSolver {...props} />
        <OtherMachine {...props} />
      </div>
    </section>
  )
}

function OtherSeeds({ run }: Props) {
  const { job, start, stop } = useLongJob<{ rate: HoldRate; of: Run['request'] }>()
  const [progress, setProgress] = useState({ held: 0, tried: 0 })
  const { request } = run

  function ask() {
    setProgress({ held: 0, tried: 0 })
    const onRun = proxy((held: number, tried: number) => setProgress({ held, tried }))
    void start(async (trials) => ({
      rate: await trials.holdRate(request, SEEDS, onRun),
      of: request,
    }))
  }

  return (
    <Question
      title="Other gusts and waves"
      text={`One run shows one stretch of weather. A setup holds when it holds in at least eight of ${SEEDS} of them.`}
      button={`Sail ${SEEDS} seeds`}
      running={job.stage === 'running'}
      onAsk={ask}
      onStop={stop}
    >
      {job.stage === 'running' && (
        <>
          <progress
            max={SEEDS}
            value={progress.tried}
            className="h-3 w-full appearance-none border border-ink bg-transparent [&::-webkit-progress-bar]:bg-transparent [&::-webkit-progress-value]:bg-ink"
          />
          <p>
            {progress.tried} of {SEEDS} sailed, {progress.held} held
          </p>
        </>
      )}
      {job.stage === 'done' && (
        <Stale is={job.answer.of !== request}>{rateInWords(job.answer.rate)}</Stale>
      )}
      {job.stage === 'failed' && job.message}
    </Question>
  )
}

function rateInWords({ held, of, interval: [low, high] }: HoldRate): string {
  const per = (share: number) => `${Math.round(share * 100)} %`
  return `Holds in ${held} of ${of}. From so few, the true share lies between ${per(low)} and ${per(high)} (95 %).`
}

function FinerSolver({ run, units }: Props) {
  const { job, start, stop } = useLongJob<{ difference: Difference; of: Run['request'] }>()
  const { request, result } = run
  return (
    <Question
      title="Finer steps"
      text="The quick run takes fixed steps. The adaptive solver makes its own, as fine as its tolerance asks."
      button="Compare with the adaptive solver"
      running={job.stage === 'running'}
      onAsk={() =>
        void start(async (trials) => {
          const other = request.solver === 'adaptive' ? 'fixed-step' : 'adaptive'
          const finer = await trials.run({ ...request, solver: other })
          return { difference: differenceOf(result.series, finer.series), of: request }
        })
      }
      onStop={stop}
    >
      {job.stage === 'running' && (
        <p>Computing; this takes several times as long as the quick run.</p>
      )}
      {job.stage === 'done' && (
        <Stale is={job.answer.of !== request}>
          {differenceInWords('adaptive run', job.answer.difference, units)}
        </Stale>
      )}
      {job.stage === 'failed' && job.message}
    </Question>
  )
}

function OtherMachine({ run, state, units }: Props) {
  const { request, result } = run
  const server = useMutation({
    mutationFn: async () => {
      const answer = await simulateOnServer(state)
      return { difference: differenceOf(result.series, answer.series), of: request }
    },
  })
  return (
    <Question
      title="Another machine"
      text="The run drawn was computed by this browser. The server computes it again: a run is meant to be the same on every machine."
      button="Compare with the server"
      running={server.isPending}
      onAsk={() => server.mutate()}
    >
      {server.isPending && <p>Computing.</p>}
      {server.data && (
        <Stale is={server.data.of !== request}>
          {differenceInWords('server’s run', server.data.difference, units)}
        </Stale>
      )}
      {server.error?.message}
    </Question>
  )
}

async function simulateOnServer(state: TrialState) {
  const body: SimulateBody = {
    setup: state.setupId,
    changes: { ...state.changes },
    conditions: { events: [...state.events] },
    helm: state.helm,
    solver: state.solver,
    durationS: state.durationS,
    outputIntervalS: 1,
  }
  const response = await fetch('/api/simulate', {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify(body),
  })
  const answer: unknown = await response.json()
  if (response.ok) return simulateAnswerSchema.parse(answer)
  const detail =
    typeof answer === 'object' && answer !== null && 'detail' in answer ? String(answer.detail) : ''
  throw new Error(`The server answered ${response.status}. ${detail}`)
}

function differenceInWords(other: string, difference: Difference, units: Units): string {
  if (isSame(difference)) return `To the last figure the same as the ${other}.`
  const course = inWords(rounded('deg', difference.courseDeg, units, 0.001))
  const tiller = inWords(rounded('deg', difference.tillerDeg, units, 0.001))
  const line = inWords(rounded('N', difference.lineN, units, 0.01))
  const most = `At most ${course} of course, ${tiller} of tiller and ${line} of line pull from the ${other}.`
  return difference.partedAtS === null
    ? most
    : `${most} They are a degree apart from ${clock(difference.partedAtS)} on.`
}

interface QuestionProps {
  title: string
  text: string
  button: string
  running: boolean
  onAsk: () => void
  onStop?: () => void
  children: ReactNode
}

function Question({ title, text, button, running, onAsk, onStop, children }: QuestionProps) {
  return (
    <div className="text-note">
      <h3 className="text-body font-strong">{title}</h3>
      <p className="mt-1 text-ink-soft">{text}</p>
      {running && onStop ? (
        <Button onClick={onStop} className="mt-2">
          Break off
        </Button>
      ) : (
        <Button onClick={onAsk} disabled={running} className="mt-2">
          {button}
        </Button>
      )}
      <div role="status" className="mt-2">
        {children}
      </div>
    </div>
  )
}

/** An answer for settings that have changed since says so. */
function Stale({ is, children }: { is: boolean; children: ReactNode }) {
  return (
    <p className={is ? 'text-ink-soft' : undefined}>
      {children}
      {is && ' This was before the last change; ask again.'}
    </p>
  )
}
