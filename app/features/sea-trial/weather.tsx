import { useState } from 'react'
import { useAdjusting } from './adjusting'
import { furtherWeatherKeys, weatherKeys } from './adjustments'
import { ParameterField } from './parameter-field'
import { weatherInWords } from './wording'

/** Along the top edge, where the wind comes from; one line to unfold on a small screen. */
export function Weather() {
  const { plan, units } = useAdjusting()
  const [unfolded, setUnfolded] = useState(false)
  return (
    <section aria-label="Weather" className="[grid-area:weather]">
      <button
        type="button"
        aria-expanded={unfolded}
        aria-controls="weather"
        onClick={() => setUnfolded(!unfolded)}
        className="flex min-h-touch w-full items-center justify-between gap-3 border-b border-ink-pale text-left text-note md:hidden"
      >
        <span>
          <span className="font-strong">Weather</span>{' '}
          {weatherInWords(plan.setup.conditions, units)}
        </span>
        <span aria-hidden="true" className="text-ink-soft">
          {unfolded ? '−' : '+'}
        </span>
      </button>
      <div
        id="weather"
        className={`grid gap-x-6 gap-y-1 md:grid-cols-3 xl:grid-cols-5 ${unfolded ? '' : 'max-md:hidden'}`}
      >
        {weatherKeys.map((key) => (
          <ParameterField key={key} name={key} brief />
        ))}
      </div>
      <details className={unfolded ? '' : 'max-md:hidden'}>
        <summary className="flex min-h-touch w-fit cursor-pointer list-none items-center text-note underline underline-offset-4 [&::-webkit-details-marker]:hidden">
          Sea off the wind, and seed
        </summary>
        <div className="grid gap-x-6 gap-y-1 md:grid-cols-3 xl:grid-cols-5">
          {furtherWeatherKeys.map((key) => (
            <ParameterField key={key} name={key} brief />
          ))}
        </div>
      </details>
    </section>
  )
}
