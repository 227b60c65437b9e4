import { useState } from 'react'
import { Button } from '~/ui/button'
import { useAdjusting } from './adjusting'
import { furtherWeatherKeys, weatherKeys } from './adjustments'
import { ParameterField } from './parameter-field'
import { weatherInWords } from './wording'

/** Along the top edge, where the wind comes from; one line to unfold on a small screen. */
export function Weather() {
  const { plan, units } = useAdjusting()
  const [unfolded, setUnfolded] = useState(false)
  const [further, setFurther] = useState(false)
  return (
    <section aria-label="Weather" className="weather">
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
        className={`grid items-start gap-x-6 gap-y-1 md:max-xl:mt-2 md:grid-cols-3 xl:grid-cols-[repeat(5,minmax(0,1fr))_5rem] ${unfolded ? '' : 'max-md:hidden'}`}
      >
        {weatherKeys.map((key) => (
          <ParameterField key={key} name={key} brief />
        ))}
        <Button
          weight="word"
          className="mt-4 justify-self-start text-left"
          aria-expanded={further}
          onClick={() => setFurther(!further)}
        >
          {further ? 'Less of it' : 'Sea angle, seed'}
        </Button>
        {further && furtherWeatherKeys.map((key) => <ParameterField key={key} name={key} brief />)}
      </div>
    </section>
  )
}
