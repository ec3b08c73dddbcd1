import { basename, dirname } from 'node:path'
import { type BrowserWindow, dialog } from 'electron'
import type { DocumentFiles, RigText, SheetState } from '../../../contract/bridge'
import { describeFileError } from '../../../documents/describeFileError'
import { readRigFile } from '../../../documents/readRigFile'
import { saveFile } from '../../../documents/save/saveFile'
import { Refusal } from '../../../service/refusal'
import type { Places } from './makePlaces'
import type { RecentFiles } from './makeRecentFiles'

const FILTERS = [{ name: 'Rig', extensions: ['json'] }]

/** Rig files of one window, and what its sheet has told of itself. */
export interface DesktopFiles extends DocumentFiles {
  /** Null until the sheet has told. */
  readonly sheet: SheetState | null
}

/**
 * Makes the rig files of a window: native dialogs, and writes only to what was chosen in one or opened.
 *
 * @param window - the parent of the dialogs
 * @param places - words for the files, shared by all windows
 * @param recent - shared by all windows
 */
export function makeDesktopFiles(window: BrowserWindow, places: Places, recent: RecentFiles): DesktopFiles {
  let sheet: SheetState | null = null

  async function read(path: string): Promise<RigText> {
    const read = readRigFile(path)
    if ('faults' in read) {
      throw new Refusal(`${basename(path)} ${read.faults.map(({ message }) => message).join('; ')}.`)
    }
    await recent.add(path)
    return { name: basename(path), text: read.file.text, place: places.give(path) }
  }

  async function write(path: string, text: string): Promise<void> {
    try {
      await saveFile(path, text)
    } catch (error) {
      throw new Refusal(`${basename(path)} cannot be written: ${describeFileError(error)}.`)
    }
    await recent.add(path)
  }

  function findPath(place: string): string {
    const path = places.find(place)
    if (path === null) throw new Refusal('This file was not chosen in this program; open it or save as.')
    return path
  }

  return {
    get sheet() {
      return sheet
    },
    async open() {
      const { canceled, filePaths } = await dialog.showOpenDialog(window, {
        title: 'Open a rig',
        properties: ['openFile'],
        filters: FILTERS,
      })
      return canceled || filePaths.length === 0 ? null : read(filePaths[0])
    },
    openRecent: async (place) => read(findPath(place)),
    async recent() {
      const paths = await recent.list()
      return paths.map((path) => ({ name: basename(path), folder: dirname(path), place: places.give(path) }))
    },
    save: async (place, text) => write(findPath(place), text),
    async saveAs(name, text) {
      const { canceled, filePath } = await dialog.showSaveDialog(window, {
        title: 'Save the rig as',
        defaultPath: basename(name),
        filters: FILTERS,
      })
      if (canceled || !filePath) return null
      await write(filePath, text)
      return { name: basename(filePath), place: places.give(filePath) }
    },
    async noteSheet(state) {
      sheet = state
    },
  }
}
