import type { Session } from 'electron'
import { isPageAddress, isPageFile, PAGE_SCHEME } from './pageAddress'
import { serveBundle } from './serveBundle'

/**
 * Confines a window's session: every permission and device denied, no request answered but those for the
 * page's own bundle, and nothing downloaded but files the page has made, for which Electron asks where.
 *
 * @param session - the session of the window
 * @param bundleFolder - absolute path of the built page
 */
export function lockSession(session: Session, bundleFolder: string): void {
  session.setPermissionRequestHandler((_contents, _permission, decide) => decide(false))
  session.setPermissionCheckHandler(() => false)
  session.setDevicePermissionHandler(() => false)
  session.setSpellCheckerEnabled(false)
  session.on('will-download', (event, item) => {
    if (!isPageFile(item.getURL())) event.preventDefault()
  })
  session.webRequest.onBeforeRequest(({ url }, decide) =>
    decide({ cancel: !isPageAddress(url) && !isPageFile(url) }),
  )
  session.protocol.handle(PAGE_SCHEME, (request) => serveBundle(bundleFolder, request))
}
