import { useAdjusting } from './adjusting'
import { adjustable, keysOfPart } from './adjustments'
import { ParameterField } from './parameter-field'

/** Every adjustment by the number of its part in the drawings. */
export function AdjustmentList() {
  const { plan } = useAdjusting()
  const { parts, stowed } = adjustable(plan)
  return (
    <section aria-labelledby="parts" className="px-4 py-6 md:px-margin">
      <h2 id="parts" className="text-head font-strong">
        Adjustments, part by part
      </h2>
      <ol className="mt-3 grid gap-x-8 gap-y-8 md:grid-cols-2 xl:grid-cols-3">
        {parts.map(({ key, number, name }) => (
          <li key={key} id={`part-${key}`} className="border-t border-ink pt-2">
            <h3 className="font-strong">
              <span className="mr-2 inline-block min-w-6 text-ink-soft">{number}</span>
              {name}
            </h3>
            <div className="mt-2 grid gap-3">
              {keysOfPart(key).map((name) => (
                <ParameterField key={name} name={name} />
              ))}
            </div>
          </li>
        ))}
        {stowed.map(({ sail, name, key }) => (
          <li key={sail} className="border-t border-hair pt-2">
            <h3 className="font-strong">{name}, below</h3>
            <div className="mt-2">
              <ParameterField name={key} />
            </div>
          </li>
        ))}
      </ol>
    </section>
  )
}
