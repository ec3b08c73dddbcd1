import type { Session } from 'electron'
import { isPageAddress, PAGE_SCHEME } from './pageAddress'
import { serveBundle } from './serveBundle'

/**
 * Confines a window's session: every permission and device denied, nothing downloaded, and no request
 * answered but those for the page's own bundle.
 *
 * @param session - the session of the window
 * @param bundleFolder - absolute path of the built page
 */
export function lockSession(session: Session, bundleFolder: string): void {
  session.setPermissionRequestHandler((_contents, _permission, decide) => decide(false))
  session.setPermissionCheckHandler(() => false)
  session.setDevicePermissionHandler(() => false)
  session.setSpellCheckerEnabled(false)
  session.on('will-download', (event) => event.preventDefault())
  session.webRequest.onBeforeRequest((details, decide) => decide({ cancel: !isPageAddress(details.url) }))
  session.protocol.handle(PAGE_SCHEME, (request) => serveBundle(bundleFolder, request))
}
