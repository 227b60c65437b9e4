import { demoBoats } from 'db/demo/boats'
import { demoSetups } from 'db/demo/setups'
import type { SimulateBody } from '../simulate/schema'

interface Example {
  summary: string
  value: SimulateBody
}

function examplesOf(): Record<string, Example> {
  const setup = demoSetups.find((candidate) => !candidate.flaw)
  const boat = demoBoats.find((candidate) => candidate.id === setup?.boatId)
  if (!setup || !boat) throw new Error('there is no demo setup to give as an example')
  return {
    asStated: {
      summary: 'A demo setup in the conditions it is meant for',
      value: { setup: setup.id },
    },
    changed: {
      summary: 'In more wind, with the line taken up, a gust on the way, over five seeds',
      value: {
        setup: setup.id,
        conditions: {
          trueWindSpeedKn: 15,
          seed: 7,
          events: [{ atS: 120, kind: 'gust', strengthKn: 6, durationS: 15 }],
        },
        changes: { 'line.takeUp': 0.35 },
        seeds: 5,
      },
    },
    written: {
      summary: 'A setup written out with its boat',
      value: { setup: { ...setup, boat }, helm: 'lashed', durationS: 120, outputIntervalS: 0.5 },
    },
  }
}

export const simulateExamples = examplesOf()
