import { createRequestHandler } from '@react-router/express'
import express from 'express'
import { RouterContextProvider } from 'react-router'
import { builtFiles } from './built-files'
import { answerFaults } from './faults'
import { nonceContext } from './load-context'
import { logRequests } from './request-log'
import { refuseUnknownMethods } from './request-method'
import { limitRequestBody } from './request-size'
import { securityHeaders } from './security-headers'

/**
 * Everything between the socket and the routes; without built files when the bundler serves. The
 * routes are loaded here, so that what keeps them from working keeps the server from starting.
 */
export async function createApp({ clientFolder }: { clientFolder?: string } = {}) {
  const build = await import('virtual:react-router/server-build')
  const app = express()
  app.disable('x-powered-by')
  app.use(logRequests)
  if (import.meta.env.PROD) app.use(securityHeaders)
  if (clientFolder !== undefined) app.use(builtFiles(clientFolder))
  app.use(refuseUnknownMethods)
  app.use(limitRequestBody)
  app.use(
    createRequestHandler({
      build,
      getLoadContext(_request, response) {
        const context = new RouterContextProvider()
        context.set(nonceContext, response.locals.nonce)
        return context
      },
    }),
  )
  app.use(answerFaults)
  return app
}
