import { parsePath, type Path } from './parsePath'

/**
 * Writes a value at a path; the document stays as it is, what did not change is shared with the new one.
 * Objects on the way are made where they are missing; undefined takes the key out, and with it the objects
 * that it leaves empty.
 *
 * @param document - the whole
 * @param path - written the way faults name places
 * @param value - plain data; undefined to take it out
 * @returns the new document
 */
export function writeAt<T>(document: T, path: string, value: unknown): T {
  return write(document, parsePath(path), value) as T
}

function write(owner: unknown, path: Path, value: unknown): unknown {
  if (path.length === 0) return value
  const [part, ...rest] = path
  if (typeof part === 'number') {
    const list = Array.isArray(owner) ? [...owner] : []
    const inner = write(list[part], rest, value)
    if (inner === undefined) list.splice(part, 1)
    else list[part] = inner
    return list
  }
  const object = typeof owner === 'object' && owner !== null && !Array.isArray(owner) ? { ...owner } : {}
  const fields = object as Record<string, unknown>
  const inner = write(Object.hasOwn(fields, part) ? fields[part] : undefined, rest, value)
  if (inner === undefined || (value === undefined && isEmpty(inner))) delete fields[part]
  else fields[part] = inner
  return fields
}

function isEmpty(value: unknown): boolean {
  return (
    typeof value === 'object' && value !== null && !Array.isArray(value) && Object.keys(value).length === 0
  )
}
