import type { Result } from '../contract/result'
import { RESULT_SHAPE, type ShapeNode } from './resultShape'

const VALUES_PER_PART = 10_000

/**
 * Writes a result as the text of `result.json`: keys in one order, numbers in full, arrays of numbers on
 * one line each, one newline at the end.
 *
 * @param result - SI; arrays of numbers may be typed arrays
 * @returns the text in parts, so that a large field never stands in memory as one string; a number that
 *   is not finite, or a key that the format does not have, throws: it would be a fault of the program
 */
export function* writeResultJson(result: Result): Generator<string> {
  yield* writeValue(result, RESULT_SHAPE, '', 'result')
  yield '\n'
}

function* writeValue(value: unknown, shape: ShapeNode, indent: string, path: string): Generator<string> {
  if (isList(value) && isCompact(value, indent)) {
    yield* writeList(value, path)
  } else if (isCompact(value, indent)) {
    yield writeCompact(value, shape, path)
  } else if (isList(value)) {
    yield* writeItems('[', ']', listItems(value, shape, path), indent)
  } else {
    yield* writeItems('{', '}', objectItems(value as object, shape, path), indent)
  }
}

interface Item {
  label: string
  value: unknown
  shape: ShapeNode
  path: string
}

function* writeItems(open: string, close: string, items: Iterable<Item>, indent: string): Generator<string> {
  const inner = `${indent}  `
  let before = `${open}\n${inner}`
  for (const item of items) {
    yield before + item.label
    yield* writeValue(item.value, item.shape, inner, item.path)
    before = `,\n${inner}`
  }
  yield `\n${indent}${close}`
}

function* listItems(list: ArrayLike<unknown>, shape: ShapeNode, path: string): Generator<Item> {
  const of = Array.isArray(shape) ? shape[0] : null
  for (let i = 0; i < list.length; i++) yield { label: '', value: list[i], shape: of, path: `${path}[${i}]` }
}

function* objectItems(value: object, shape: ShapeNode, path: string): Generator<Item> {
  for (const [key, member] of orderMembers(value, shape, path)) {
    const of = (shape as Record<string, ShapeNode>)[key]
    yield { label: `${JSON.stringify(key)}: `, value: member, shape: of, path: `${path}.${key}` }
  }
}

/** The members of an object in the order of the format. */
function orderMembers(value: object, shape: ShapeNode, path: string): [string, unknown][] {
  if (shape === null || Array.isArray(shape)) throw new Error(`${path}: the format has no object here`)
  const members = value as Record<string, unknown>
  for (const key of Object.keys(members)) {
    if (!Object.hasOwn(shape, key)) throw new Error(`${path}.${key}: the format has no such key`)
  }
  return Object.keys(shape).map((key) => {
    if (members[key] === undefined) throw new Error(`${path}.${key}: missing from the result`)
    return [key, members[key]]
  })
}

/** One line holds a text, a number, a list of them, or an object without lists; never the whole result. */
function isCompact(value: unknown, indent: string): boolean {
  if (!isObject(value)) return true
  if (isList(value)) return value.length === 0 || !isObject(value[0])
  return indent !== '' && Object.values(value).every((member) => !isList(member) && isCompact(member, indent))
}

function writeCompact(value: unknown, shape: ShapeNode, path: string): string {
  if (typeof value === 'number') return writeNumber(value, path)
  if (!isObject(value)) return JSON.stringify(value)
  const members = [...objectItems(value, shape, path)]
  return `{ ${members.map((item) => item.label + writeCompact(item.value, item.shape, item.path)).join(', ')} }`
}

/** A list of plain values on one line, in parts short enough that a run can be stopped between them. */
function* writeList(list: ArrayLike<unknown>, path: string): Generator<string> {
  let before = '['
  for (let from = 0; from < list.length; from += VALUES_PER_PART) {
    const size = Math.min(VALUES_PER_PART, list.length - from)
    const texts = Array.from({ length: size }, (_none, i) => writeCompact(list[from + i], null, path))
    yield before + texts.join(',')
    before = ','
  }
  yield list.length === 0 ? '[]' : ']'
}

function writeNumber(value: number, path: string): string {
  if (!Number.isFinite(value)) throw new Error(`${path}: ${value} is not a number that a result may hold`)
  return JSON.stringify(value)
}

function isObject(value: unknown): value is object {
  return typeof value === 'object' && value !== null
}

function isList(value: unknown): value is ArrayLike<unknown> {
  return Array.isArray(value) || ArrayBuffer.isView(value)
}
