import { type ReactNode, useId } from 'react'

interface NoteProps {
  /** Number of the part in the drawings. */
  number?: number | undefined
  title: string
  /** What it is now, units lighter than the number. */
  figure: string
  unit?: string
  open: boolean
  onToggle: () => void
  /** The controls, in place once open. */
  children: ReactNode
}

/** A note on the drawing: reads as text, opens the adjustment of the part it points to. */
export function Note({ number, title, figure, unit = '', open, onToggle, children }: NoteProps) {
  const id = useId()
  return (
    <div className="border-t border-ink-pale text-note">
      <button
        type="button"
        aria-expanded={open}
        aria-controls={id}
        onClick={onToggle}
        className="flex min-h-touch w-full cursor-pointer items-center gap-2 text-left"
      >
        {number !== undefined && <PartNumber number={number} strong={open} />}
        <span className="grow">{title}</span>
        <span className="whitespace-nowrap tabular-nums">
          <span className="font-strong">{figure}</span>
          {unit && <span className="text-ink-soft"> {unit}</span>}
        </span>
        <span aria-hidden="true" className="w-3 text-center text-ink-soft">
          {open ? '−' : '+'}
        </span>
      </button>
      <div id={id} hidden={!open} className="pb-3">
        {open && children}
      </div>
    </div>
  )
}

/** The circled number of a part, as in the drawings. */
export function PartNumber({ number, strong = false }: { number: number; strong?: boolean }) {
  return (
    <span
      className={`inline-flex size-6 shrink-0 items-center justify-center rounded-[50%] border border-ink-soft tabular-nums ${strong ? 'bg-ink text-paper' : 'text-ink'}`}
    >
      {number}
    </span>
  )
}
