import type { Fault } from '../../contract/fault'
import type { Rig, RunSettings } from '../../contract/rig'
import { readRigFile, type RigFile } from '../../documents/readRigFile'
import { readRig } from '../../engine/rig/readRig'

/** A rig with the file that it came from. */
export interface OpenRig {
  rig: Rig
  file: RigFile
}

/**
 * Reads and checks the rig of a file.
 *
 * @param path - as the user gave it
 * @param method - goes before the one that the file names
 * @returns the rig; or every reason why it is refused
 */
export function openRig(path: string, method?: RunSettings['method']): OpenRig | { faults: Fault[] } {
  const read = readRigFile(path)
  if ('faults' in read) return read
  const { rig, faults } = readRig(read.file.text, { readRecord: read.file.readRecord, method })
  return rig === null ? { faults } : { rig, file: read.file }
}
