import { readFile } from 'node:fs/promises'
import { saveFile } from '../../../documents/save/saveFile'

/** Files listed at most. */
const MOST = 10

/** The rig files opened or saved last, over all starts of the program. */
export interface RecentFiles {
  /** Absolute paths, the latest first. */
  list(): Promise<string[]>
  /** Puts a file first. */
  add(path: string): Promise<void>
}

/**
 * Makes the list of recent files.
 *
 * @param listPath - where the program keeps it, in its own folder; a list that cannot be read counts as empty
 */
export function makeRecentFiles(listPath: string): RecentFiles {
  async function list(): Promise<string[]> {
    try {
      const paths: unknown = JSON.parse(await readFile(listPath, 'utf8'))
      return Array.isArray(paths) ? paths.filter((path) => typeof path === 'string').slice(0, MOST) : []
    } catch {
      return []
    }
  }
  let last: Promise<unknown> = Promise.resolve()
  return {
    list,
    add(path) {
      const added = last.then(async () => {
        const others = (await list()).filter((one) => one !== path)
        await saveFile(listPath, JSON.stringify([path, ...others].slice(0, MOST)))
      })
      // A list that cannot be kept is no reason to fail what was asked for.
      last = added.catch(() => {})
      return last as Promise<void>
    },
  }
}
