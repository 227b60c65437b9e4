import { Problem } from './problem'

export const tooLarge = (limit: number) =>
  new Problem(413, `The body may hold at most ${limit} bytes.`, {
    headers: { connection: 'close' },
  })

export const notJson = (detail = 'The body must be application/json.') =>
  new Problem(415, detail, { headers: { 'accept-post': 'application/json' } })

/** The JSON of a request's body; refuses other content, malformed JSON and more than `limit` bytes. */
export async function readJsonBody(request: Request, limit: number): Promise<unknown> {
  const contentType = request.headers.get('content-type') ?? ''
  const [mediaType = '', ...parameters] = contentType.split(';').map((part) => part.trim())
  if (mediaType.toLowerCase() !== 'application/json') throw notJson()
  const charset = parameters.find((part) => /^charset=/i.test(part))
  if (charset && !/^charset="?utf-?8"?$/i.test(charset)) {
    throw notJson('The body must be encoded in UTF-8.')
  }
  if ((request.headers.get('content-encoding') ?? 'identity') !== 'identity') {
    throw notJson('The body must not be compressed.')
  }
  const bytes = await readAtMost(request, limit)
  let text: string
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    throw new Problem(400, 'The body is not valid JSON (it is not UTF-8).')
  }
  try {
    return JSON.parse(text, withoutPrototype)
  } catch (error) {
    if (error instanceof Problem) throw error
    const reason = error instanceof SyntaxError ? error.message : 'it is nested too deeply'
    throw new Problem(400, `The body is not valid JSON (${reason}).`)
  }
}

/** The schemas pass over this key in silence, so it is refused before they see it. */
function withoutPrototype(key: string, value: unknown): unknown {
  if (key === '__proto__') throw new Problem(400, 'No field may be called __proto__.')
  return value
}

/** Counts what arrives, because the announced length may be missing or wrong. */
async function readAtMost(request: Request, limit: number): Promise<Uint8Array> {
  if (Number(request.headers.get('content-length')) > limit) throw tooLarge(limit)
  const chunks: Uint8Array[] = []
  let length = 0
  const reader = request.body?.getReader()
  for (let part = await reader?.read(); part?.value; part = await reader?.read()) {
    length += part.value.byteLength
    if (length > limit) throw tooLarge(limit)
    chunks.push(part.value)
  }
  return Buffer.concat(chunks)
}
