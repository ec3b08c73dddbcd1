import { mkdirSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/** Where Electron keeps its fuses in its executable: this mark, a version, their number, a byte for each. */
export const FUSE_SENTINEL = 'dL7pKGdnNz796PbbjQWNKmHXBZaB9tsX'
const FUSES = 9

/**
 * Makes a folder that packs like Electron's runtime and is none: nothing in it runs. It lets the contents
 * of the packed program be tested on a machine that cannot fetch the runtime.
 *
 * @param folder - where to make it
 * @param version - Electron's version
 */
export function makeStandIn(folder, version) {
  mkdirSync(join(folder, 'resources'), { recursive: true })
  const executable = Buffer.concat([
    Buffer.from('This is a stand-in for Electron, for tests of contents only. It does not run.\n'),
    Buffer.from(FUSE_SENTINEL),
    Buffer.from([1, FUSES]),
    Buffer.alloc(FUSES, '0'),
  ])
  const name = process.platform === 'win32' ? 'electron.exe' : 'electron'
  writeFileSync(join(folder, name), executable, { mode: 0o755 })
  writeFileSync(join(folder, 'version'), version)
  for (const text of ['LICENSE', 'LICENSES.chromium.html']) writeFileSync(join(folder, text), 'stand-in\n')
}
