import express from 'express'

/** The files of the build; those with a hash in their names never change. */
export function builtFiles(clientFolder: string) {
  const router = express.Router()
  router.use(
    '/assets',
    express.static(`${clientFolder}/assets`, {
      immutable: true,
      maxAge: '1y',
      index: false,
      redirect: false,
      fallthrough: false,
    }),
  )
  router.use(express.static(clientFolder, { maxAge: '1h', index: false, redirect: false }))
  return router
}
