import { openApiDocument } from '~/features/openapi/document.server'
import { methodNotAllowed } from '~/server/problem'

export const loader = () => Response.json(openApiDocument)

export const action = methodNotAllowed('GET, HEAD')
