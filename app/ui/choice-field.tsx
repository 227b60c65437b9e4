import { useId } from 'react'

interface ChoiceFieldProps<Option extends string> {
  label: string
  options: Readonly<Record<Option, string>>
  value: Option
  onChange: (value: Option) => void
  hint?: string | undefined
  error?: string | null | undefined
  disabled?: boolean
}

/** One of a few: the browser's own list, which every hand, key and reader knows. */
export function ChoiceField<Option extends string>(props: ChoiceFieldProps<Option>) {
  const { label, options, value, onChange, hint, error, disabled } = props
  const id = useId()
  const describedBy = [hint && `${id}-hint`, error && `${id}-problem`].filter(Boolean).join(' ')
  return (
    <div className="text-note">
      <label htmlFor={id}>{label}</label>
      <select
        id={id}
        value={value}
        disabled={disabled}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy || undefined}
        onChange={(event) => onChange(event.target.value as Option)}
        className="h-touch w-full border-b border-ink pl-1 text-body font-strong text-ink aria-invalid:border-b-3 disabled:text-ink-soft"
      >
        {(Object.entries(options) as [Option, string][]).map(([option, text]) => (
          <option key={option} value={option}>
            {text}
          </option>
        ))}
      </select>
      {error && (
        <p id={`${id}-problem`} className="mt-1 font-strong">
          {error}
        </p>
      )}
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-ink-soft">
          {hint}
        </p>
      )}
    </div>
  )
}
