import { createHash } from 'node:crypto'
import type { Fault } from '../contract/fault'
import { faultText } from '../engine/rig/faultText'
import { LIMITS } from '../engine/rig/limits'
import type { ReadRecord } from '../engine/rig/reading'
import { makeRecordReader } from './makeRecordReader'
import { readLimitedText } from './readLimitedText'

/** A rig file as it lies on the disk, unread in meaning. */
export interface RigFile {
  text: string
  /** Of its bytes, in hexadecimal digits. */
  sha256: string
  /** Reads a record beside it. */
  readRecord: ReadRecord
}

/**
 * Reads a rig file from the disk.
 *
 * @param path - as the user gave it
 * @returns its text and digest; or why it is refused (`not-readable`, `too-large`), always of the whole file
 */
export function readRigFile(path: string): { file: RigFile } | { faults: Fault[] } {
  const read = readLimitedText(path, LIMITS.textBytes)
  if ('tooLarge' in read) return { faults: [{ path: '', ...faultText.textTooLarge(read.tooLarge) }] }
  if ('refused' in read) {
    return { faults: [{ path: '', code: 'not-readable', message: `cannot be read: ${read.refused}` }] }
  }
  const sha256 = createHash('sha256').update(read.bytes).digest('hex')
  return { file: { text: read.text, sha256, readRecord: makeRecordReader(path) } }
}
