import { spawn, type ChildProcess } from 'node:child_process'
import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { afterEach, describe, expect, it } from 'vitest'

const entry = join(import.meta.dirname, '../../../../out/main/browserHost.js')
const running: ChildProcess[] = []

function start(...args: string[]): ChildProcess {
  const child = spawn(process.execPath, [entry, ...args], { stdio: 'pipe' })
  running.push(child)
  return child
}

const ended = (child: ChildProcess): Promise<number | null> =>
  new Promise((resolve) => child.on('exit', (code) => resolve(code)))

const firstLine = (child: ChildProcess): Promise<string> =>
  new Promise((resolve) => child.stdout?.once('data', (data: Buffer) => resolve(data.toString())))

afterEach(() => running.splice(0).forEach((child) => child.kill('SIGKILL')))

describe.skipIf(!existsSync(entry))('the built browser host (after npm run build)', () => {
  it('prints one line, the address, and ends when its parent lets go of it', async () => {
    const child = start('--port', '0')
    const lines: string[] = []
    child.stdout?.on('data', (data: Buffer) => lines.push(data.toString()))
    await firstLine(child)
    const end = ended(child)
    child.stdin?.end()
    expect(await end).toBe(0)
    expect(lines.join('')).toMatch(/^http:\/\/127\.0\.0\.1:\d+\/#[\w-]{43}\n$/)
  })

  it('ends when it is told to', async () => {
    const child = start()
    await firstLine(child)
    const end = ended(child)
    child.kill('SIGTERM')
    expect(await end).toBe(0)
  })

  it('ends when the process that started it is killed', async () => {
    const script = `
      const { spawn } = require('node:child_process')
      const host = spawn(process.execPath, [${JSON.stringify(entry)}], { stdio: ['ignore', 'pipe', 'inherit'] })
      host.stdout.once('data', () => console.log(host.pid))
      setInterval(() => {}, 1000)`
    const parent = spawn(process.execPath, ['-e', script], { stdio: 'pipe' })
    running.push(parent)
    const pid = Number(await firstLine(parent))
    parent.kill('SIGKILL')
    await expect.poll(() => isRunning(pid), { timeout: 5000 }).toBe(false)
  })

  it.each(['x', '-1', '65536', '1.5', ''])('refuses port %j with exit 2', async (port) => {
    const child = start(`--port=${port}`)
    let said = ''
    child.stderr?.on('data', (data: Buffer) => (said += data.toString()))
    expect(await ended(child)).toBe(2)
    expect(said).toContain('0 to 65535')
  })
})

function isRunning(pid: number): boolean {
  try {
    process.kill(pid, 0)
    return true
  } catch {
    return false
  }
}
