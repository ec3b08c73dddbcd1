/**
 * `npm run pack`: packs the built program into a folder for this machine's platform; `--output=FOLDER`
 * takes another place than dist/.
 * `npm run pack -- --installers` makes the installers of this platform; that needs a connected machine
 * (AppImage, the Windows installer) or a Mac (dmg), since electron-builder fetches the tools for them.
 */
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { parseArgs } from 'node:util'
import { build, Platform } from 'electron-builder'
import config from './builder.config.mjs'
import { electronFolder, electronVersion, hasElectronRuntime } from './electronRuntime.mjs'
import { makeStandIn } from './makeStandIn.mjs'

const { values: asked } = parseArgs({
  options: { installers: { type: 'boolean', default: false }, output: { type: 'string', default: 'dist' } },
})
const hasRuntime = hasElectronRuntime()

if (!hasRuntime && (asked.installers || process.platform === 'darwin')) {
  console.error(
    "This needs Electron's runtime, which is not on this machine: npx install-electron fetches it.",
  )
  process.exit(1)
}

const standIn = hasRuntime ? null : mkdtempSync(join(tmpdir(), 'barwright-stand-in-'))
if (standIn) makeStandIn(standIn, electronVersion)
try {
  const made = await build({
    targets: Platform.current().createTarget(asked.installers ? undefined : 'dir'),
    config: {
      ...config,
      directories: { ...config.directories, output: asked.output },
      electronVersion,
      electronDist: standIn ?? join(electronFolder, 'dist'),
    },
    projectDir: fileURLToPath(new URL('..', import.meta.url)),
    publish: 'never',
  })
  for (const path of made) console.log(path)
} finally {
  if (standIn) rmSync(standIn, { recursive: true })
}
if (standIn) {
  console.log(
    "Packed around a STAND-IN for Electron's runtime, which is not on this machine. What is in dist/ does not " +
      'run: it proves the contents of the package and the setting of its fuses, and nothing about windows, ' +
      'sandbox or installers. `npx install-electron` and `npm run pack` on a connected machine make the real one.',
  )
}
