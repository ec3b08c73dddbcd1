import { type z } from 'zod'
import type { FaultList } from '../faultList'
import { faultText } from '../faultText'
import type { FaultText } from '../faultText'
import { DIMENSIONS } from '../formula/dimension'
import type { DimensionName } from '../formula/dimension'
import { nearestName } from '../nearestName'
import type { Place } from '../place'
import { quote } from '../showValue'
import type { QuantityParameters } from './fields'
import type { Loose } from './loose'
import type { RigForm } from './rigForm'
import { rigForm } from './rigForm'

type Issue = z.core.$ZodIssue

const TYPES: Record<string, string> = {
  object: 'an object { }',
  record: 'an object { }',
  array: 'a list [ ]',
  tuple: 'a list [ ]',
  string: 'a text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
}

/**
 * Checks that every key of a rig file is known and every value of the right kind.
 * @param document as read; values of the wrong form are taken out of it
 * @param faults gets `unknown-key`, `missing`, `wrong-type`, `wrong-choice`, `wrong-count`,
 *   `wrong-format`, `needs-unit`, `out-of-range`
 * @returns what is left of the document, or null where it is no object
 */
export function checkForm(document: unknown, faults: FaultList): Loose<RigForm> | null {
  const checked = rigForm.safeParse(document, { reportInput: false })
  if (checked.success) return document as Loose<RigForm>
  for (const issue of checked.error.issues) report(issue, [], document, faults)
  const isObject = typeof document === 'object' && document !== null && !Array.isArray(document)
  return isObject ? (document as Loose<RigForm>) : null
}

function report(issue: Issue, parent: Place, document: unknown, faults: FaultList): void {
  const place: Place = [
    ...parent,
    ...issue.path.map((part) => (typeof part === 'number' ? part : String(part))),
  ]
  if (issue.code === 'unrecognized_keys') {
    const known = issue.message.split(' ')
    for (const key of issue.keys) {
      faults.add([...place, key], () => faultText.unknownKey(key, nearestName(key, known), known))
    }
    return
  }
  if (issue.code === 'invalid_union' && issue.errors.length > 0) {
    const meant = issue.errors.find((option) => option.every((inner) => inner.path.length > 0))
    if (meant) {
      for (const inner of meant) report(inner, place, document, faults)
      return
    }
  }
  const value = valueAt(document, place)
  const reported = Number.isNaN(value)
  if (!reported) {
    faults.add(place, () =>
      value === undefined ? faultText.missing(expectedOf(issue)) : textOf(issue, value),
    )
  }
  takeOut(document, place)
}

/** What would be right, in words. */
function expectedOf(issue: Issue): string {
  if (issue.code === 'custom') return describeQuantity(issue.params as unknown as QuantityParameters)
  if (issue.code === 'invalid_type') return TYPES[issue.expected] ?? issue.expected
  if (issue.code === 'invalid_value')
    return issue.values.map((it) => (typeof it === 'string' ? quote(it) : String(it))).join(' or ')
  if (issue.code !== 'invalid_union') return 'a value'
  if ('options' in issue && Array.isArray(issue.options))
    return `one of ${choicesOf(issue.options).join(', ')}`
  return [...new Set(issue.errors.map((option) => (option[0] ? expectedOf(option[0]) : 'a value')))].join(
    ', or ',
  )
}

function textOf(issue: Issue, value: unknown): FaultText {
  switch (issue.code) {
    case 'custom': {
      const { quantity } = issue.params as unknown as QuantityParameters
      return typeof value === 'number'
        ? faultText.needsUnit(value, quantity)
        : faultText.wrongType(expectedOf(issue), value)
    }
    case 'invalid_value': {
      const choices = choicesOf(issue.values)
      if (issue.path[0] === 'format') return faultText.wrongFormat(value, choices[0])
      return faultText.wrongChoice(value, choices, nearestName(String(value), choices))
    }
    case 'invalid_union': {
      if ('options' in issue && Array.isArray(issue.options)) {
        const choices = choicesOf(issue.options)
        return faultText.wrongChoice(value, choices, nearestName(String(value), choices))
      }
      const bare = issue.errors.flat().find((inner) => inner.code === 'custom' && inner.path.length === 0)
      return bare && typeof value === 'number'
        ? textOf(bare, value)
        : faultText.wrongType(expectedOf(issue), value)
    }
    case 'too_small':
    case 'too_big': {
      const limit = issue.code === 'too_small' ? `at least ${issue.minimum}` : `at most ${issue.maximum}`
      if (Array.isArray(value)) return faultText.wrongCount(`${limit} in the list`, value.length)
      return faultText.outside(String(value), limit)
    }
    default:
      return faultText.wrongType(expectedOf(issue), value)
  }
}

function describeQuantity({ quantity }: QuantityParameters): string {
  const { label, example } = DIMENSIONS[quantity as DimensionName]
  return quantity === 'number' ? label : `a text with ${label}, such as "${example}"`
}

function choicesOf(values: readonly unknown[]): string[] {
  return values.map(String)
}

function valueAt(document: unknown, place: Place): unknown {
  let value: unknown = document
  for (const part of place) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, part)) return undefined
    value = (value as Record<string | number, unknown>)[part]
  }
  return value
}

/** Leaves the key where it stands, so that the order of the file is kept. */
function takeOut(document: unknown, place: Place): void {
  if (place.length === 0) return
  const owner = valueAt(document, place.slice(0, -1))
  const key = place[place.length - 1]
  if (typeof owner !== 'object' || owner === null || !Object.hasOwn(owner, key)) return
  ;(owner as Record<string | number, unknown>)[key] = undefined
}
