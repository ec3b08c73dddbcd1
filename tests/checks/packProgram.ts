import { extractAll } from '@electron/asar'
import { execFileSync } from 'node:child_process'
import { existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { hasElectronRuntime } from '../../packaging/electronRuntime.mjs'
import { top } from './trackedFiles'

const isBuilt = existsSync(join(top, 'out/main/commandLine.js'))
const canStandIn = process.platform === 'linux' || process.platform === 'win32'

/** True where the built program can be packed here. */
export const canPack = isBuilt && (canStandIn || hasElectronRuntime())

/** On what the packed program stands here, or why there is none; part of the tests' names. */
export const howPacked = !isBuilt
  ? 'needs npm run build'
  : hasElectronRuntime()
    ? "around Electron's runtime"
    : canStandIn
      ? 'around a stand-in: contents, wiring and fuse setting only, nothing of windows or sandbox'
      : "needs Electron's runtime on this platform"

export interface PackedProgram {
  /** Folder with what electron-builder made. */
  folder: string
  /** Folder with what its app.asar holds. */
  app: string
  /** Finds a file or folder by its name in what was made. */
  find(name: string): string
  remove(): void
}

/**
 * Packs the built program into a temporary folder and takes its archive apart.
 *
 * @returns where its parts lie; a failure to pack is thrown
 */
export function packProgram(): PackedProgram {
  const folder = mkdtempSync(join(tmpdir(), 'barwright-packed-'))
  execFileSync(process.execPath, [join(top, 'packaging/pack.mjs'), `--output=${folder}`], { stdio: 'pipe' })
  const app = join(folder, 'app')
  const find = (name: string): string => {
    const found = readdirSync(folder, { withFileTypes: true, recursive: true }).find(
      (entry) => entry.name === name,
    )
    if (!found) throw new Error(`${name} was not packed`)
    return join(found.parentPath, found.name)
  }
  extractAll(find('app.asar'), app)
  return { folder, app, find, remove: () => rmSync(folder, { recursive: true, force: true }) }
}
