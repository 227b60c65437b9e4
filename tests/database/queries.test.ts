import { demoBoats } from 'db/demo/boats'
import { loadDemo } from 'db/demo/load'
import { demoSetups } from 'db/demo/setups'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { openedScratchDatabase, rowsOf, type ScratchDatabase } from './scratch-database'

let scratch: ScratchDatabase
let boatQueries: typeof import('~/features/boats/queries.server')
let setupQueries: typeof import('~/features/setups/queries.server')

beforeAll(async () => {
  scratch = await openedScratchDatabase()
  await loadDemo(scratch.url)
  boatQueries = await import('~/features/boats/queries.server')
  setupQueries = await import('~/features/setups/queries.server')
})
afterAll(async () => {
  const { database } = await import('~/server/database')
  await database.$client.end()
  await scratch.drop()
})

test('a boat and a setup come back as they were written', async () => {
  for (const boat of demoBoats) expect(await boatQueries.getBoat(boat.id)).toEqual(boat)
  for (const setup of demoSetups) expect(await setupQueries.getSetup(setup.id)).toEqual(setup)
})

test('a plan is a setup with its own boat', async () => {
  for (const setup of demoSetups) {
    const boat = demoBoats.find((candidate) => candidate.id === setup.boatId)
    expect(await setupQueries.getPlan(setup.id)).toEqual({ boat, setup })
  }
})

test('the mainsail comes first, whatever order the database keeps', async () => {
  for (const { id, sails } of demoBoats) {
    const boat = await boatQueries.getBoat(id)
    const mains = Object.values(sails).filter((sail) => sail.kind === 'main').length
    const kinds = Object.values(boat?.sails ?? {}).map((sail) => sail.kind)
    expect(kinds.slice(0, mains)).toEqual(Array(mains).fill('main'))
  }
})

test('the list has every demo boat, by name', async () => {
  const list = await boatQueries.listBoats()
  const expected = demoBoats.map(({ id, name, type, summary }) => ({ id, name, type, summary }))
  expect(list).toEqual(expected.sort((a, b) => (a.name < b.name ? -1 : 1)))
})

test('the list of setups runs from close-hauled to running on each boat, wrong ones last', async () => {
  const list = await setupQueries.listSetups()
  expect(list.map((entry) => entry.id).sort()).toEqual(demoSetups.map((s) => s.id).sort())
  for (const [place, entry] of list.entries()) {
    const stated = demoSetups.find((setup) => setup.id === entry.id)
    expect(entry.conditions).toEqual(stated?.conditions)
    expect(entry.flaw).toEqual(stated?.flaw)
    expect(entry.pull).toBe(stated?.line.pull)
    expect(entry.source).toBe(stated?.source)
    const next = list[place + 1]
    if (next?.boat.id !== entry.boat.id) continue
    if (entry.flaw) expect(next.flaw).toBeDefined()
    else if (!next.flaw) {
      expect(Math.abs(next.conditions.trueWindAngleDeg)).toBeGreaterThanOrEqual(
        Math.abs(entry.conditions.trueWindAngleDeg),
      )
    }
  }
})

test('what users made is not among the demo setups', async () => {
  await rowsOf(
    scratch.url,
    `insert into setups (id, boat_id, document) select 'own', boat_id, document from setups limit 1`,
  )
  const ids = (await setupQueries.listSetups()).map((entry) => entry.id)
  expect(ids).not.toContain('own')
  expect(await setupQueries.getSetup('own')).toBeDefined()
})

test.each([
  ['an empty id', ''],
  ['an unknown id', 'no-such'],
  ['a path', '../etc'],
  ['a null character', '\u0000'],
  ['a statement', "'; drop table boats"],
  ['a very long id', 'x'.repeat(5000)],
])('nothing is found under %s', async (_, id) => {
  expect(await boatQueries.getBoat(id)).toBeUndefined()
  expect(await setupQueries.getSetup(id)).toBeUndefined()
  expect(await setupQueries.getPlan(id)).toBeUndefined()
})

test('a stored document that the model would refuse is not handed out', async () => {
  await rowsOf(
    scratch.url,
    `insert into setups (id, boat_id, document)
     select 'spoilt', boat_id, jsonb_set(document, '{line,takeUp}', '99') from setups limit 1`,
  )
  await expect(setupQueries.getSetup('spoilt')).rejects.toThrow(/takeUp/)
})
