import { type KeyboardEvent, useEffect, useEffectEvent, useId, useRef, useState } from 'react'
import type { NumberSliderProps } from './types'

interface Draft {
  text: string
  problem: string | null
  /** Value it was typed over: when that changes from elsewhere the draft is void. */
  over: number
}

/** A rule to drag and a box to type into: one control for one number. */
export function NumberSlider(props: NumberSliderProps) {
  const { label, unit, unitName, value, min, max, step, mark, hint, error, disabled } = props
  const { format, parse, onInput, onCommit, whole, tight = false } = props
  const id = useId()
  const rule = useRef<HTMLInputElement>(null)
  const latestEntry = useRef(0)
  const [draft, setDraft] = useState<Draft | null>(null)
  const typed = draft?.over === value ? draft : null
  const problem = typed?.problem ?? error ?? null

  // React's onChange follows every movement; the browser's own change event is the letting go.
  const letGo = useEffectEvent(() => {
    if (rule.current) onCommit(Number(rule.current.value))
  })
  useEffect(() => {
    const input = rule.current
    input?.addEventListener('change', letGo)
    return () => input?.removeEventListener('change', letGo)
  }, [])

  async function enter(text: string) {
    const entry = ++latestEntry.current
    const read = await parse(text)
    if (entry !== latestEntry.current) return
    if (!read.ok) return setDraft({ text, problem: read.message, over: value })
    const refusal = rangeProblem(props, read.value)
    if (refusal) return setDraft({ text, problem: refusal, over: value })
    setDraft(null)
    onCommit(read.value)
  }

  function leave() {
    if (!typed || typed.problem) return
    if (typed.text === format(value)) setDraft(null)
    else void enter(typed.text)
  }

  function boxKey(event: KeyboardEvent<HTMLInputElement>) {
    const steps = { ArrowUp: 1, ArrowDown: -1, PageUp: 10, PageDown: -10 }[event.key]
    if (steps !== undefined) {
      event.preventDefault()
      const next = Math.min(max, Math.max(min, value + steps * step))
      setDraft(null)
      onCommit(Number(next.toPrecision(9)))
    } else if (event.key === 'Enter') {
      event.preventDefault()
      if (typed) void enter(typed.text)
    } else if (event.key === 'Escape' && typed) {
      event.preventDefault()
      setDraft(null)
    }
  }

  const describedBy = [hint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ')
  return (
    <div className="text-note">
      <div className={`flex items-end justify-between gap-3 ${tight ? 'h-8' : ''}`}>
        <label htmlFor={id} className={tight ? 'pb-1.5' : 'pb-2'}>
          {label}
        </label>
        <span className="flex shrink-0 items-baseline gap-1.5">
          <input
            id={id}
            type="text"
            inputMode={whole ? 'numeric' : 'decimal'}
            autoComplete="off"
            spellCheck={false}
            size={6}
            disabled={disabled}
            value={typed ? typed.text : format(value)}
            aria-invalid={problem ? true : undefined}
            aria-describedby={`${describedBy} ${id}-unit`.trim()}
            onChange={(event) => setDraft({ text: event.target.value, problem: null, over: value })}
            onBlur={leave}
            onKeyDown={boxKey}
            onFocus={(event) => event.target.select()}
            className={`h-touch w-20 border-b border-ink bg-transparent px-1 text-right text-body font-strong tabular-nums text-ink aria-invalid:border-b-3 disabled:text-ink-soft ${tight ? '-mt-3 pt-3' : ''}`}
          />
          <span className="w-9 text-ink-soft" aria-hidden="true">
            {unit}
          </span>
          <span id={`${id}-unit`} className="sr-only">
            {unitName}
          </span>
        </span>
      </div>
      <div className={tight ? 'rule -mb-1' : 'rule'}>
        <div className="rule-scale">
          {mark !== undefined && <Change from={share(props, mark)} to={share(props, value)} />}
        </div>
        <input
          ref={rule}
          type="range"
          min={min}
          max={max}
          step={step}
          value={value}
          disabled={disabled}
          aria-label={label}
          aria-valuetext={`${format(value)} ${unitName}`.trim()}
          aria-describedby={describedBy || undefined}
          onChange={(event) => {
            setDraft(null)
            onInput(Number(event.target.value))
          }}
        />
      </div>
      <p id={`${id}-problem`} aria-live="polite" className={problem ? 'font-strong' : 'sr-only'}>
        {problem}
      </p>
      {hint && (
        <p id={`${id}-hint`} className="text-ink-soft">
          {hint}
        </p>
      )}
    </div>
  )
}

/** The setup's own value on the rule, and how far the present one has left it. */
function Change({ from, to }: { from: number; to: number }) {
  return (
    <>
      <span
        className="rule-change"
        style={{ left: `${100 * Math.min(from, to)}%`, width: `${100 * Math.abs(to - from)}%` }}
      />
      <span className="rule-mark" style={{ left: `${100 * from}%` }} />
    </>
  )
}

function share({ min, max }: NumberSliderProps, value: number): number {
  return max > min ? Math.min(1, Math.max(0, (value - min) / (max - min))) : 0
}

/** Why a number cannot be taken, naming the field and its range; null when it can. */
export function rangeProblem(
  field: Pick<NumberSliderProps, 'label' | 'min' | 'max' | 'format' | 'unit' | 'whole'>,
  value: number,
): string | null {
  const { label, min, max, format, unit, whole } = field
  const range = `between ${format(min)} and ${format(max)} ${unit}`.trim()
  if (value < min || value > max) return `${label}: ${range}.`
  if (whole && !Number.isInteger(value)) return `${label}: a whole number ${range}.`
  return null
}
