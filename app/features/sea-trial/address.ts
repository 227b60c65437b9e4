/**
 * The state of a sea trial as a short text for the address, and back.
 *
 *   1~0.1.0~co.trWndSpdKn_14~tr.main.rf_20~gust_120_6_15~helm_lashed
 *
 * First the form's version, then the model's, then only what differs from the setup as it is kept.
 * Names of values are their parameter keys without most vowels: a name depends on its own key
 * alone, so a new parameter never changes the meaning of an old address. Only characters that no
 * address has to escape are used.
 */
import { checkValue, keysOf, parameterAt, readValue, type Value, withValue } from 'sim/plan/keys'
import { trialEventSchema } from 'sim/plan/schema'
import type { Helm, Plan, TrialEvent } from 'sim/plan/types'
import type { Solver } from 'sim/trial/types'
import { MODEL_VERSION } from 'sim/version'
import { allGhosts, durationsS, type Ghost, MOST_EVENTS, startOf, type TrialState } from './state'

const FORM = '1'
const BETWEEN = '~'
const WITHIN = '_'

const helms: readonly Helm[] = ['sheet-to-tiller', 'lashed', 'free']
const solvers: readonly Solver[] = ['fixed-step', 'adaptive']

const eventFields = {
  gust: ['strengthKn', 'durationS'],
  'wind-shift': ['angleDeg', 'durationS'],
  'wave-set': ['heightM', 'durationS'],
  reef: ['sail', 'percent'],
} as const satisfies Record<TrialEvent['kind'], readonly string[]>

/** `conditions.trueWindSpeedKn` becomes `co.trWndSpdKn`. */
export function shortName(key: string): string {
  const path = key.split('.')
  const group = (path[0] ?? '').slice(0, 2)
  const name = path.length > 1 ? terse(path.at(-1) ?? '') : ''
  return [group, ...path.slice(1, -1), ...(name ? [name] : [])].join('.')
}

function terse(name: string): string {
  return name
    .split(/(?=[A-Z])/)
    .map((word) => (word.charAt(0) + word.slice(1).replace(/[aeiou]/g, '')).slice(0, 4))
    .join('')
}

export function encode(state: TrialState): string {
  const start = startOf(state.setupId)
  const items = [FORM, MODEL_VERSION]
  for (const [key, value] of Object.entries(state.changes)) {
    items.push(`${shortName(key)}${WITHIN}${value}`)
  }
  for (const event of state.events) {
    const fields = eventFields[event.kind].map((name) => (event as Record<string, unknown>)[name])
    items.push([event.kind, event.atS, ...fields].join(WITHIN))
  }
  if (state.helm !== start.helm) items.push(`helm${WITHIN}${state.helm}`)
  if (state.solver !== start.solver) items.push(`solver${WITHIN}${state.solver}`)
  if (state.durationS !== start.durationS) items.push(`for${WITHIN}${state.durationS}`)
  if (!sameGhosts(state.ghosts, start.ghosts)) {
    items.push(['beside', ...state.ghosts].join(WITHIN))
  }
  return items.join(BETWEEN)
}

/** The page's query, with the state left out where it is the setup as it is kept. */
export function queryOf(state: TrialState): string {
  const code = encode(state)
  const plain = code === encode(startOf(state.setupId))
  return plain ? `?setup=${state.setupId}` : `?setup=${state.setupId}&trial=${code}`
}

/** The query of a link to hand on: the model's version is always in it. */
export function linkQueryOf(state: TrialState): string {
  return `?setup=${state.setupId}&trial=${encode(state)}`
}

export interface Decoded {
  state: TrialState
  /** What could not be taken from the address, one sentence each; the rest holds. */
  remarks: string[]
}

