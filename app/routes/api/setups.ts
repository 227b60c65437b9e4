import { listSetups } from '~/features/setups/queries.server'
import { notWritable, readable } from '~/server/resource'

export const loader = readable(async () => Response.json(await listSetups()))

export const action = notWritable
