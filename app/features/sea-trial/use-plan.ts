import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query'
import { boatSchema, setupSchema } from 'sim/plan/schema'
import type { Plan } from 'sim/plan/types'

async function fetchDocument(address: string, signal: AbortSignal): Promise<unknown> {
  const response = await fetch(address, { signal })
  if (!response.ok) throw new Error(`${address} was answered with ${response.status}.`)
  return response.json()
}

/** A setup with its boat, fetched once and kept for as long as the page is open. */
export function planQuery(setupId: string) {
  return queryOptions({
    queryKey: ['plan', setupId],
    queryFn: async ({ signal }): Promise<Plan> => {
      const setup = setupSchema.parse(
        await fetchDocument(`/api/setups/${encodeURIComponent(setupId)}`, signal),
      )
      const boat = boatSchema.parse(await fetchDocument(`/api/boats/${setup.boatId}`, signal))
      return { boat, setup }
    },
    gcTime: Number.POSITIVE_INFINITY,
    retry: 1,
  })
}

/** The plan of a setup; while another is being fetched, the one before it. */
export function usePlan(setupId: string, first: Plan) {
  return useQuery({
    ...planQuery(setupId),
    initialData: setupId === first.setup.id ? first : undefined,
    placeholderData: keepPreviousData,
  })
}
