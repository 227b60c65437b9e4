import { openApiDocument } from '~/features/openapi/document.server'
import { notWritable, readable } from '~/server/resource'

export const loader = readable(() => Response.json(openApiDocument))

export const action = notWritable
