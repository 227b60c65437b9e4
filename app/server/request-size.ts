import type { RequestHandler, Response } from 'express'
import { sendProblem } from './faults'
import { tooLarge } from './json-body'

const mostBytes = 1_048_576

/** Refuses what is larger than any page or route here takes, before it fills the memory. */
export const limitRequestBody: RequestHandler = (request, response, next) => {
  if (Number(request.headers['content-length']) > mostBytes) return refuse(response)
  if (request.headers['transfer-encoding'] !== undefined) {
    let bytes = 0
    request.on('data', (chunk: Buffer) => {
      bytes += chunk.length
      if (bytes <= mostBytes) return
      if (!response.headersSent) refuse(response)
      request.destroy()
    })
  }
  next()
}

function refuse(response: Response) {
  sendProblem(response, tooLarge(mostBytes))
}
