import { parsePath } from './parsePath'

/**
 * Reads what stands at a path of a document.
 *
 * @param document - the whole
 * @param path - written the way faults name places
 * @returns the value; undefined where there is none
 */
export function readAt(document: unknown, path: string): unknown {
  let value = document
  for (const part of parsePath(path)) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, part)) return undefined
    value = (value as Record<string | number, unknown>)[part]
  }
  return value
}
