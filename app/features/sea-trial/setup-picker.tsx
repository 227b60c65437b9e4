import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import type { SetupEntry } from '~/features/setups/schema'
import type { Units } from '~/features/units/units'
import { planQuery } from './use-plan'
import { weatherInWords } from './wording'

interface Props {
  entries: readonly SetupEntry[]
  setupId: string
  units: Units
  onChoose: (setupId: string) => void
}

/** Boats with their setups; a plain form where there is no JavaScript. */
export function SetupPicker({ entries, setupId, units, onChoose }: Props) {
  const queries = useQueryClient()
  const [fault, setFault] = useState<string | null>(null)
  const chosen = entries.find((entry) => entry.id === setupId)

  async function choose(id: string) {
    setFault(null)
    try {
      await queries.ensureQueryData(planQuery(id))
      onChoose(id)
    } catch (error) {
      setFault(
        `That setup could not be fetched; this one stays in hand. ${error instanceof Error ? error.message : ''}`,
      )
    }
  }

  return (
    <form
      method="get"
      action="/"
      className="picker grid min-w-0 gap-x-6 xl:grid-cols-[minmax(24rem,34rem)_1fr]"
    >
      <div className="text-note">
        <label htmlFor="setup">Boat and setup</label>
        <select
          id="setup"
          name="setup"
          value={setupId}
          onChange={(event) => void choose(event.target.value)}
          className="h-touch w-full border-b border-ink pl-1 text-body font-strong text-ink"
        >
          {grouped(entries).map(({ boat, setups }) => (
            <optgroup key={boat.id} label={`${boat.name}, ${boat.type}`}>
              {setups.map((entry) => (
                <option key={entry.id} value={entry.id}>
                  {entry.flaw ? 'Wrong on purpose: ' : ''}
                  {entry.name} ({weatherInWords(entry.conditions, units)})
                </option>
              ))}
            </optgroup>
          ))}
        </select>
        <noscript>
          <button type="submit" className="mt-2 min-h-touch border border-ink px-4">
            Take this setup
          </button>
        </noscript>
      </div>
      <div className="max-w-measure text-note max-xl:mt-1 xl:self-end">
        <p className="text-ink-soft max-md:line-clamp-2">{chosen?.summary}</p>
        {chosen?.flaw && (
          <p className="border-l-2 border-ink pl-3">Wrong on purpose: {chosen.flaw.text}</p>
        )}
      </div>
      <p role="alert" className="text-note">
        {fault}
      </p>
    </form>
  )
}

function grouped(entries: readonly SetupEntry[]) {
  const boats = new Map<string, { boat: SetupEntry['boat']; setups: SetupEntry[] }>()
  for (const entry of entries) {
    const group = boats.get(entry.boat.id) ?? { boat: entry.boat, setups: [] }
    group.setups.push(entry)
    boats.set(entry.boat.id, group)
  }
  return [...boats.values()]
}
