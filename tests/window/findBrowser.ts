import { existsSync } from 'node:fs'

/** The usual places of a Chromium, by platform. */
const PLACES: Partial<Record<NodeJS.Platform, string[]>> = {
  linux: [
    '/usr/bin/chromium',
    '/usr/bin/chromium-browser',
    '/usr/bin/google-chrome',
    '/usr/bin/google-chrome-stable',
    '/snap/bin/chromium',
  ],
  darwin: [
    '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
    '/Applications/Chromium.app/Contents/MacOS/Chromium',
  ],
  win32: [
    'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
    'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
    'C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe',
  ],
}

/** Why the window is not tested where no browser was found, and what to do. */
export const HOW_TO_GET_A_BROWSER =
  'no Chromium found: install one (Debian: apt-get install chromium) or name it in CHROME_PATH'

/**
 * Finds a Chromium to test the page in: the one named in CHROME_PATH, or one in the usual places.
 *
 * @returns absolute path of the browser; null where there is none
 */
export function findBrowser(): string | null {
  const named = process.env.CHROME_PATH
  if (named) return existsSync(named) ? named : null
  return (PLACES[process.platform] ?? []).find(existsSync) ?? null
}

/** Flags under which it starts in a container and asks nothing of any network. */
export const BROWSER_FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]
