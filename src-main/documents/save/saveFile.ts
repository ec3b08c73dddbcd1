import writeFileAtomic from 'write-file-atomic'
import { retryBusy } from './retryBusy'

/**
 * Writes one file whole or not at all: what was there before stays until the new text is on the disk.
 *
 * @param path - where the user wants it
 * @param text - the whole content
 * @returns once it is written; rejects with the system's error
 */
export async function saveFile(path: string, text: string): Promise<void> {
  await retryBusy(() => writeFileAtomic(path, text, { encoding: 'utf8' }))
}
