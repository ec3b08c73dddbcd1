import { closeSync, fstatSync, openSync, readSync, statSync } from 'node:fs'
import { describeFileError } from './describeFileError'

/** What a file holds; or its size, where it is over the limit; or why it cannot be read. */
export type LimitedText = { text: string; bytes: Buffer } | { tooLarge: number } | { refused: string }

/**
 * Reads a file as UTF-8 text, looking at its kind and size before its content.
 *
 * @param path - of any origin
 * @param limit - most bytes that are read
 * @returns the text, a byte-order mark included; devices, pipes and folders are refused unread
 */
export function readLimitedText(path: string, limit: number): LimitedText {
  try {
    // Opening a pipe would wait for its other end, so its kind is looked at first.
    const status = statSync(path)
    if (!status.isFile())
      return { refused: `it is ${status.isDirectory() ? 'a folder' : 'a device'}, not a file` }
    if (status.size > limit) return { tooLarge: status.size }
    const bytes = readUpTo(path, limit)
    return bytes.length > limit ? { tooLarge: bytes.length } : decode(bytes)
  } catch (error) {
    return { refused: describeFileError(error) }
  }
}

/** Reads one byte more than the limit at most, whatever size the file claims to have. */
function readUpTo(path: string, limit: number): Buffer {
  const file = openSync(path, 'r')
  try {
    const bytes = Buffer.alloc(Math.min(fstatSync(file).size, limit) + 1)
    let length = 0
    while (length < bytes.length) {
      const count = readSync(file, bytes, length, bytes.length - length, null)
      if (count === 0) break
      length += count
    }
    return bytes.subarray(0, length)
  } finally {
    closeSync(file)
  }
}

function decode(bytes: Buffer): LimitedText {
  try {
    return { text: new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes), bytes }
  } catch {
    return { refused: 'it is not UTF-8 text; save it as UTF-8' }
  }
}