/** Never throws: what it cannot read it names, and leaves at the setup's own value. */
export function decode(code: string | null, plan: Plan): Decoded {
  const start = startOf(plan.setup.id)
  if (code === null || code === '') return { state: start, remarks: [] }
  const [form, model, ...items] = code.split(BETWEEN)
  if (form !== FORM) {
    return {
      state: start,
      remarks: [
        `This link is of a form (“${brief(form)}”) that cannot be read here. The setup is shown as it is kept.`,
      ],
    }
  }
  const remarks: string[] = []
  if (model !== MODEL_VERSION) {
    remarks.push(
      `This link was made with model ${brief(model)}; the run shown is computed with ${MODEL_VERSION} and may differ.`,
    )
  }
  const keys = new Map(keysOf(plan).map((key) => [shortName(key), key]))
  const draft: Draft = { plan, changes: {}, events: [], rest: {} }
  for (const item of items) {
    const remark = take(item, draft, keys)
    if (remark) remarks.push(remark)
  }
  const { changes, events, rest } = draft
  return { state: { ...start, ...rest, changes, events }, remarks }
}

interface Draft {
  plan: Plan
  changes: Record<string, Value>
  events: TrialEvent[]
  rest: { -readonly [Name in keyof TrialState]?: TrialState[Name] }
}

/** Takes one item into the draft, or says why not. */
function take(item: string, draft: Draft, keys: ReadonlyMap<string, string>): string | null {
  const [name = '', ...parts] = item.split(WITHIN)
  const text = parts.join(WITHIN)
  if (Object.hasOwn(eventFields, name)) {
    return takeEvent(item, name as TrialEvent['kind'], parts, draft)
  }
  if (name === 'helm' && includes(helms, text)) draft.rest.helm = text
  else if (name === 'solver' && includes(solvers, text)) draft.rest.solver = text
  else if (name === 'for' && includes(durationsS, Number(text))) draft.rest.durationS = Number(text)
  else if (name === 'beside') draft.rest.ghosts = allGhosts.filter((ghost) => parts.includes(ghost))
  else return takeValue(item, name, text, draft, keys)
  return null
}

function takeValue(
  item: string,
  name: string,
  text: string,
  draft: Draft,
  keys: ReadonlyMap<string, string>,
): string | null {
  const key = keys.get(name)
  const parameter = key === undefined ? undefined : parameterAt(draft.plan, key)
  if (key === undefined || !parameter) {
    return `This link sets “${brief(item)}”, which this boat and setup do not have; it is left out.`
  }
  const value = parameter.type === 'quantity' && text !== '' ? Number(text) : text
  const wrong = checkValue(key, parameter, value)
  if (wrong) {
    const named = wrong.replace(key, parameter.label)
    return `“${brief(text)}” in this link is left out: ${named}.`
  }
  if (value !== readValue(draft.plan, key)) draft.changes[key] = value
  return null
}

function takeEvent(
  item: string,
  kind: TrialEvent['kind'],
  [at = '', ...given]: string[],
  draft: Draft,
): string | null {
  const fields = eventFields[kind].map((name, index) => {
    const text = given[index] ?? ''
    return [name, name === 'sail' || text === '' ? text : Number(text)]
  })
  const atS = at === '' ? Number.NaN : Number(at)
  const parsed = trialEventSchema.safeParse({ kind, atS, ...Object.fromEntries(fields) })
  if (!parsed.success || given.length !== fields.length) {
    return `The event “${brief(item)}” in this link is out of range and left out.`
  }
  if (parsed.data.kind === 'reef' && !Object.hasOwn(draft.plan.boat.sails, parsed.data.sail)) {
    return `The event “${brief(item)}” reefs a sail this boat does not have; it is left out.`
  }
  if (draft.events.length >= MOST_EVENTS) {
    return `Only the first ${MOST_EVENTS} events of this link are kept.`
  }
  draft.events.push(parsed.data)
  return null
}

/** The setup with a state's changes made to it. */
export function changedPlan(plan: Plan, changes: TrialState['changes']): Plan {
  return Object.entries(changes).reduce((at, [key, value]) => withValue(at, key, value), plan)
}

function brief(text = ''): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text
}

function includes<Item>(list: readonly Item[], item: unknown): item is Item {
  return (list as readonly unknown[]).includes(item)
}

function sameGhosts(a: readonly Ghost[], b: readonly Ghost[]): boolean {
  return a.length === b.length && a.every((ghost) => b.includes(ghost))
}
