import type { RequestHandler } from 'express'
import { log } from './log'

/**
 * One line per answered request. Neither the address nor the query is kept: who asked is nobody's
 * business, and the query may hold someone's whole setup.
 */
export const logRequests: RequestHandler = (request, response, next) => {
  const began = performance.now()
  response.on('close', () => {
    const status = response.statusCode
    const level = status >= 500 ? 'error' : 'debug'
    const ms = Math.round(performance.now() - began)
    log[level]({ method: request.method, path: request.path, status, ms }, 'request')
  })
  next()
}
