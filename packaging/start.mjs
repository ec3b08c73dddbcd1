/**
 * `npm start`: opens the window in Electron where its runtime is there or can be had, and otherwise says
 * why and serves the same page to this machine's browser. `npm start -- --browser` goes straight to that.
 */
import { spawn, spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { createInterface } from 'node:readline'
import { fileURLToPath } from 'node:url'
import { electronFolder, hasElectronRuntime } from './electronRuntime.mjs'
import { hasScreen, openBrowser } from './openBrowser.mjs'

const FETCH_TIME = 60_000
const top = fileURLToPath(new URL('..', import.meta.url))
const say = (line) => process.stderr.write(`${line}\n`)

const built = spawnSync('npm', ['run', 'build', '--silent'], {
  cwd: top,
  stdio: ['ignore', 'inherit', 'inherit'],
  shell: process.platform === 'win32',
})
if (built.status !== 0) process.exit(1)

const child = canOpenWindow()
  ? spawn(process.execPath, [join(electronFolder, 'cli.js'), top], { stdio: 'inherit' })
  : servePage()
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => child.kill(signal))
child.on('exit', (code) => process.exit(code ?? 0))

/** Says why where it cannot. */
function canOpenWindow() {
  if (process.argv.includes('--browser')) return false
  if (!hasScreen(process.platform, process.env)) {
    say('There is no screen to open a window on; the page is served instead.')
    return false
  }
  if (hasElectronRuntime()) return true
  say(
    `Electron's runtime is not on this machine yet; trying to fetch it, for ${FETCH_TIME / 1000} s at most.`,
  )
  spawnSync(process.execPath, [join(electronFolder, 'install.js')], { stdio: 'ignore', timeout: FETCH_TIME })
  if (hasElectronRuntime()) return true
  say('It cannot be fetched from here; the same page is served to your browser instead.')
  return false
}

/** The host ends with this process, which holds its standard input. */
function servePage() {
  const host = spawn(process.execPath, [join(top, 'out/main/browserHost.js')], {
    stdio: ['pipe', 'pipe', 'inherit'],
  })
  createInterface(host.stdout).once('line', (address) => {
    process.stdout.write(`${address}\n`)
    const opened = openBrowser(address)
    say(
      opened
        ? 'Barwright opens in your browser, or at the address above. Ctrl+C ends it.'
        : 'Barwright runs: open the address above in a browser on this machine. Ctrl+C ends it.',
    )
  })
  return host
}
