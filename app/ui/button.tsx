import type { ComponentProps } from 'react'

interface ButtonProps extends ComponentProps<'button'> {
  /** `strong` for the one thing to do, `plain` for the rest, `word` within a line of text. */
  weight?: 'strong' | 'plain' | 'word'
}

const weights = {
  strong: 'border border-ink bg-ink px-4 font-strong text-paper disabled:border-ink-pale',
  plain:
    'border border-ink bg-transparent px-4 text-ink aria-pressed:bg-ink aria-pressed:text-paper disabled:border-ink-pale',
  word: 'text-ink underline decoration-1 underline-offset-4 hover:decoration-2 aria-pressed:font-strong aria-pressed:decoration-2',
} as const

/** Words, not icons; square corners; never smaller than a gloved finger. */
export function Button({
  weight = 'plain',
  className = '',
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      className={`min-h-touch min-w-touch cursor-pointer text-note disabled:cursor-not-allowed disabled:text-ink-soft disabled:no-underline ${weights[weight]} ${className}`}
      {...rest}
    />
  )
}
