import { request as httpRequest, type IncomingMessage, type RequestOptions } from 'node:http'
import { describe, expect, inject, test } from 'vitest'

interface Answer {
  status: number
  headers: IncomingMessage['headers']
  body: string
}

/** A request as plain as can be; `fetch` refuses to send some of what a server must withstand. */
function ask(
  path: string,
  options: RequestOptions = {},
  pieces: Iterable<string> = [],
): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const request = httpRequest(new URL(path, inject('baseUrl')), options, (response) => {
      let body = ''
      response.setEncoding('utf8')
      response.on('data', (piece) => {
        body += piece
      })
      response.on('end', () =>
        resolve({ status: response.statusCode ?? 0, headers: response.headers, body }),
      )
    })
    request.on('error', reject)
    for (const piece of pieces) request.write(piece)
    request.end()
  })
}

const json = { 'content-type': 'application/json' }
const post = (body: string) =>
  ask('/api/simulate', { method: 'POST', headers: { ...json, 'content-length': body.length } }, [
    body,
  ])

function expectProblem({ status, headers, body }: Answer, expected: number) {
  expect(status, body).toBe(expected)
  expect(headers['content-type']).toContain('application/problem+json')
  expect(JSON.parse(body)).toMatchObject({ status: expected, title: expect.any(String) })
  expect(body).not.toMatch(/node_modules|\.[jt]s:\d|at async/)
}

describe('the interface as it is served', () => {
  test.each([
    ['PUT', '/api/simulate', 'POST'],
    ['GET', '/api/simulate', 'POST'],
    ['OPTIONS', '/api/simulate', 'POST'],
    ['POST', '/api/setups', 'GET, HEAD'],
    ['DELETE', '/api/boats', 'GET, HEAD'],
    ['OPTIONS', '/api/openapi.json', 'GET, HEAD'],
    ['PROPFIND', '/api/boats', 'GET, HEAD, POST'],
    ['TRACE', '/api/boats', 'GET, HEAD, POST'],
  ])('%s %s is a 405 that allows %s', async (method, path, allow) => {
    const answer = await ask(path, { method })
    expectProblem(answer, 405)
    expect(answer.headers.allow).toBe(allow)
  })

  test.each(['GET', 'POST', 'DELETE', 'OPTIONS'])('%s of nothing is a 404', async (method) => {
    for (const path of ['/api', '/api/no/such', '/api/boats/nobody/sails']) {
      expectProblem(await ask(path, { method }), 404)
    }
  })

  test('a head has no body', async () => {
    const { status, body } = await ask('/api/setups', { method: 'HEAD' })
    expect({ status, body }).toEqual({ status: 200, body: '' })
  })

  test('an address that cannot be read is a 400', async () => {
    expectProblem(await ask('/api/boats', { headers: { host: '[' } }), 400)
  })

  test('a large body is a 413, whether its length is announced or not', async () => {
    expectProblem(await post(' '.repeat(300_000)), 413)
    const pieces = Array(8).fill(' '.repeat(60_000))
    const headers = { ...json, 'transfer-encoding': 'chunked' }
    expectProblem(await ask('/api/simulate', { method: 'POST', headers }, pieces), 413)
  })

  test('what is not JSON is a 415, and malformed JSON a 400', async () => {
    const headers = { 'content-type': 'text/plain' }
    expectProblem(await ask('/api/simulate', { method: 'POST', headers }, ['{}']), 415)
    expectProblem(await post('{"setup":'), 400)
  })

  test('others are answered at once while a long run is computed', async () => {
    const [{ id }] = JSON.parse((await ask('/api/setups')).body)
    const leaving = new AbortController()
    const long = ask('/api/simulate', { method: 'POST', headers: json, signal: leaving.signal }, [
      JSON.stringify({ setup: id, seeds: 50, durationS: 3600 }),
    ]).catch((error: Error) => error.name)
    await new Promise((resolve) => setTimeout(resolve, 300))
    const began = performance.now()
    expect((await ask('/api/health')).status).toBe(200)
    expect(performance.now() - began).toBeLessThan(1000)
    expect((await post(JSON.stringify({ setup: id, durationS: 10 }))).status).toBe(200)
    leaving.abort()
    expect(await long).toBe('AbortError')
  })

  test('the description names the model that answers', async () => {
    const description = JSON.parse((await ask('/api/openapi.json')).body)
    const { modelVersion } = JSON.parse((await ask('/api/health')).body)
    expect(description.info.version).toBe(modelVersion)
  })
})
