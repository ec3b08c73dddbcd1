import { existsSync } from 'node:fs'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'

const require = createRequire(import.meta.url)

/** Folder of the installed package `electron`, and its version. */
export const electronFolder = dirname(require.resolve('electron/package.json'))
export const electronVersion = require('electron/package.json').version

/** Tells whether Electron's runtime is on this machine; the package installs without it. */
export const hasElectronRuntime = () => existsSync(join(electronFolder, 'path.txt'))
