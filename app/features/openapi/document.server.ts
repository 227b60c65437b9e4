import { boatSchema, setupSchema } from 'sim/plan/schema'
import { MODEL_VERSION } from 'sim/version'
import { z } from 'zod'
import { refused } from '~/server/field-errors'
import { notJson, tooLarge } from '~/server/json-body'
import { Problem, problemSchema } from '~/server/problem'
import { boatEntrySchema } from '../boats/schema'
import { healthSchema } from '../health/schema'
import { setupEntrySchema } from '../setups/schema'
import { simulateAnswerSchema } from '../simulate/answer'
import { bounds } from '../simulate/bounds'
import { simulateRequestSchema } from '../simulate/schema'
import { simulateExamples } from './examples'

const schemas = {
  Boat: boatSchema,
  BoatEntry: boatEntrySchema,
  Setup: setupSchema,
  SetupEntry: setupEntrySchema,
  SimulateRequest: simulateRequestSchema,
  SimulateAnswer: simulateAnswerSchema,
  Health: healthSchema,
  Problem: problemSchema,
}

type SchemaName = keyof typeof schemas

function components() {
  const registry = z.registry<{ id: string }>()
  for (const [id, schema] of Object.entries(schemas)) registry.add(schema, { id })
  const uri = (id: string) => `#/components/schemas/${id}`
  const generated = z.toJSONSchema(registry, { io: 'input', uri }).schemas
  return Object.fromEntries(
    Object.entries(generated).map(([id, { $id, $schema, ...schema }]) => [id, schema]),
  )
}

const reference = (name: SchemaName) => ({ $ref: `#/components/schemas/${name}` })

const json = (description: string, schema: object) => ({
  description,
  content: { 'application/json': { schema } },
})

function problem(description: string, example: Problem) {
  const content = { schema: reference('Problem'), example: example.body() }
  return { [example.status]: { description, content: { 'application/problem+json': content } } }
}

const noMethod = problem(
  'Wrong method; the Allow header names the right ones',
  new Problem(405, 'DELETE is not allowed here; use GET, HEAD.'),
)
const noDatabase = problem(
  'The database, or a free thread, is not to be had just now',
  new Problem(503, 'The database does not answer; try again shortly.'),
)
const noSetup = problem(
  'No such setup',
  new Problem(404, 'There is no setup called flying; /api/setups lists them.'),
)
const tooShort = refused([
  {
    field: 'durationS',
    given: 5,
    message: `must be a number from ${bounds.durationS.min} to ${bounds.durationS.max}`,
    min: bounds.durationS.min,
    max: bounds.durationS.max,
  },
])

function list(summary: string, entry: SchemaName) {
  const responses = {
    200: json(summary, { type: 'array', items: reference(entry) }),
    ...noMethod,
    ...noDatabase,
  }
  return { get: { summary, responses } }
}

function one(summary: string, name: SchemaName) {
  const parameters = [{ name: 'id', in: 'path', required: true, schema: { type: 'string' } }]
  const responses = {
    200: json(summary, reference(name)),
    ...problem('No such id', new Problem(404, `There is no such ${name.toLowerCase()}.`)),
    ...noMethod,
    ...noDatabase,
  }
  return { get: { summary, parameters, responses } }
}

/** The description of the HTTP interface, generated from the schemas that check it. */
export const openApiDocument = {
  openapi: '3.1.0',
  info: {
    title: 'Counterhelm',
    version: MODEL_VERSION,
    description:
      'A boat steered by her own sheet, computed. Angles, rates and the tiller are positive to ' +
      'starboard; wind angles and the course to the wind are positive with the wind over the ' +
      'starboard side. It steers no boat.',
  },
  paths: {
    '/api/health': {
      get: {
        summary: 'Whether the server can work',
        responses: {
          200: json('It can', reference('Health')),
          ...noMethod,
          503: json('It cannot', reference('Health')),
        },
      },
    },
    '/api/boats': list('The demo boats', 'BoatEntry'),
    '/api/boats/{id}': one('A boat, with every parameter', 'Boat'),
    '/api/setups': list('The demo setups, each with the conditions it is meant for', 'SetupEntry'),
    '/api/setups/{id}': one('A setup, with every parameter', 'Setup'),
    '/api/simulate': {
      post: {
        summary: 'Sail a setup and say whether it holds',
        description:
          'A key of `changes` is the path of a value in the setup or its boat: `line.takeUp`, ' +
          '`trim.main.sheetAngleDeg`, `leads.0.x`, `elastic.stretch`, `conditions.trueWindSpeedKn`, ' +
          '`hull.displacement`, `sails.main.area`; `source` is the sail whose sheet pulls. ' +
          `The body may hold ${bounds.bodyBytes / 1024} kB.`,
        requestBody: {
          required: true,
          content: {
            'application/json': {
              schema: reference('SimulateRequest'),
              examples: simulateExamples,
            },
          },
        },
        responses: {
          200: json('The run', reference('SimulateAnswer')),
          ...problem('A field is not allowed; `errors` names each with what it may be', tooShort),
          ...noSetup,
          ...noMethod,
          ...problem('The body is too large', tooLarge(bounds.bodyBytes)),
          ...problem('The body is not application/json', notJson()),
          ...noDatabase,
        },
      },
    },
  },
  components: { schemas: components() },
}
