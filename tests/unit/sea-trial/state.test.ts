import fc from 'fast-check'
import type { TrialEvent } from 'sim/plan/types'
import { describe, expect, test } from 'vitest'
import { type Action, type History, opened, reduce, startOf } from '~/features/sea-trial/state'

const fresh = opened(startOf('beam'))
const gust: TrialEvent = { atS: 120, kind: 'gust', strengthKn: 6, durationS: 15 }

function having(...actions: Action[]): History {
  return actions.reduce(reduce, fresh)
}

function set(value: number, drag = false, key = 'line.takeUp'): Action {
  return { type: 'set', key, value, own: 0.3, drag }
}

describe('setting a value', () => {
  test('keeps it as a change, and going back to the setup’s own takes the change away', () => {
    expect(having(set(0.4)).present.changes).toEqual({ 'line.takeUp': 0.4 })
    expect(having(set(0.4), set(0.3)).present.changes).toEqual({})
  })

  test('to what it already is is no step', () => {
    expect(having(set(0.3)).past).toHaveLength(0)
    expect(having(set(0.4), set(0.4)).past).toHaveLength(1)
  })

  test('leaves events, helm and everything else as they were', () => {
    const before = having({ type: 'drop', event: gust }, { type: 'run', helm: 'lashed' })
    const { changes: _, ...rest } = reduce(before, set(0.4)).present
    const { changes: __, ...same } = before.present
    expect(rest).toEqual(same)
  })
})

describe('a drag', () => {
  const drag = [set(0.31, true), set(0.35, true), set(0.5, true), { type: 'let-go' } as const]

  test('is one step to undo', () => {
    const dragged = having(...drag)
    expect(dragged.present.changes).toEqual({ 'line.takeUp': 0.5 })
    expect(dragged.past).toHaveLength(1)
    expect(reduce(dragged, { type: 'undo' }).present).toEqual(fresh.present)
  })

  test('of the same slider after letting go is a step of its own', () => {
    expect(having(...drag, set(0.6, true), set(0.7, true)).past).toHaveLength(2)
  })

  test('of another slider is a step of its own', () => {
    expect(having(set(0.4, true), set(0.5, true, 'elastic.stretch')).past).toHaveLength(2)
  })

  test('that ends where it began leaves the value where it was', () => {
    expect(having(set(0.5, true), set(0.3, true)).present.changes).toEqual({})
  })

  test('of an event is one step', () => {
    const moved = (strengthKn: number): Action => ({
      type: 'alter-event',
      index: 0,
      event: { ...gust, strengthKn },
      drag: true,
    })
    const dragged = having({ type: 'drop', event: gust }, moved(7), moved(8), moved(9), {
      type: 'let-go',
    })
    expect(dragged.past).toHaveLength(2)
    expect(reduce(dragged, { type: 'undo' }).present.events).toEqual([gust])
  })
})

describe('events', () => {
  test('are kept in the order of their moments', () => {
    const { events } = having(
      { type: 'drop', event: gust },
      { type: 'drop', event: { ...gust, atS: 30 } },
    ).present
    expect(events.map((event) => event.atS)).toEqual([30, 120])
  })

  test('can be removed; removing one that is not there is no step', () => {
    expect(
      having({ type: 'drop', event: gust }, { type: 'remove-event', index: 0 }).present.events,
    ).toEqual([])
    expect(having({ type: 'remove-event', index: 3 }).past).toHaveLength(0)
  })
})

test('choosing another setup starts from that setup as it is kept, and can be undone', () => {
  const chosen = having(set(0.4), { type: 'choose-setup', setupId: 'run' })
  expect(chosen.present).toEqual(startOf('run'))
  expect(reduce(chosen, { type: 'undo' }).present.changes).toEqual({ 'line.takeUp': 0.4 })
})

test('taking all back leaves the setup as it is kept', () => {
  expect(
    having(set(0.4), { type: 'drop', event: gust }, { type: 'take-all-back' }).present,
  ).toEqual(fresh.present)
})

const someAction: fc.Arbitrary<Action> = fc.oneof(
  fc.tuple(fc.constantFrom(0.3, 0.4, 0.5), fc.boolean()).map(([value, drag]) => set(value, drag)),
  fc.constant<Action>({ type: 'let-go' }),
  fc.constant<Action>({ type: 'drop', event: gust }),
  fc.nat(2).map<Action>((index) => ({ type: 'remove-event', index })),
  fc.constant<Action>({ type: 'run', helm: 'free' }),
)

test('whatever was done, undoing it all leads to the start, and redoing it all leads back', () => {
  fc.assert(
    fc.property(fc.array(someAction), (actions) => {
      const done = having(...actions)
      let at = done
      for (let n = 0; n < done.past.length; n++) at = reduce(at, { type: 'undo' })
      expect(at.present).toEqual(fresh.present)
      for (let n = 0; n < done.past.length; n++) at = reduce(at, { type: 'redo' })
      expect(at.present).toEqual(done.present)
    }),
  )
})

test('a new step after undoing forgets what was undone', () => {
  const { future } = having(set(0.4), { type: 'undo' }, set(0.5))
  expect(future).toEqual([])
})
