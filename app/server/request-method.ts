import type { RequestHandler } from 'express'
import { sendProblem } from './faults'
import { Problem } from './problem'

const understood = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']

/** Routes answer for the usual methods, each for itself; no route can be handed any other. */
export const refuseUnknownMethods: RequestHandler = (request, response, next) => {
  if (understood.includes(request.method)) return next()
  const headers = { allow: 'GET, HEAD, POST' }
  sendProblem(response, new Problem(405, `${request.method} is not understood here.`, { headers }))
}
