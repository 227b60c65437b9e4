import { type Dispatch, useState } from 'react'
import type { Run } from '~/drawing/types'
import { Button } from '~/ui/button'
import { linkQueryOf, queryOf } from './address'
import { csvName, runAsCsv } from './export'
import { type Action, allGhosts, durationsS, type Ghost, type History, startOf } from './state'
import { helmNames } from './title-block'
import { ghostLabels } from './use-trial'

const solverNames = { 'fixed-step': 'fixed, quick', adaptive: 'adaptive, slow' } as const

interface Props {
  history: History
  run: Run
  dispatch: Dispatch<Action>
}

/** Taking back what was set. */
export function StepTools({ history, dispatch }: Omit<Props, 'run'>) {
  const { present, past, future } = history
  const untouched = queryOf(present) === queryOf(startOf(present.setupId))
  return (
    <div className="flex items-center gap-x-3 max-md:order-last max-md:gap-x-1">
      <Button weight="word" disabled={past.length === 0} onClick={() => dispatch({ type: 'undo' })}>
        Undo
      </Button>
      <Button
        weight="word"
        disabled={future.length === 0}
        onClick={() => dispatch({ type: 'redo' })}
      >
        Redo
      </Button>
      <Button
        weight="word"
        disabled={untouched}
        onClick={() => dispatch({ type: 'take-all-back' })}
      >
        Undo all
      </Button>
    </div>
  )
}

/** Who steers, how long, what sails beside her, and handing the run on. */
export function RunTools({ history, run, dispatch }: Props) {
  const { present } = history
  return (
    <div className="flex flex-wrap items-center gap-x-6 text-note">
      <label className="flex items-center gap-2 text-ink-soft">
        Helm
        <select
          className="h-touch text-ink"
          value={present.helm}
          onChange={(event) =>
            dispatch({ type: 'run', helm: event.target.value as keyof typeof helmNames })
          }
        >
          {Object.entries(helmNames).map(([helm, name]) => (
            <option key={helm} value={helm}>
              {name}
            </option>
          ))}
        </select>
      </label>
      <label className="flex items-center gap-2 text-ink-soft">
        Steps
        <select
          className="h-touch text-ink"
          value={present.solver}
          onChange={(event) =>
            dispatch({ type: 'run', solver: event.target.value as keyof typeof solverNames })
          }
        >
          {Object.entries(solverNames).map(([solver, name]) => (
            <option key={solver} value={solver}>
              {name}
            </option>
          ))}
        </select>
      </label>
      <label className="flex items-center gap-2 text-ink-soft">
        Length of the run
        <select
          className="h-touch text-ink"
          value={present.durationS}
          onChange={(event) => dispatch({ type: 'run', durationS: Number(event.target.value) })}
        >
          {durationsS.map((seconds) => (
            <option key={seconds} value={seconds}>
              {seconds / 60} min
            </option>
          ))}
        </select>
      </label>
      <fieldset className="flex items-center gap-x-4">
        <legend className="float-left mr-3 text-ink-soft">Beside her, the tiller</legend>
        {allGhosts.map((ghost) => (
          <label key={ghost} className="flex h-touch items-center gap-2">
            <input
              type="checkbox"
              className="size-5 appearance-none border border-ink checked:border-2 checked:bg-ink"
              checked={present.ghosts.includes(ghost)}
              onChange={() => dispatch({ type: 'run', ghosts: toggled(present.ghosts, ghost) })}
            />
            {ghostLabels[ghost]}
          </label>
        ))}
      </fieldset>
      <HandOn history={history} run={run} />
    </div>
  )
}

function toggled(ghosts: readonly Ghost[], ghost: Ghost): readonly Ghost[] {
  return allGhosts.filter((other) => ghosts.includes(other) !== (other === ghost))
}

function HandOn({ history, run }: { history: History; run: Run }) {
  const [said, setSaid] = useState('')
  const link = () => `${window.location.origin}/${linkQueryOf(history.present)}`

  async function copy() {
    try {
      await navigator.clipboard.writeText(link())
      setSaid('Link copied.')
    } catch {
      setSaid(`This browser does not let a page copy. The link: ${link()}`)
    }
  }

  function save() {
    const file = new Blob([runAsCsv(run, link())], { type: 'text/csv' })
    const address = URL.createObjectURL(file)
    const anchor = document.createElement('a')
    anchor.href = address
    anchor.download = csvName(run)
    anchor.click()
    URL.revokeObjectURL(address)
    setSaid(`Saved as ${csvName(run)}.`)
  }

  return (
    <>
      <Button weight="word" onClick={() => void copy()}>
        Copy link
      </Button>
      <Button weight="word" onClick={save}>
        Save traces (CSV)
      </Button>
      <span role="status" className="min-w-0 break-all text-ink-soft">
        {said}
      </span>
    </>
  )
}
