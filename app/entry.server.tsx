import { PassThrough } from 'node:stream'
import { createReadableStreamFromReadable } from '@react-router/node'
import { isbot } from 'isbot'
import { renderToPipeableStream } from 'react-dom/server'
import { type EntryContext, type RouterContextProvider, ServerRouter } from 'react-router'
import { nonceContext } from '~/server/load-context'

export const streamTimeout = 10_000

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
        onError() {
          responseStatus = 500
        },
      },
    )
    setTimeout(abort, streamTimeout + 1000)
  })
}
