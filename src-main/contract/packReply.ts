import type { BridgeReply } from './bridgeCall'

/** Arrays that cross as they lie in memory. */
const KINDS = { f8: Float64Array, f4: Float32Array } as const

/** Where an array stands in the reply and how many numbers it has. */
interface PackedArray {
  path: (string | number)[]
  kind: keyof typeof KINDS
  length: number
}

interface Header {
  reply: BridgeReply
  arrays: PackedArray[]
}

/** Arrays start where their numbers may be read in place. */
const align = (offset: number) => Math.ceil(offset / 8) * 8

/**
 * Packs a reply into one run of bytes, for hosts that carry bytes: the length of a header (4 bytes,
 * little-endian), the header in JSON with the arrays cut out, then the arrays, each on a multiple of 8
 * bytes, in the byte order of the machine, which both ends share.
 *
 * @param reply - plain data and Float64Array or Float32Array at any depth
 * @returns the bytes
 */
export function packReply(reply: BridgeReply): Uint8Array<ArrayBuffer> {
  const arrays: PackedArray[] = []
  const parts: (Float64Array | Float32Array)[] = []
  const path: PackedArray['path'] = []
  const cutAt = (key: string | number, value: unknown): unknown => {
    path.push(key)
    const rest = cut(value)
    path.pop()
    return rest
  }
  const cut = (value: unknown): unknown => {
    if (typeof value !== 'object' || value === null) return value
    if (value instanceof Float64Array || value instanceof Float32Array) {
      arrays.push({
        path: [...path],
        kind: value instanceof Float64Array ? 'f8' : 'f4',
        length: value.length,
      })
      parts.push(value)
      return null
    }
    if (Array.isArray(value)) return value.map((entry, i) => cutAt(i, entry))
    return Object.fromEntries(Object.entries(value).map(([key, entry]) => [key, cutAt(key, entry)]))
  }
  const header: Header = { reply: cut(reply) as BridgeReply, arrays }
  const text = new TextEncoder().encode(JSON.stringify(header))
  const size = parts.reduce((offset, part) => align(offset) + part.byteLength, 4 + text.length)
  const bytes = new Uint8Array(size)
  new DataView(bytes.buffer).setUint32(0, text.length, true)
  bytes.set(text, 4)
  let offset = 4 + text.length
  for (const part of parts) {
    offset = align(offset)
    bytes.set(new Uint8Array(part.buffer, part.byteOffset, part.byteLength), offset)
    offset += part.byteLength
  }
  return bytes
}

/**
 * Takes a packed reply apart again.
 *
 * @param buffer - what {@link packReply} made
 * @returns the reply, its arrays lying in the buffer
 */
export function unpackReply(buffer: ArrayBuffer): BridgeReply {
  const length = new DataView(buffer).getUint32(0, true)
  const { reply, arrays } = JSON.parse(new TextDecoder().decode(new Uint8Array(buffer, 4, length))) as Header
  let offset = 4 + length
  for (const { path, kind, length: count } of arrays) {
    offset = align(offset)
    const array = new KINDS[kind](buffer, offset, count)
    offset += array.byteLength
    let place = reply as unknown as Record<string | number, unknown>
    for (const key of path.slice(0, -1)) place = place[key] as Record<string | number, unknown>
    place[path[path.length - 1]] = array
  }
  return reply
}
