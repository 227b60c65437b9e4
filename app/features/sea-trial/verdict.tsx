import type { Run } from '~/drawing/types'
import type { Units } from '~/features/units/units'
import { type Refusals, reasonInWords } from './wording'

interface Props {
  run: Run
  units: Units
  refusals: Refusals
  fault: string | null
}

/** What became of the run, in the largest type of the page, and why. */
export function Verdict({ run, units, refusals, fault }: Props) {
  const { text, reason } = run.result.verdict
  const refused = Object.values(refusals)
  return (
    <div role="status">
      <p className="text-title font-strong text-balance lg:text-verdict">{text}</p>
      <p className="mt-1 max-w-measure text-note text-ink-soft">{reasonInWords(reason, units)}</p>
      {refused.length > 0 && (
        <div className="mt-2 border-l-2 border-ink pl-3 text-note">
          <p className="font-strong">
            Not computed as it is set now; the run drawn is the last one.
          </p>
          <ul>
            {refused.map((message) => (
              <li key={message}>{message}</li>
            ))}
          </ul>
        </div>
      )}
      {fault && (
        <p className="mt-2 border-l-2 border-ink pl-3 text-note">
          This browser could not compute the run: {fault} The run drawn is the last one.
        </p>
      )}
    </div>
  )
}
