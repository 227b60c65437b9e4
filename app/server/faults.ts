import type { ErrorRequestHandler, Response } from 'express'
import { log } from './log'
import { Problem } from './problem'

/** Answers what failed before or outside a route, such as an address that cannot be read. */
export const answerFaults: ErrorRequestHandler = (error, _request, response, next) => {
  if (response.headersSent) return next(error)
  const status = statusOf(error)
  if (status >= 500) log.error({ err: error }, 'a request failed')
  sendProblem(response, new Problem(status, detailOf[status] ?? 'The request cannot be answered.'))
}

export function sendProblem(response: Response, problem: Problem) {
  response
    .status(problem.status)
    .set(problem.more.headers ?? {})
    .type('application/problem+json')
    .send(JSON.stringify(problem.body()))
}

const detailOf: Record<number, string> = {
  400: 'The address of the request cannot be read.',
  404: 'There is no such file.',
  405: 'A file can only be read.',
  500: 'Something went wrong here; it has been recorded.',
}

function statusOf(error: unknown): number {
  if (typeof error !== 'object' || error === null) return 500
  if ('code' in error && error.code === 'ERR_INVALID_URL') return 400
  if (error instanceof URIError) return 400
  return 'status' in error && typeof error.status === 'number' ? error.status : 500
}
