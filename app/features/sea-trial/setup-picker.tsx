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
      className="flex min-w-0 flex-wrap items-center gap-x-2 max-md:order-last max-md:basis-full"
    >
      <label htmlFor="setup" className="font-strong">
        <span className="sr-only">Setup of </span>
        {chosen?.boat.name}
      </label>
      <select
        id="setup"
        name="setup"
        value={setupId}
        onChange={(event) => void choose(event.target.value)}
        className="h-touch min-w-0 max-w-full text-ellipsis border-b border-ink pl-1 text-ink max-md:flex-1"
      >
        {grouped(entries).map(({ boat, setups }) => (
          <optgroup key={boat.id} label={`${boat.name}, ${boat.type}`}>
            {setups.map((entry) => (
              <option key={entry.id} value={entry.id}>
                {entry.flaw ? `${entry.name} (wrong on purpose)` : entry.name}
              </option>
            ))}
          </optgroup>
        ))}
      </select>
      {chosen && (
        <span className="text-ink-soft max-2xl:hidden">
          kept for {weatherInWords(chosen.conditions, units)}
        </span>
      )}
      <noscript>
        <button type="submit" className="min-h-touch border border-ink px-4">
          Take this setup
        </button>
      </noscript>
      <p role="alert" className="basis-full empty:hidden">
        {fault}
      </p>
    </form>
  )
}

/** What the setup in hand is, as a note on the sheet. */
export function AboutSetup({ entry }: { entry: SetupEntry | undefined }) {
  if (!entry) return null
  return (
    <div className="about max-w-measure text-note text-ink-soft">
      <p>{entry.summary}</p>
      <Flaw entry={entry} className="xl:hidden" />
    </div>
  )
}

/** What is wrong on purpose with a setup; beside the verdict where the sheet's corner is too small. */
export function Flaw({ entry, className }: { entry: SetupEntry | undefined; className: string }) {
  if (!entry?.flaw) return null
  return (
    <p className={`mt-2 border-l-2 border-ink pl-3 text-note text-ink ${className}`}>
      Wrong on purpose: {entry.flaw.text}
    </p>
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
