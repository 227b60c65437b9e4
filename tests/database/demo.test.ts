import { demoBoats } from 'db/demo/boats'
import { loadDemo } from 'db/demo/load'
import { demoSetups } from 'db/demo/setups'
import type { Setup } from 'sim/plan/types'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { rowsOf, type ScratchDatabase, scratchDatabase } from './scratch-database'

let scratch: ScratchDatabase
beforeEach(async () => {
  scratch = await scratchDatabase()
})
afterEach(() => scratch.drop())

/** `xmin` changes whenever a row is written. */
const versions = () =>
  rowsOf<{ id: string }>(
    scratch.url,
    `select id, xmin::text, updated_at from boats
     union all select id, xmin::text, updated_at from setups order by id`,
  )
const names = (table: string) =>
  rowsOf<{ id: string; name: string }>(scratch.url, `select id, name from ${table} order by id`)

const [firstSetup, ...otherSetups] = demoSetups as [Setup, ...Setup[]]

test('every demo boat and setup is loaded, and loading again writes nothing', async () => {
  await loadDemo(scratch.url)
  const loaded = await versions()
  expect(loaded.map((row) => row.id).sort()).toEqual(
    [...demoBoats, ...demoSetups].map((entry) => entry.id).sort(),
  )
  await loadDemo(scratch.url)
  expect(await versions()).toEqual(loaded)
})

test('a demo setup that was changed in the files is corrected, and no other row is written', async () => {
  await loadDemo(scratch.url)
  const before = await versions()
  const setups = [{ ...firstSetup, name: 'Renamed' }, ...otherSetups]
  await loadDemo(scratch.url, { boats: demoBoats, setups })
  const after = await versions()
  const changed = after.filter(
    (row) => JSON.stringify(row) !== JSON.stringify(before.find((old) => old.id === row.id)),
  )
  expect(changed.map((row) => row.id)).toEqual([firstSetup.id])
  expect(await names('setups')).toContainEqual({ id: firstSetup.id, name: 'Renamed' })
})

test('demo setups that left the files are removed, and what users made stays', async () => {
  await loadDemo(scratch.url)
  await rowsOf(
    scratch.url,
    `insert into setups (id, boat_id, document)
     select 'own', boat_id, document from setups where id = '${firstSetup.id}'`,
  )
  await loadDemo(scratch.url, { boats: demoBoats, setups: otherSetups })
  const left = (await names('setups')).map((row) => row.id)
  expect(left).not.toContain(firstSetup.id)
  expect(left).toContain('own')
  expect(left).toHaveLength(demoSetups.length)
})

test('a boat that goes takes her setups along', async () => {
  await loadDemo(scratch.url)
  await rowsOf(scratch.url, `delete from boats where id = '${firstSetup.boatId}'`)
  const left = (await names('setups')).map((row) => row.id).sort()
  const others = demoSetups.filter((setup) => setup.boatId !== firstSetup.boatId)
  expect(left).toEqual(others.map((setup) => setup.id).sort())
})

test('a demo setup outside the allowed range stops the loading and nothing is written', async () => {
  const line = { ...firstSetup.line, takeUp: 99 }
  const setups = [...otherSetups, { ...firstSetup, line }]
  await expect(loadDemo(scratch.url, { boats: demoBoats, setups })).rejects.toThrow(/takeUp/)
  expect(await versions()).toEqual([])
})

test('a setup of a boat that does not exist is refused, and nothing is written', async () => {
  const setups = [...otherSetups, { ...firstSetup, boatId: 'no-such-boat' }]
  await expect(loadDemo(scratch.url, { boats: demoBoats, setups })).rejects.toThrow()
  expect(await versions()).toEqual([])
})
