import { DrizzleQueryError } from 'drizzle-orm'
import { log } from './log'
import { Problem } from './problem'

interface Asked {
  request: Request
}

/** The answer of a resource route, with whatever goes wrong turned into problem details. */
export async function answer(work: () => Promise<Response> | Response): Promise<Response> {
  try {
    return await work()
  } catch (error) {
    return problemOf(error).response()
  }
}

function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error
  log.error({ err: error }, 'a request failed')
  return error instanceof DrizzleQueryError
    ? new Problem(503, 'The database does not answer; try again shortly.', {
        headers: { 'retry-after': '5' },
      })
    : new Problem(500, 'Something went wrong here; it has been recorded.')
}

/** Refuses the methods a resource does not have, naming those it has. */
export function methodNotAllowed(allow: string) {
  return ({ request }: Asked): Response =>
    new Problem(405, `${request.method} is not allowed here; use ${allow}.`, {
      headers: { allow },
    }).response()
}

const readMethods = 'GET, HEAD'

/** The action of a resource that can only be read. */
export const notWritable = methodNotAllowed(readMethods)

/** The loader of a resource that can only be read. */
export function readable<Args extends Asked>(read: (args: Args) => Promise<Response> | Response) {
  return (args: Args) =>
    readMethods.split(', ').includes(args.request.method)
      ? answer(() => read(args))
      : notWritable(args)
}
