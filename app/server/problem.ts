import { STATUS_CODES } from 'node:http'
import { DrizzleQueryError } from 'drizzle-orm'
import { z } from 'zod'
import { log } from './log'

const fieldErrorSchema = z.strictObject({
  field: z.string(),
  given: z.unknown().optional(),
  message: z.string(),
  min: z.number().optional(),
  max: z.number().optional(),
  allowed: z.array(z.string()).optional(),
})

/** One refused field of a request. */
export type FieldError = z.infer<typeof fieldErrorSchema>

export const problemSchema = z
  .strictObject({
    type: z.string(),
    title: z.string().optional(),
    status: z.int(),
    detail: z.string(),
    errors: z.array(fieldErrorSchema).optional(),
    errorsLeftOut: z.int().optional().describe('How many further errors are not listed'),
  })
  .describe('Problem details (RFC 9457)')

const mostErrors = 20

/** A refusal, answered as problem details. */
export class Problem extends Error {
  constructor(
    readonly status: number,
    detail: string,
    readonly more: { errors?: FieldError[]; headers?: Record<string, string> } = {},
  ) {
    super(detail)
  }

  body(): z.infer<typeof problemSchema> {
    const { errors } = this.more
    const leftOut = errors ? errors.length - mostErrors : 0
    return {
      type: 'about:blank',
      title: STATUS_CODES[this.status],
      status: this.status,
      detail: this.message,
      ...(errors && { errors: errors.slice(0, mostErrors) }),
      ...(leftOut > 0 && { errorsLeftOut: leftOut }),
    }
  }

  response(): Response {
    return Response.json(this.body(), {
      status: this.status,
      headers: { ...this.more.headers, 'content-type': 'application/problem+json' },
    })
  }
}

/** The answer of a resource route, with whatever goes wrong turned into problem details. */
export async function answer(work: () => Promise<Response> | Response): Promise<Response> {
  try {
    return await work()
  } catch (error) {
    return problemOf(error).response()
  }
}

function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error
  log.error({ err: error }, 'a request failed')
  return error instanceof DrizzleQueryError
    ? new Problem(503, 'The database does not answer; try again shortly.', {
        headers: { 'retry-after': '5' },
      })
    : new Problem(500, 'Something went wrong here; it has been recorded.')
}

/** Refuses the methods a resource does not have, naming those it has. */
export function methodNotAllowed(allow: string) {
  return ({ request }: { request: Request }): Response =>
    new Problem(405, `${request.method} is not allowed here; use ${allow}.`, {
      headers: { allow },
    }).response()
}
