import { app, ipcMain, Menu, protocol, session } from 'electron'
import { BRIDGE_CHANNEL } from '../../contract/bridgeChannel'
import { makeService } from '../../service/makeService'
import { answerBridge } from './answerBridge'
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

  const service = makeService()
  lockSession(session.defaultSession, paths.bundleFolder)
  ipcMain.handle(BRIDGE_CHANNEL, (event, message: unknown) => answerBridge(service, event, message))
  Menu.setApplicationMenu(Menu.buildFromTemplate(makeMenu()))
  app.on('activate', (_event, hasWindows) => {
    if (!hasWindows) openWindow(paths.preload)
  })
  openWindow(paths.preload)
}

/** Electron's own menu links to pages on the network; this one has what editing and closing need. */
function makeMenu(): Electron.MenuItemConstructorOptions[] {
  const menu: Electron.MenuItemConstructorOptions[] = [{ role: 'editMenu' }, { role: 'windowMenu' }]
  return process.platform === 'darwin' ? [{ role: 'appMenu' }, ...menu] : menu
}
