/**
 * `npm start`: opens the window in Electron where its runtime is there or can be had, and otherwise
 * serves the same page to this machine's browser. `npm start -- --browser` goes straight to that.
 */
import { spawn, spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { electronFolder, hasElectronRuntime } from './electronRuntime.mjs'

const FETCH_TIME = 60_000
const top = fileURLToPath(new URL('..', import.meta.url))

const built = spawnSync('npm', ['run', 'build', '--silent'], {
  cwd: top,
  stdio: ['ignore', 'inherit', 'inherit'],
  shell: process.platform === 'win32',
})
if (built.status !== 0) process.exit(1)

if (!process.argv.includes('--browser') && !hasElectronRuntime()) {
  console.error("Electron's runtime is not on this machine yet; trying to fetch it, for a minute at most.")
  spawnSync(process.execPath, [join(electronFolder, 'install.js')], { stdio: 'ignore', timeout: FETCH_TIME })
  if (!hasElectronRuntime()) {
    console.error('It cannot be fetched from here. The same page opens in your browser instead:')
  }
}

const inWindow = !process.argv.includes('--browser') && hasElectronRuntime()
const child = inWindow
  ? spawn(process.execPath, [join(electronFolder, 'cli.js'), top], { stdio: 'inherit' })
  : spawn(process.execPath, [join(top, 'out/main/browserHost.js')], { stdio: ['pipe', 'inherit', 'inherit'] })
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => child.kill(signal))
child.on('exit', (code) => process.exit(code ?? 0))
