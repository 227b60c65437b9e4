import type { Value } from 'sim/plan/keys'
import type { Helm, TrialEvent } from 'sim/plan/types'
import type { Solver } from 'sim/trial/types'

/** Runs drawn beside the main one, under the same seed, for comparison. */
export type Ghost = Exclude<Helm, 'sheet-to-tiller'>

/** Everything a visitor has set; together with the model version it determines the run. */
export interface TrialState {
  readonly setupId: string
  /** Values that differ from the setup's own, by parameter key, in stored units. */
  readonly changes: Readonly<Record<string, Value>>
  readonly events: readonly TrialEvent[]
  readonly helm: Helm
  readonly solver: Solver
  readonly durationS: number
  readonly ghosts: readonly Ghost[]
}

export const allGhosts: readonly Ghost[] = ['lashed', 'free']

/** Lengths of run to choose from. */
export const durationsS: readonly number[] = [300, 600, 900, 1200, 1800]

export function startOf(setupId: string): TrialState {
  return {
    setupId,
    changes: {},
    events: [],
    helm: 'sheet-to-tiller',
    solver: 'fixed-step',
    durationS: 600,
    ghosts: allGhosts,
  }
}

export interface History {
  readonly past: readonly TrialState[]
  readonly present: TrialState
  readonly future: readonly TrialState[]
  /** The drag under way; its later steps replace its first, so that undo takes all of it back. */
  readonly drag: string | null
}

export type Action =
  /** `own` is the setup's value: going back to it takes the change away. `drag` names a slider held. */
  | { type: 'set'; key: string; value: Value; own: Value; drag?: boolean }
  | { type: 'let-go' }
  | { type: 'take-back'; key: string }
  | { type: 'take-all-back' }
  | { type: 'drop'; event: TrialEvent }
  | { type: 'alter-event'; index: number; event: TrialEvent; drag?: boolean }
  | { type: 'remove-event'; index: number }
  | { type: 'choose-setup'; setupId: string }
  | { type: 'run'; helm?: Helm; solver?: Solver; durationS?: number; ghosts?: readonly Ghost[] }
  | { type: 'open'; state: TrialState }
  | { type: 'undo' }
  | { type: 'redo' }

const REMEMBERED_STEPS = 200

/** More would only crowd the strip and the address. */
export const MOST_EVENTS = 20

export function opened(state: TrialState): History {
  return { past: [], present: state, future: [], drag: null }
}

export function reduce(history: History, action: Action): History {
  const { past, present, future } = history
  switch (action.type) {
    case 'undo': {
      const previous = past.at(-1)
      if (!previous) return history
      return {
        past: past.slice(0, -1),
        present: previous,
        future: [present, ...future],
        drag: null,
      }
    }
    case 'redo': {
      const [next, ...later] = future
      if (!next) return history
      return { past: [...past, present], present: next, future: later, drag: null }
    }
    case 'let-go':
      return history.drag === null ? history : { ...history, drag: null }
    case 'open':
      return opened(action.state)
    default:
      return step(history, after(present, action), dragOf(action))
  }
}

type Edit = Exclude<Action, { type: 'undo' | 'redo' | 'let-go' | 'open' }>

function dragOf(action: Edit): string | null {
  if (action.type === 'set' && action.drag) return action.key
  if (action.type === 'alter-event' && action.drag) return `event ${action.index}`
  return null
}

function step(history: History, next: TrialState, drag: string | null): History {
  const continues = drag !== null && drag === history.drag
  if (next === history.present) return continues ? history : reduce(history, { type: 'let-go' })
  const past = continues
    ? history.past
    : [...history.past, history.present].slice(-REMEMBERED_STEPS)
  return { past, present: next, future: [], drag }
}

function after(state: TrialState, action: Edit): TrialState {
  switch (action.type) {
    case 'set': {
      if ((state.changes[action.key] ?? action.own) === action.value) return state
      if (action.value === action.own) return without(state, action.key)
      return { ...state, changes: { ...state.changes, [action.key]: action.value } }
    }
    case 'take-back':
      return Object.hasOwn(state.changes, action.key) ? without(state, action.key) : state
    case 'take-all-back':
      return startOf(state.setupId)
    case 'drop':
      if (state.events.length >= MOST_EVENTS) return state
      return { ...state, events: inOrder([...state.events, action.event]) }
    case 'alter-event':
      if (!state.events[action.index]) return state
      return {
        ...state,
        events: state.events.map((event, at) => (at === action.index ? action.event : event)),
      }
    case 'remove-event':
      if (!state.events[action.index]) return state
      return { ...state, events: state.events.filter((_, at) => at !== action.index) }
    case 'choose-setup':
      return action.setupId === state.setupId ? state : startOf(action.setupId)
    case 'run': {
      const { type: _, ...asked } = action
      return { ...state, ...asked }
    }
  }
}

function without(state: TrialState, key: string): TrialState {
  const { [key]: _, ...changes } = state.changes
  return { ...state, changes }
}

function inOrder(events: readonly TrialEvent[]): readonly TrialEvent[] {
  return events.toSorted((a, b) => a.atS - b.atS)
}
