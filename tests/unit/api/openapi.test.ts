import { expect, test } from 'vitest'
import { openApiDocument } from '~/features/openapi/document.server'
import { simulateExamples } from '~/features/openapi/examples'
import { simulateRequestSchema } from '~/features/simulate/schema'
import { problemSchema } from '~/server/problem'

const document = JSON.parse(JSON.stringify(openApiDocument))

function* nodesIn(node: unknown): Generator<Record<string, unknown>> {
  if (typeof node !== 'object' || node === null) return
  yield node as Record<string, unknown>
  for (const value of Object.values(node)) yield* nodesIn(value)
}

test('every reference leads to a schema', () => {
  const references = [...nodesIn(document)].flatMap((node) => node.$ref ?? [])
  expect(references.length).toBeGreaterThan(10)
  for (const reference of references) {
    const [root, ...path] = String(reference).split('/')
    expect(root).toBe('#')
    expect(
      path.reduce((at, step) => at?.[step], document),
      String(reference),
    ).toBeTypeOf('object')
  }
})

test('every route that answers with data is described', () => {
  expect(Object.keys(document.paths)).toEqual([
    '/api/health',
    '/api/boats',
    '/api/boats/{id}',
    '/api/setups',
    '/api/setups/{id}',
    '/api/simulate',
  ])
})

test('the range of a parameter is described as its table has it', () => {
  const { Setup, SimulateRequest } = document.components.schemas
  expect(Setup.properties.line.properties.takeUp).toMatchObject({ minimum: -0.5, maximum: 1.8 })
  expect(SimulateRequest.properties.durationS).toMatchObject({
    minimum: 10,
    maximum: 3600,
    default: 600,
  })
  expect(SimulateRequest.required).toEqual(['setup'])
})

test('the examples are requests that would be read', () => {
  for (const { value } of Object.values(simulateExamples)) {
    expect(() => simulateRequestSchema.parse(value)).not.toThrow()
  }
})

test('the examples of problems are problems with the status they stand under', () => {
  let found = 0
  for (const node of nodesIn(document.paths)) {
    for (const [status, response] of Object.entries(node.responses ?? {})) {
      const example = response.content['application/problem+json']?.example
      if (!example) continue
      found++
      expect(problemSchema.parse(example).status).toBe(Number(status))
    }
  }
  expect(found).toBeGreaterThan(10)
})
