import type { WebContents } from 'electron'

/**
 * Keeps a window on the page it opened with: no navigation, no redirect, no new window, no embedded view.
 *
 * @param contents - the contents of any window, from its creation on
 */
export function lockContents(contents: WebContents): void {
  contents.on('will-navigate', (event) => event.preventDefault())
  contents.on('will-frame-navigate', (event) => event.preventDefault())
  contents.on('will-redirect', (event) => event.preventDefault())
  contents.on('will-attach-webview', (event) => event.preventDefault())
  contents.setWindowOpenHandler(() => ({ action: 'deny' }))
}
