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

/** Everything between the socket and the routes; without built files when the bundler serves. */
export function createApp({ clientFolder }: { clientFolder?: string } = {}) {
  const app = express()
  app.disable('x-powered-by')
  app.use(logRequests)
  if (import.meta.env.PROD) app.use(securityHeaders)
  if (clientFolder !== undefined) app.use(builtFiles(clientFolder))
  app.use(refuseUnknownMethods)
  app.use(limitRequestBody)
  app.use(
    createRequestHandler({
      build: () => import('virtual:react-router/server-build'),
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
