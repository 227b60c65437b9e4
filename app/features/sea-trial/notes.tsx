import { useEffect, useRef } from 'react'
import { parameterAt, readValue } from 'sim/plan/keys'
import type { Part, PartKey } from '~/drawing/types'
import { type Reading, reading } from '~/features/units/units'
import { Note } from '~/ui/note'
import { type Adjusting, useAdjusting } from './adjusting'
import { keysOfPart, mainKeyOf } from './adjustments'
import { ParameterField } from './parameter-field'

interface Props {
  part: Part
  open: boolean
  onToggle: () => void
  /** Whether opening it leads the keyboard into it, as it must where it opens over the drawing. */
  leadsIn?: boolean
}

/** A note on a part: what it is set to, and its controls when opened. */
export function PartNote({ part, open, onToggle, leadsIn = false }: Props) {
  const adjusting = useAdjusting()
  const { figure, unit } = mainReading(part.key, adjusting)
  const whole = useRef<HTMLDivElement>(null)

  useEffect(() => {
    if (open && leadsIn) whole.current?.querySelector<HTMLElement>('input, select')?.focus()
  }, [open, leadsIn])

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: Escape in any control within closes it
    <div
      ref={whole}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || event.defaultPrevented || !open) return
        onToggle()
        whole.current?.querySelector('button')?.focus()
      }}
    >
      <Note
        number={part.number}
        title={part.name}
        figure={figure}
        unit={unit}
        open={open}
        onToggle={onToggle}
      >
        <div className="grid gap-3">
          {keysOfPart(part.key).map((key) => (
            <ParameterField key={key} name={key} />
          ))}
        </div>
      </Note>
    </div>
  )
}

function mainReading(part: PartKey, { plan, units }: Adjusting): Reading {
  const key = mainKeyOf(part)
  const parameter = key === undefined ? undefined : parameterAt(plan, key)
  if (key === undefined || parameter?.type !== 'quantity') return { figure: '', unit: '' }
  return reading(parameter.unit, Number(readValue(plan, key)), units, parameter.step)
}
