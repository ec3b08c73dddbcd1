import { type ChildProcess, spawn } from 'node:child_process'
import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { afterEach, describe, expect, it } from 'vitest'
import type { RigText, Sample } from '../../../src-main/contract/bridge'
import { unpackReply } from '../../../src-main/contract/packReply'
import { findOpener, hasScreen } from '../../../packaging/openBrowser.mjs'

describe('the way to a browser', () => {
  const isProgram =
    (...names: string[]) =>
    (file: string) =>
      names.includes(file)

  it('is the system’s own on macOS and Windows', () => {
    expect(findOpener('darwin', {})).toEqual(['open'])
    expect(findOpener('win32', {})).toEqual(['rundll32', 'url.dll,FileProtocolHandler'])
  })

  it('is, on Linux, what the path has, the desktop’s way first', () => {
    const env = { DISPLAY: ':0', PATH: '/a:/b' }
    expect(findOpener('linux', env, isProgram('/b/xdg-open', '/a/firefox'))).toEqual(['xdg-open'])
    expect(findOpener('linux', env, isProgram('/a/firefox'))).toEqual(['firefox'])
    expect(findOpener('linux', env, isProgram())).toBeNull()
  })

  it('needs a screen', () => {
    expect(findOpener('linux', { PATH: '/a' }, isProgram('/a/xdg-open'))).toBeNull()
    expect(hasScreen('linux', { WAYLAND_DISPLAY: 'wayland-0' })).toBe(true)
    expect(hasScreen('darwin', {})).toBe(true)
  })
})

const host = join(import.meta.dirname, '../../../out/main/browserHost.js')

describe.skipIf(!existsSync(host))('the served page (after npm run build)', () => {
  let child: ChildProcess | null = null
  afterEach(() => child?.kill())

  it('comes with the samples, of which the first can be solved', async () => {
    child = spawn(process.execPath, [host], { stdio: ['pipe', 'pipe', 'inherit'] })
    const address = await new Promise<string>((resolve) =>
      child?.stdout?.once('data', (line: Buffer) => resolve(line.toString().trim())),
    )
    const { origin, hash } = new URL(address)
    const ask = (method: string, ...args: unknown[]) =>
      fetch(`${origin}/bridge`, {
        method: 'POST',
        headers: { Origin: origin, Authorization: `Bearer ${hash.slice(1)}` },
        body: JSON.stringify({ method, args }),
      }).then(async (response) => unpackReply(await response.arrayBuffer()) as { value: unknown })
    const [first] = (await ask('listSamples')).value as Sample[]
    expect(first.id).toBe('drop-hammer-shaft')
    const { value } = (await ask('readSample', first.id)) as { value: RigText }
    const solved = await ask('solve', { slot: 's', ...value, coarse: false })
    expect(solved).toMatchObject({ value: { status: 'solved' } })
  })
})
