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
      <div className="relative">
        <select
          id={id}
          value={value}
          disabled={disabled}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy || undefined}
          onChange={(event) => onChange(event.target.value as Option)}
          className="h-touch w-full appearance-none border-b border-ink bg-transparent pr-8 pl-1 text-body font-strong text-ink aria-invalid:border-b-3 disabled:text-ink-soft [&>option]:bg-paper [&>option]:text-ink"
        >
          {(Object.entries(options) as [Option, string][]).map(([option, text]) => (
            <option key={option} value={option}>
              {text}
            </option>
          ))}
        </select>
        <svg
          viewBox="0 0 12 12"
          aria-hidden="true"
          className="pointer-events-none absolute top-4 right-1 size-3 fill-none stroke-ink"
        >
          <path d="M1.5 4L6 9L10.5 4" strokeWidth={1.5} />
        </svg>
      </div>
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
