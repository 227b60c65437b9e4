import type { Choice, Quantity } from 'sim/parameters/define'
import { parameterAt, readValue } from 'sim/plan/keys'
import { readEntry } from '~/features/units/entry'
import { reading, shownUnit, spokenUnit } from '~/features/units/units'
import { ChoiceField } from '~/ui/choice-field'
import { NumberSlider } from '~/ui/number-slider'
import { useAdjusting } from './adjusting'

/** The control of one value of the plan; `brief` is lower and leaves out what the value does. */
export function ParameterField({ name, brief = false }: { name: string; brief?: boolean }) {
  const { plan } = useAdjusting()
  const parameter = parameterAt(plan, name)
  if (!parameter) return null
  return parameter.type === 'choice' ? (
    <OptionField name={name} parameter={parameter} />
  ) : (
    <QuantityField name={name} parameter={parameter} brief={brief} />
  )
}

interface QuantityFieldProps {
  name: string
  parameter: Quantity
  brief: boolean
}

function QuantityField({ name, parameter, brief }: QuantityFieldProps) {
  const { plan, kept, units, refusals, dispatch } = useAdjusting()
  const { label, unit, min, max, step, effect, whole } = parameter
  const own = Number(readValue(kept, name))
  const shown = shownUnit(unit, units, step)
  const set = (value: number, drag: boolean) =>
    dispatch({ type: 'set', key: name, value, own, drag })
  return (
    <NumberSlider
      label={label}
      unit={shown.name}
      unitName={spokenUnit(shown.name)}
      value={Number(readValue(plan, name))}
      min={min}
      max={max}
      step={step}
      format={(value) => reading(unit, value, units, step).figure}
      parse={(text) => readEntry(text, unit, shown)}
      onInput={(value) => set(value, true)}
      onCommit={(value) => {
        set(value, true)
        dispatch({ type: 'let-go' })
      }}
      mark={own}
      hint={brief ? undefined : effect}
      tight={brief}
      error={refusals[name]}
      whole={whole}
    />
  )
}

function OptionField({ name, parameter }: { name: string; parameter: Choice }) {
  const { plan, kept, refusals, dispatch } = useAdjusting()
  const own = readValue(kept, name)
  return (
    <ChoiceField
      label={parameter.label}
      options={parameter.options}
      value={String(readValue(plan, name))}
      onChange={(value) => dispatch({ type: 'set', key: name, value, own })}
      hint={parameter.effect}
      error={refusals[name]}
    />
  )
}
