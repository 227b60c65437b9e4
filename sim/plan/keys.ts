/**
 * Every adjustable value of a plan under one flat key: `line.takeUp`, `trim.main.reef`,
 * `leads.0.x`, `conditions.seed`. The address, the HTTP interface and the controls use these keys.
 */
import { conditionParameters } from '../parameters/conditions'
import type { Parameter, ParameterTable } from '../parameters/define'
import {
  hullParameters,
  keelParameters,
  rudderParameters,
  tillerParameters,
} from '../parameters/hull'
import { sailParameters, trimParameters } from '../parameters/sails'
import { elasticParameters, leadParameters, lineParameters } from '../parameters/steering'
import type { Plan } from './types'

/** A parameter's value in its stored unit, or the key of an option. */
export type Value = number | string

type Owner = 'boat' | 'setup'

/** Groups holding one table's values, and groups holding one such set per sail or lead. */
const single: Record<string, { owner: Owner; table: ParameterTable }> = {
  conditions: { owner: 'setup', table: conditionParameters },
  line: { owner: 'setup', table: lineParameters },
  elastic: { owner: 'setup', table: elasticParameters },
  hull: { owner: 'boat', table: hullParameters },
  keel: { owner: 'boat', table: keelParameters },
  rudder: { owner: 'boat', table: rudderParameters },
  tiller: { owner: 'boat', table: tillerParameters },
}
const repeated: Record<string, { owner: Owner; table: ParameterTable }> = {
  trim: { owner: 'setup', table: trimParameters },
  leads: { owner: 'setup', table: leadParameters },
  sails: { owner: 'boat', table: sailParameters },
}

interface Address {
  owner: Owner
  table: ParameterTable
  path: string[]
  name: string
}

function locate(plan: Plan, key: string): Address | undefined {
  const path = key.split('.')
  const [group, second, third] = path
  if (group === undefined || second === undefined) return undefined
  if (path.length === 2 && Object.hasOwn(single, group)) {
    const found = single[group]
    return found && { ...found, path: [group], name: second }
  }
  if (path.length === 3 && third !== undefined && Object.hasOwn(repeated, group)) {
    const found = repeated[group]
    if (!found) return undefined
    const members = holder(plan[found.owner], [group])
    // Own names that can be listed: a list's length is no member of it.
    if (!members || !Object.keys(members).includes(second)) return undefined
    return { ...found, path: [group, second], name: third }
  }
  return undefined
}

function holder(root: unknown, path: string[]): Record<string, unknown> | undefined {
  let at: unknown = root
  for (const step of path) {
    if (typeof at !== 'object' || at === null || !Object.hasOwn(at, step)) return undefined
    at = (at as Record<string, unknown>)[step]
  }
  return at as Record<string, unknown>
}

function sourceParameter(plan: Plan): Parameter {
  const options: Record<string, string> = {}
  for (const [id, sail] of Object.entries(plan.boat.sails)) options[id] = `${sail.name} sheet`
  return {
    type: 'choice',
    label: 'Pull taken from',
    options,
    default: plan.setup.source,
    source: 'Rigged',
  }
}

/** The table's entry for a key, or undefined where this plan has no such parameter. */
export function parameterAt(plan: Plan, key: string): Parameter | undefined {
  if (key === 'source') return sourceParameter(plan)
  const found = locate(plan, key)
  return found && Object.hasOwn(found.table, found.name) ? found.table[found.name] : undefined
}

/** The value under a key. Throws a RangeError for a key the plan does not have. */
export function readValue(plan: Plan, key: string): Value {
  if (key === 'source') return plan.setup.source
  const found = locate(plan, key)
  const value = found && holder(plan[found.owner], found.path)?.[found.name]
  if (typeof value !== 'number' && typeof value !== 'string') {
    throw new RangeError(`no parameter called ${key}`)
  }
  return value
}

/** A copy of the plan with one value changed; the plan given is left as it was. */
export function withValue(plan: Plan, key: string, value: Value): Plan {
  if (key === 'source') return { ...plan, setup: { ...plan.setup, source: String(value) } }
  const found = locate(plan, key)
  if (!found || !Object.hasOwn(found.table, found.name)) {
    throw new RangeError(`no parameter called ${key}`)
  }
  const changed = replaced(plan[found.owner], [...found.path, found.name], value)
  return { ...plan, [found.owner]: changed } as Plan
}

function replaced(node: unknown, path: string[], value: Value): unknown {
  const [step, ...rest] = path
  if (step === undefined) return value
  if (Array.isArray(node)) {
    const copy = node.slice()
    copy[Number(step)] = replaced(copy[Number(step)], rest, value)
    return copy
  }
  const members = node as Record<string, unknown>
  return { ...members, [step]: replaced(members[step], rest, value) }
}

/** All keys of a plan, in the order of the tables. */
export function keysOf(plan: Plan): string[] {
  const keys: string[] = ['source']
  for (const [group, { table }] of Object.entries(single)) {
    for (const name of Object.keys(table)) keys.push(`${group}.${name}`)
  }
  for (const [group, { owner, table }] of Object.entries(repeated)) {
    for (const member of Object.keys(holder(plan[owner], [group]) ?? {})) {
      for (const name of Object.keys(table)) keys.push(`${group}.${member}.${name}`)
    }
  }
  return keys
}

/** What is wrong with a value for a parameter, naming what is allowed, or null when it may be used. */
export function checkValue(key: string, parameter: Parameter, value: unknown): string | null {
  if (parameter.type === 'choice') {
    const options = Object.keys(parameter.options)
    return typeof value === 'string' && Object.hasOwn(parameter.options, value)
      ? null
      : `${key} must be one of ${options.join(', ')}`
  }
  const { min, max, unit } = parameter
  const range = `${min} to ${max}${unit === '1' ? '' : ` ${unit}`}`
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return `${key} must be a number from ${range}`
  }
  if (parameter.whole && !Number.isInteger(value)) {
    return `${key} must be a whole number from ${range}`
  }
  return value < min || value > max ? `${key} must be from ${range}` : null
}
