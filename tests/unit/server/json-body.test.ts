import { expect, test } from 'vitest'
import { readJsonBody } from '~/server/json-body'
import { Problem } from '~/server/problem'

const limit = 1000

function posted(body: BodyInit | undefined, headers: Record<string, string> = {}) {
  return new Request('http://localhost/', {
    method: 'POST',
    body,
    headers: { 'content-type': 'application/json', ...headers },
    duplex: 'half',
  } as RequestInit)
}

/** A body that arrives in pieces, as one without an announced length does. */
function pieces(...texts: string[]): ReadableStream {
  return new ReadableStream({
    start(controller) {
      for (const text of texts) controller.enqueue(new TextEncoder().encode(text))
      controller.close()
    },
  })
}

async function refusal(request: Request): Promise<Problem> {
  const error = await readJsonBody(request, limit).catch((thrown: unknown) => thrown)
  if (error instanceof Problem) return error
  throw new Error(`not refused: ${JSON.stringify(error)}`)
}

test.each([
  'application/json',
  'application/json; charset=utf-8',
  'Application/JSON;charset="UTF-8"',
])('JSON sent as %s is read', async (type) => {
  expect(await readJsonBody(posted('{"a":[1]}', { 'content-type': type }), limit)).toEqual({
    a: [1],
  })
})

test('a body is put together from its pieces, inside a character too', async () => {
  const bytes = new TextEncoder().encode('{"name":"größe"}')
  const body = new ReadableStream({
    start(controller) {
      for (const byte of bytes) controller.enqueue(new Uint8Array([byte]))
      controller.close()
    },
  })
  expect(await readJsonBody(posted(body), limit)).toEqual({ name: 'größe' })
})

test.each(['text/plain', 'application/json; charset=latin1', 'application/xml', 'json', ''])(
  'a body sent as %j is refused with 415',
  async (type) => {
    expect((await refusal(posted('{}', { 'content-type': type }))).status).toBe(415)
  },
)

test('a compressed body is refused with 415', async () => {
  expect((await refusal(posted('{}', { 'content-encoding': 'gzip' }))).status).toBe(415)
})

test.each([
  ['cut off', '{"a":'],
  ['empty', ''],
  ['two values', '{} {}'],
  ['not a number', '{"a":NaN}'],
  ['nested without end', '['.repeat(limit)],
])('malformed JSON, %s, is refused with 400', async (_, text) => {
  expect((await refusal(posted(text))).status).toBe(400)
})

test('a request without a body is refused with 400', async () => {
  expect((await refusal(posted(undefined))).status).toBe(400)
})

test('what is not UTF-8 is refused with 400', async () => {
  expect((await refusal(posted(new Uint8Array([0x22, 0xff, 0xfe, 0x22])))).status).toBe(400)
})

test('a body as long as the limit is read, and one byte more is refused with 413', async () => {
  const text = (length: number) => JSON.stringify('x'.repeat(length - 2))
  expect(await readJsonBody(posted(text(limit)), limit)).toHaveLength(limit - 2)
  expect((await refusal(posted(text(limit + 1)))).status).toBe(413)
})

test('a body longer than announced is refused with 413 as soon as it is', async () => {
  const body = pieces('x'.repeat(limit), 'x'.repeat(limit), 'x'.repeat(limit))
  expect((await refusal(posted(body, { 'content-length': '2' }))).status).toBe(413)
})

test('an endless body is refused with 413', async () => {
  let sent = 0
  const endless = new ReadableStream({
    pull(controller) {
      sent++
      controller.enqueue(new Uint8Array(100).fill(0x20))
    },
  })
  expect((await refusal(posted(endless))).status).toBe(413)
  expect(sent).toBeLessThan(20)
})

test('a field called __proto__ is refused with 400, however deep and however written', async () => {
  for (const text of ['{"__proto__":1}', '{"a":[{"__proto__":{}}]}', '{"\\u005f_proto__":1}']) {
    expect((await refusal(posted(text))).status).toBe(400)
  }
})
