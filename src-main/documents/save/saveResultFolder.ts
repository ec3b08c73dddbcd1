import { existsSync, renameSync } from 'node:fs'
import { mkdir, open, rm, type FileHandle } from 'node:fs/promises'
import { join } from 'node:path'
import { setImmediate as turn } from 'node:timers/promises'
import { RESULT_FILE_NAMES, type ResultFiles } from '../makeResultFiles'
import { findResultPlace, makeSuffix, type ResultPlace } from './resultPlace'
import { retryBusy } from './retryBusy'

const PART_SIZE = 1 << 16

/**
 * Writes a result folder whole or not at all. The files are written beside it and brought to the disk
 * first; then the old folder is moved aside, the new one takes its place, and the old one is removed. A
 * run killed between those two moves leaves the old result aside, whence the next run restores it.
 *
 * @param path - where the user wants it; must have passed `checkResultFolder`
 * @param files - the content, made part by part
 * @param signal - stops the writing as long as the old folder has not been moved
 * @returns once the new folder stands; rejects with the system's error or the signal's reason, and then
 *   everything is as it was before
 */
export async function saveResultFolder(
  path: string,
  files: ResultFiles,
  signal?: AbortSignal,
): Promise<void> {
  const place = findResultPlace(path)
  await mkdir(place.parent, { recursive: true })
  const suffix = makeSuffix()
  const fresh = join(place.parent, place.newPrefix + suffix)
  await mkdir(fresh)
  try {
    for (const name of RESULT_FILE_NAMES) await writeParts(join(fresh, name), files[name](), signal)
    await syncFolder(fresh)
    signal?.throwIfAborted()
    await putInPlace(fresh, place, suffix)
  } catch (error) {
    await rm(fresh, { recursive: true, force: true })
    throw error
  }
}

async function writeParts(path: string, parts: Iterable<string>, signal?: AbortSignal): Promise<void> {
  const file = await open(path, 'wx')
  try {
    let waiting = ''
    for (const part of parts) {
      waiting += part
      if (waiting.length < PART_SIZE) continue
      await writeText(file, waiting, signal)
      waiting = ''
    }
    await writeText(file, waiting, signal)
    await file.sync()
  } finally {
    await file.close()
  }
}

async function writeText(file: FileHandle, text: string, signal?: AbortSignal): Promise<void> {
  await file.writeFile(text, 'utf8')
  // A turn of the loop, so that a signal to stop is heard between two parts.
  await turn()
  signal?.throwIfAborted()
}

async function putInPlace(fresh: string, place: ResultPlace, suffix: string): Promise<void> {
  const { folder, parent, oldPrefix } = place
  const aside = join(parent, oldPrefix + suffix)
  const replaces = existsSync(folder)
  if (replaces) await retryBusy(() => renameSync(folder, aside))
  try {
    await retryBusy(() => renameSync(fresh, folder))
  } catch (error) {
    if (replaces) await retryBusy(() => renameSync(aside, folder))
    throw error
  }
  await syncFolder(parent)
  // The new result stands: an old one that cannot be removed now is removed by a later run.
  if (replaces) await rm(aside, { recursive: true, force: true, maxRetries: 3 }).catch(() => undefined)
}

/** Brings a folder's entries to the disk where the system can; the files themselves are there already. */
async function syncFolder(folder: string): Promise<void> {
  try {
    const handle = await open(folder, 'r')
    await handle.sync().finally(() => handle.close())
  } catch {
    return
  }
}
