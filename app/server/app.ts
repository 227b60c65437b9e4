import { createRequestHandler } from '@react-router/express'
import express from 'express'
import { RouterContextProvider } from 'react-router'
import { nonceContext } from './load-context'

export const app = express()

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
