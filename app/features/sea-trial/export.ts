import { type Channel, channels } from 'sim/trial/channels'
import type { Run } from '~/drawing/types'

/** A run as comma-separated values: every channel with its unit, in the stored units. */
export function runAsCsv({ request, result }: Run, link: string): string {
  const names = Object.keys(channels) as Channel[]
  const { boat, setup } = request.plan
  const lines = [
    `# ${boat.name}; ${setup.name}; ${request.helm}; model ${result.modelVersion}; ${link}`,
    names.map((name) => `${name} [${channels[name].unit}]`).join(','),
  ]
  for (let row = 0; row < result.series.timeS.length; row++) {
    lines.push(names.map((name) => result.series[name][row]).join(','))
  }
  return `${lines.join('\n')}\n`
}

export function csvName({ request }: Run): string {
  return `sea-trial-${request.plan.setup.id}-seed-${request.conditions.seed}.csv`
}
