import { demoBoats } from 'db/demo/boats'
import { demoSetups } from 'db/demo/setups'
import { expect, test } from 'vitest'
import { problemSchema } from '~/server/problem'
import { boatOf, call, read, routes, sound } from './interface'

test('the lists name every demo boat and setup, with flaws where they are', async () => {
  const boats = await (await read('boats')).json()
  expect(boats.map((boat: { id: string }) => boat.id).sort()).toEqual(
    demoBoats.map((boat) => boat.id).sort(),
  )
  const setups = await (await read('setups')).json()
  for (const stated of demoSetups) {
    const entry = setups.find((candidate: { id: string }) => candidate.id === stated.id)
    expect(entry).toMatchObject({
      name: stated.name,
      boat: { id: stated.boatId, name: boatOf(stated)?.name },
      conditions: stated.conditions,
      source: stated.source,
    })
    expect(entry.flaw).toEqual(stated.flaw)
  }
})

test('whole documents are read by id', async () => {
  expect(await (await read('setup', { id: sound.id })).json()).toEqual(sound)
  expect(await (await read('boat', { id: sound.boatId })).json()).toEqual(boatOf(sound))
})

test.each(['boat', 'setup'] as const)('an unknown %s is a 404', async (route) => {
  for (const id of ['nobody', '\u0000', '']) {
    const response = await read(route, { id })
    expect(response.status).toBe(404)
    problemSchema.parse(await response.json())
  }
})

test('health tells that the database is reachable', async () => {
  const response = await read('health')
  expect(response.status).toBe(200)
  expect(await response.json()).toMatchObject({ status: 'ready', database: 'reachable' })
})

test.each([
  ['boats', 'action', 'POST', 'GET, HEAD'],
  ['setups', 'action', 'DELETE', 'GET, HEAD'],
  ['setups', 'loader', 'OPTIONS', 'GET, HEAD'],
  ['health', 'action', 'PUT', 'GET, HEAD'],
  ['simulate', 'loader', 'GET', 'POST'],
  ['simulate', 'action', 'PUT', 'POST'],
] as const)('%s %s %s is a 405 that allows %s', async (route, handler, method, allow) => {
  const response = await call(routes[route][handler], new Request('http://localhost/', { method }))
  expect(response.status).toBe(405)
  expect(response.headers.get('allow')).toBe(allow)
  problemSchema.parse(await response.json())
})
