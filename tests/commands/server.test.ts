import { readdirSync } from 'node:fs'
import { request } from 'node:http'
import { connect } from 'node:net'
import { join } from 'node:path'
import { text } from 'node:stream/consumers'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { type Server, startServer } from '../../scripts/lib/server.mjs'

const buildFolder = process.env.BUILD_FOLDER ?? ''
let server: Server
let base: string

beforeAll(async () => {
  server = await startServer('build', { host: '127.0.0.1', port: 0 }, {})
  base = `http://127.0.0.1:${server.port}`
})
afterAll(() => server.stop())

describe('a page', () => {
  test('allows the scripts of this one answer and no others', async () => {
    const nonces = new Set<string>()
    for (const _time of [1, 2]) {
      const response = await fetch(base)
      const policy = response.headers.get('content-security-policy') ?? ''
      const nonce = /script-src 'self' 'nonce-([^']+)'/.exec(policy)?.[1] ?? ''
      nonces.add(nonce)
      const scripts = (await response.text()).match(/<script\b[^>]*>/g) ?? []
      expect(scripts.length).toBeGreaterThan(0)
      for (const script of scripts) expect(script).toContain(`nonce="${nonce}"`)
      expect(policy).not.toMatch(/script-src[^;]*unsafe/)
    }
    expect(nonces.size).toBe(2)
  })

  test('says nothing about what serves it, and lets nobody frame or guess at it', async () => {
    const { headers } = await fetch(base)
    expect(headers.has('x-powered-by')).toBe(false)
    expect(headers.get('x-content-type-options')).toBe('nosniff')
    expect(headers.get('content-security-policy')).toContain("frame-ancestors 'none'")
  })

  test('that does not exist is not found', async () => {
    expect((await fetch(`${base}/no-such-page`)).status).toBe(404)
  })
})

describe('a built file', () => {
  test('with a hash in its name may be kept for ever', async () => {
    const [file] = readdirSync(join(buildFolder, 'client', 'assets'))
    const { status, headers } = await fetch(`${base}/assets/${file}`)
    expect(status).toBe(200)
    expect(headers.get('cache-control')).toMatch(/max-age=31536000, immutable/)
  })

  test('of an earlier build is not found, and no page is rendered for it', async () => {
    const response = await fetch(`${base}/assets/entry-0000.js`)
    expect(response.status).toBe(404)
    expect(response.headers.get('content-type')).toBe('application/problem+json; charset=utf-8')
  })

  test.each([
    '/../server/index.js',
    '/%2e%2e/server/index.js',
    '/assets/..%2f..%2fserver/index.js',
  ])('outside the client folder is out of reach at %s', async (path) => {
    const { status, body } = await raw(
      `GET ${path} HTTP/1.1\r\nHost: x\r\nConnection: close\r\n\r\n`,
    )
    expect(status).toBeGreaterThanOrEqual(400)
    expect(body).not.toContain('createApp')
  })
})

describe('a bad request', () => {
  test.each([
    ['a malformed address', 'GET /%E0%A4%A HTTP/1.1\r\nHost: x\r\nConnection: close\r\n\r\n'],
    ['a malformed host', 'GET / HTTP/1.1\r\nHost: a b:c\r\nConnection: close\r\n\r\n'],
  ])('with %s is refused without a stack', async (_case, message) => {
    const { status, body } = await raw(message)
    expect([400, 404]).toContain(status)
    expect(body).not.toMatch(/\n\s+at |node_modules/)
  })

  test('with too large a body is refused before it is read', async () => {
    const response = await fetch(base, { method: 'POST', body: 'x'.repeat(2_000_000) })
    expect(response.status).toBe(413)
    expect(await response.json()).toMatchObject({ status: 413 })
  })

  test('whose body grows too large on the way is refused then', async () => {
    const sent = request(`${base}/preferences`, {
      method: 'POST',
      headers: {
        'content-type': 'application/x-www-form-urlencoded',
        'transfer-encoding': 'chunked',
      },
    })
    sent.on('error', () => {})
    const answer = new Promise<number | undefined>((resolve) => {
      sent.on('response', (response) => resolve(response.statusCode))
      sent.on('close', () => resolve(undefined))
    })
    for (let part = 0; part < 200 && !sent.destroyed; part += 1) sent.write('x'.repeat(64 * 1024))
    sent.end()
    expect([413, undefined]).toContain(await answer)
    expect((await fetch(`${base}/api/health`)).status).toBe(200)
  })
})

async function raw(message: string) {
  const socket = connect(server.port, '127.0.0.1')
  socket.write(message)
  const answer = await text(socket)
  return { status: Number(answer.split(' ')[1]), body: answer }
}
