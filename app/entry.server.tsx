import { PassThrough } from 'node:stream'
import { createReadableStreamFromReadable } from '@react-router/node'
import { isbot } from 'isbot'
import { renderToPipeableStream } from 'react-dom/server'
import {
  type EntryContext,
  isRouteErrorResponse,
  type RouterContextProvider,
  ServerRouter,
} from 'react-router'
import { nonceContext } from '~/server/load-context'
import { log } from '~/server/log'

export const streamTimeout = 10_000

/** What a loader or an action threw; the visitor sees the error page. */
export function handleError(error: unknown, { request }: { request: Request }) {
  if (request.signal.aborted || (isRouteErrorResponse(error) && error.status < 500)) return
  const { pathname } = new URL(request.url)
  log.error({ err: error, method: request.method, path: pathname }, 'a page failed')
}

export default function handleRequest(
  request: Request,
  status: number,
  headers: Headers,
  entry: EntryContext,
  context: RouterContextProvider,
) {
  const nonce = context.get(nonceContext)
  const readyEvent = isbot(request.headers.get('user-agent')) ? 'onAllReady' : 'onShellReady'
  return new Promise<Response>((resolve, reject) => {
    let responseStatus = status
    const { pipe, abort } = renderToPipeableStream(
      <ServerRouter context={entry} url={request.url} nonce={nonce} />,
      {
        nonce,
        [readyEvent]() {
          const body = new PassThrough()
          headers.set('content-type', 'text/html; charset=utf-8')
          resolve(
            new Response(createReadableStreamFromReadable(body), {
              headers,
              status: responseStatus,
            }),
          )
          pipe(body)
        },
        onShellError: reject,
        onError(error) {
          responseStatus = 500
          log.error({ err: error }, 'a page could not be rendered')
        },
      },
    )
    setTimeout(abort, streamTimeout + 1000).unref()
  })
}
