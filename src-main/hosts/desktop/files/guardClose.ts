import { type BrowserWindow, dialog } from 'electron'
import type { DesktopFiles } from './makeDesktopFiles'

/**
 * Keeps a window from closing over unsaved work: the user saves it, gives it up, or stays.
 *
 * @param window - the window
 * @param files - its rig files, with what its sheet has told
 */
export function guardClose(window: BrowserWindow, files: DesktopFiles): void {
  let asking = false
  window.on('close', (event) => {
    if (!files.sheet?.unsaved) return
    event.preventDefault()
    if (asking) return
    asking = true
    askAndSave(window, files)
      .then((mayClose) => mayClose && window.destroy())
      .finally(() => (asking = false))
  })
}

async function askAndSave(window: BrowserWindow, files: DesktopFiles): Promise<boolean> {
  const { name, text, place } = files.sheet!
  const { response } = await dialog.showMessageBox(window, {
    type: 'question',
    message: `Save the changes to ${name}?`,
    detail: 'They are lost otherwise.',
    buttons: ['Save', 'Do not save', 'Stay'],
    defaultId: 0,
    cancelId: 2,
    noLink: true,
  })
  if (response !== 0) return response === 1
  try {
    if (place !== null && !place.startsWith('sample:')) await files.save(place, text)
    else if ((await files.saveAs(name, text)) === null) return false
    return true
  } catch (error) {
    dialog.showErrorBox('The rig is not saved', (error as Error).message)
    return false
  }
}
