import { listBoats } from '~/features/boats/queries.server'
import { notWritable, readable } from '~/server/resource'

export const loader = readable(async () => Response.json(await listBoats()))

export const action = notWritable
