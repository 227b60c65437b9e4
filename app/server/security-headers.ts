import { randomBytes } from 'node:crypto'
import type { RequestHandler, Response } from 'express'
import helmet from 'helmet'

const nonceOf = (_request: unknown, response: unknown) =>
  `'nonce-${(response as Response).locals.nonce}'`

const headers = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: ["'self'"],
      scriptSrc: ["'self'", nonceOf],
      styleSrc: ["'self'", nonceOf],
      // Server-rendered drawings carry style attributes, which no nonce can vouch for.
      styleSrcAttr: ["'unsafe-inline'"],
      imgSrc: ["'self'", 'data:'],
      workerSrc: ["'self'"],
      objectSrc: ["'none'"],
      baseUri: ["'self'"],
      formAction: ["'self'"],
      frameAncestors: ["'none'"],
    },
  },
  // With no referrer at all, a form posted without JavaScript has a null origin.
  referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
  // These concern https, which whoever puts a proxy in front of this server adds there.
  strictTransportSecurity: false,
  crossOriginOpenerPolicy: false,
  originAgentCluster: false,
})

/** The policy that a browser holds a page to, with a nonce made for this one response. */
export const securityHeaders: RequestHandler = (request, response, next) => {
  response.locals.nonce = randomBytes(18).toString('base64')
  headers(request, response, next)
}
