import { leadParameters } from 'sim/parameters/steering'
import type { Plan } from 'sim/plan/types'
import type { Part, PartKey } from './types'

/** Sails that are set, foremost first, then the steering gear in the order of the pull. */
export function partsOf(plan: Plan): Part[] {
  const { boat, setup } = plan
  const sails = Object.entries(boat.sails)
    .filter(([id]) => setup.trim[id]?.set === 'yes')
    .sort(([, a], [, b]) => b.luffX - a.luffX)
  const named: [PartKey, string][] = sails.map(([id, sail]) => [`sail.${id}`, sail.name])
  named.push(['sheet', `Sheet of the ${boat.sails[setup.source]?.name.toLowerCase() ?? 'sail'}`])
  if (setup.line.pull === 'deflected') named.push(['hitch', 'Hitch'])
  named.push(['line', 'Control line'])
  setup.leads.forEach((lead, index) => {
    named.push([`lead.${index}`, leadParameters.kind.options[lead.kind]])
  })
  named.push(['tiller', 'Tiller'], ['elastic', 'Elastic'], ['elastic-anchor', 'Elastic made fast'])
  return named.map(([key, name], index) => ({ key, number: index + 1, name }))
}

export function partNumber(parts: readonly Part[], key: PartKey): number | undefined {
  return parts.find((part) => part.key === key)?.number
}
