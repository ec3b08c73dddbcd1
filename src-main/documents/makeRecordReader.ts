import { realpathSync } from 'node:fs'
import { dirname, isAbsolute, join } from 'node:path'
import type { ReadRecord } from '../engine/rig/reading'
import { LIMITS } from '../engine/rig/limits'
import { describeFileError } from './describeFileError'
import { isInside } from './isInside'
import { readLimitedText } from './readLimitedText'

/**
 * Makes the access that a rig has to the records beside it, and to nothing else.
 *
 * @param rigPath - path of the rig file
 * @returns reads a record by its path relative to the rig's folder; a path that leaves the folder, also
 *   through a link, is refused, as is a file over the limit of a record
 */
export function makeRecordReader(rigPath: string): ReadRecord {
  return (relativePath) => {
    try {
      if (isAbsolute(relativePath)) return { refused: 'it does not begin in the folder of the rig' }
      const folder = realpathSync(dirname(rigPath))
      const file = realpathSync(join(folder, relativePath))
      if (!isInside(folder, file)) return { refused: 'it lies outside the folder of the rig' }
      return readRecord(file)
    } catch (error) {
      return { refused: describeFileError(error) }
    }
  }
}

function readRecord(file: string): string | { refused: string } {
  const read = readLimitedText(file, LIMITS.recordBytes)
  if ('text' in read) return read.text
  if ('refused' in read) return read
  const megabytes = (bytes: number): string => String(Math.round(bytes / 1024 / 1024))
  return {
    refused: `it has ${megabytes(read.tooLarge)} MB; at most ${megabytes(LIMITS.recordBytes)} MB are read`,
  }
}
