import { useState } from 'react'
import type { PartKey } from '~/drawing/types'
import { Button } from '~/ui/button'
import { useAdjusting } from './adjusting'
import { adjustable } from './adjustments'
import { PartNote } from './notes'
import { ParameterField } from './parameter-field'

/** Every adjustment by the number of its part in the drawings. */
export function AdjustmentList() {
  const { plan } = useAdjusting()
  const { parts, stowed } = adjustable(plan)
  const [open, setOpen] = useState<readonly PartKey[]>([])
  const all = parts.map(({ key }) => key)
  const allOpen = all.every((key) => open.includes(key))
  return (
    <section aria-labelledby="parts" className="py-3">
      <div className="flex flex-wrap items-center justify-between gap-x-6">
        <h2 id="parts" className="text-head font-strong">
          Adjustments, part by part
        </h2>
        <Button weight="word" onClick={() => setOpen(allOpen ? [] : all)}>
          {allOpen ? 'Close all' : 'Open all'}
        </Button>
      </div>
      <ol className="mt-2 gap-x-8 md:columns-2 xl:columns-4">
        {parts.map((part) => (
          <li key={part.key} className="break-inside-avoid">
            <PartNote
              part={part}
              open={open.includes(part.key)}
              onToggle={() => setOpen(toggled(open, part.key))}
            />
          </li>
        ))}
        {stowed.map(({ sail, name, key }) => (
          <li key={sail} className="break-inside-avoid border-t border-ink-pale py-2">
            <h3 className="text-note">{name}, stowed</h3>
            <ParameterField name={key} />
          </li>
        ))}
      </ol>
    </section>
  )
}

function toggled(open: readonly PartKey[], key: PartKey): readonly PartKey[] {
  return open.includes(key) ? open.filter((other) => other !== key) : [...open, key]
}
