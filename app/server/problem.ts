import { STATUS_CODES } from 'node:http'
import { z } from 'zod'

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
