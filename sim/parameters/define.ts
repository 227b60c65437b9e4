/**
 * How a parameter is described. Every table in this folder is written with `quantity` and
 * `choice`; types, validation, sliders, number boxes, the address, the exports and the
 * reference page are derived from the tables and never written again.
 */

/** Units in which a document stores a value. Inside the solver everything is SI and radians. */
export type StoredUnit =
  | 'm'
  | 'm2'
  | 'kg'
  | 'kgm2'
  | 'deg'
  | 'kn'
  | 's'
  | 'mm'
  | 'N'
  | 'Nm'
  | 'MPa'
  | '%'
  | '1'

/** A number with a unit and a range, both ends allowed. */
export interface Quantity {
  readonly type: 'quantity'
  /** The sailor's words for it. */
  readonly label: string
  /** The field's symbol, as used in docs/model.md. */
  readonly symbol: string
  readonly unit: StoredUnit
  readonly min: number
  readonly max: number
  readonly step: number
  readonly default: number
  /** Where the default or an estimate of it comes from. */
  readonly source: string
  /** Whether only whole numbers are allowed. */
  readonly whole?: boolean
  /** What happens when it grows, in a sailor's words. */
  readonly effect?: string
}

/** One of a few options, by key, each with a sailor's words. */
export interface Choice<Option extends string = string> {
  readonly type: 'choice'
  readonly label: string
  readonly options: Readonly<Record<Option, string>>
  readonly default: NoInfer<Option>
  readonly source: string
  readonly effect?: string
}

/** One entry of a table. */
export type Parameter = Quantity | Choice

/** Parameters by their keys. */
export type ParameterTable = Readonly<Record<string, Parameter>>

/** The values a table describes: numbers for quantities, one of the options for choices. */
export type ValuesOf<Table extends ParameterTable> = {
  -readonly [Key in keyof Table]: Table[Key] extends Choice<infer Option> ? Option : number
}

/** An entry for a number. */
export function quantity(definition: Omit<Quantity, 'type'>): Quantity {
  return { type: 'quantity', ...definition }
}

/** An entry for a choice; its type knows the options. */
export function choice<Option extends string>(
  definition: Omit<Choice<Option>, 'type'>,
): Choice<Option> {
  return { type: 'choice', ...definition }
}

/** The default of every parameter in a table. */
export function defaultsOf<Table extends ParameterTable>(table: Table): ValuesOf<Table> {
  const values: Record<string, number | string> = {}
  for (const [key, parameter] of Object.entries(table)) values[key] = parameter.default
  return values as ValuesOf<Table>
}
