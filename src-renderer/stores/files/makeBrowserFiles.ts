import type { FileWays, OpenedFile, RecentFile } from './fileWays'
import { saveFile } from '../../sheet/charts/saveFile'
import { readFileText } from './readFileText'

/** A file that the browser may write to where the user chose it. */
interface WritableHandle {
  name: string
  getFile(): Promise<File>
  createWritable(): Promise<{ write(text: string): Promise<void>; close(): Promise<void> }>
}

interface PickerPage {
  showOpenFilePicker?(options: object): Promise<WritableHandle[]>
  showSaveFilePicker?(options: object): Promise<WritableHandle>
}

const TYPES = [{ description: 'Rig files', accept: { 'application/json': ['.json'] } }]
const RECENT_KEPT = 8

/**
 * Makes the ways of a page in a browser: its file pickers where it has them, and otherwise the choice of a
 * file and the download that every browser has. What was opened is remembered while the page is open.
 *
 * @param page - the page's window
 * @returns the ways
 */
export function makeBrowserFiles(page: Window): FileWays {
  const pickers = page as unknown as PickerPage
  let recent: RecentFile[] = []

  function remember(name: string, open: () => Promise<OpenedFile>): void {
    recent = [{ name, folder: '', open }, ...recent.filter((one) => one.name !== name)].slice(0, RECENT_KEPT)
  }
  async function readHandle(handle: WritableHandle): Promise<OpenedFile> {
    const text = await readFileText(await handle.getFile())
    remember(handle.name, () => readHandle(handle))
    return { name: handle.name, text, place: null, target: handle }
  }
  async function readDropped(file: File): Promise<OpenedFile> {
    const opened: OpenedFile = { name: file.name, text: await readFileText(file), place: null, target: null }
    remember(file.name, () => readDropped(file))
    return opened
  }
  async function write(handle: WritableHandle, text: string): Promise<void> {
    const writable = await handle.createWritable()
    await writable.write(text)
    await writable.close()
  }

  return {
    async open() {
      if (pickers.showOpenFilePicker) {
        const picked = await orNone(pickers.showOpenFilePicker({ types: TYPES }))
        return picked ? readHandle(picked[0]) : null
      }
      const file = await chooseFile(page.document)
      return file && readDropped(file)
    },
    recent: async () => recent,
    save: (target, text) => write(target as WritableHandle, text),
    async saveAs(name, text) {
      if (pickers.showSaveFilePicker) {
        const handle = await orNone(pickers.showSaveFilePicker({ suggestedName: name, types: TYPES }))
        if (!handle) return null
        await write(handle, text)
        remember(handle.name, () => readHandle(handle))
        return { name: handle.name, place: null, target: handle }
      }
      saveFile(name, new Blob([text], { type: 'application/json' }))
      return { name, place: null, target: null }
    },
    readDropped,
  }
}

/** Null where the user chose none; other failures are passed on. */
async function orNone<T>(picking: Promise<T>): Promise<T | null> {
  try {
    return await picking
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') return null
    throw error
  }
}

function chooseFile(document: Document): Promise<File | null> {
  const input = document.createElement('input')
  input.type = 'file'
  input.accept = '.json,application/json'
  return new Promise((resolve) => {
    input.addEventListener('change', () => resolve(input.files?.[0] ?? null))
    input.addEventListener('cancel', () => resolve(null))
    input.click()
  })
}
