import { BrowserWindow } from 'electron'
import { PAGE_ADDRESS } from './pageAddress'

/**
 * Opens the program's window on the page.
 *
 * @param preload - absolute path of the built preload script
 * @returns the window, shown once the page has drawn itself
 */
export function openWindow(preload: string): BrowserWindow {
  const window = new BrowserWindow({
    width: 1280,
    height: 800,
    minWidth: 640,
    minHeight: 480,
    show: false,
    backgroundColor: '#FBFAF6',
    webPreferences: {
      preload,
      contextIsolation: true,
      sandbox: true,
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
      webSecurity: true,
      allowRunningInsecureContent: false,
      webviewTag: false,
      spellcheck: false,
      navigateOnDragDrop: false,
    },
  })
  window.once('ready-to-show', () => window.show())
  void window.loadURL(PAGE_ADDRESS)
  return window
}
