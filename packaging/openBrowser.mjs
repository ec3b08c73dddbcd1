import { spawn } from 'node:child_process'
import { accessSync, constants } from 'node:fs'
import { delimiter, join } from 'node:path'

/** What opens an address on Linux, the desktop's own way first. */
const LINUX_OPENERS = [
  'xdg-open',
  'sensible-browser',
  'x-www-browser',
  'firefox',
  'chromium',
  'google-chrome',
]

/** Tells whether there is a screen to open a window on. */
export const hasScreen = (platform, env) =>
  platform !== 'linux' || Boolean(env.DISPLAY || env.WAYLAND_DISPLAY)

/**
 * Finds the command that opens an address in this machine's browser.
 *
 * @param platform - as in process.platform
 * @param env - as in process.env
 * @param isProgram - tells whether a file can be run
 * @returns the command and what stands before the address; null where there is no browser or no screen
 */
export function findOpener(platform, env, isProgram = canRun) {
  if (platform === 'darwin') return ['open']
  if (platform === 'win32') return ['rundll32', 'url.dll,FileProtocolHandler']
  if (!hasScreen(platform, env)) return null
  const folders = (env.PATH ?? '').split(delimiter).filter((folder) => folder !== '')
  const found = LINUX_OPENERS.find((name) => folders.some((folder) => isProgram(join(folder, name))))
  return found ? [found] : null
}

function canRun(file) {
  try {
    accessSync(file, constants.X_OK)
    return true
  } catch {
    return false
  }
}

/** Opens an address in this machine's browser; false where there is none. A browser that fails is let be. */
export function openBrowser(address) {
  const opener = findOpener(process.platform, process.env)
  if (opener === null) return false
  const [command, ...before] = opener
  spawn(command, [...before, address], { stdio: 'ignore', detached: true })
    .on('error', () => {})
    .unref()
  return true
}
