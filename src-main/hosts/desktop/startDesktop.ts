import { join } from 'node:path'
import { app, ipcMain, Menu, protocol, session, type WebContents } from 'electron'
import { BRIDGE_CHANNEL } from '../../contract/bridgeChannel'
import { makeService } from '../../service/makeService'
import { findSamplesFolder } from '../../service/samples'
import { answerBridge } from './answerBridge'
import { guardClose } from './files/guardClose'
import { type DesktopFiles, makeDesktopFiles } from './files/makeDesktopFiles'
import { makePlaces } from './files/makePlaces'
import { makeRecentFiles } from './files/makeRecentFiles'
import { lockContents } from './lockContents'
import { lockSession } from './lockSession'
import { openWindow } from './openWindow'
import { PAGE_SCHEME } from './pageAddress'

export interface DesktopPaths {
  /** Absolute path of the built page. */
  bundleFolder: string
  /** Absolute path of the built preload script. */
  preload: string
}

/**
 * Starts the desktop host; must be called before Electron is ready, since the protocol is declared first.
 *
 * @param paths - where the built parts lie
 * @returns once the first window is open
 */
export async function startDesktop(paths: DesktopPaths): Promise<void> {
  app.enableSandbox()
  protocol.registerSchemesAsPrivileged([
    { scheme: PAGE_SCHEME, privileges: { standard: true, secure: true, supportFetchAPI: true } },
  ])
  app.on('web-contents-created', (_event, contents) => lockContents(contents))
  app.on('window-all-closed', () => {
    if (process.platform !== 'darwin') app.quit()
  })
  await app.whenReady()

  const places = makePlaces()
  const recent = makeRecentFiles(join(app.getPath('userData'), 'recent-rigs.json'))
  const samplesFolder = findSamplesFolder(paths.bundleFolder)
  const service = makeService({ samplesFolder, findFile: (place) => places.find(place) })
  const filesOf = new WeakMap<WebContents, DesktopFiles>()
  const open = (): void => {
    const window = openWindow(paths.preload)
    const files = makeDesktopFiles(window, places, recent)
    filesOf.set(window.webContents, files)
    guardClose(window, files)
  }

  lockSession(session.defaultSession, paths.bundleFolder)
  ipcMain.handle(BRIDGE_CHANNEL, (event, message: unknown) =>
    answerBridge({ service, files: filesOf.get(event.sender) ?? null }, event, message),
  )
  Menu.setApplicationMenu(Menu.buildFromTemplate(makeMenu(open)))
  app.on('activate', (_event, hasWindows) => {
    if (!hasWindows) open()
  })
  open()
}

/** Electron's own menu links to pages on the network; this one has what editing and closing need. */
function makeMenu(openWindow: () => void): Electron.MenuItemConstructorOptions[] {
  const menu: Electron.MenuItemConstructorOptions[] = [
    {
      label: 'File',
      submenu: [
        { label: 'New window', accelerator: 'CmdOrCtrl+Shift+N', click: () => openWindow() },
        { role: 'close' },
      ],
    },
    { role: 'editMenu' },
    { role: 'windowMenu' },
  ]
  return process.platform === 'darwin' ? [{ role: 'appMenu' }, ...menu] : menu
}
