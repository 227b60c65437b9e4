/** What was typed into a box, read as a number in the stored unit. */
export type Entry = { ok: true; value: number } | { ok: false; message: string }

/** Slider and exact box of one quantity; values are in the stored unit throughout. */
export interface NumberSliderProps {
  /** The sailor's words, e.g. 'Hitch, from the deck block'. */
  label: string
  /** Written after the box, e.g. 'cm'. */
  unit: string
  /** Read aloud, e.g. 'centimetres'. */
  unitName: string
  value: number
  min: number
  max: number
  step: number
  /** The number alone, in the unit shown. */
  format: (value: number) => string
  /** Stored value of what was typed, units understood (their tables are fetched when first
   * needed), or the sentence that says what is wrong with it. */
  parse: (text: string) => Promise<Entry>
  /** While dragging: many times. */
  onInput: (value: number) => void
  /** Once per drag, key press or entry: one step to undo. */
  onCommit: (value: number) => void
  /** Value to mark on the rule, such as the setup's own. */
  mark?: number
  /** What happens when it grows. */
  hint?: string
  /** From the model or the server: shown until the value changes. */
  error?: string | null
  disabled?: boolean
  /** Lower, for a row of them along the head of a page; the box's target reaches above it. */
  tight?: boolean
  /** Whole numbers only. */
  whole?: boolean
}
