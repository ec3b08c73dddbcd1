import { EventEmitter } from 'node:events'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import type { RigText } from '../../../../src-main/contract/bridge'
import { NOTICE } from '../../../../src-main/contract/notice'
import { BRIDGE_CHANNEL } from '../../../../src-main/contract/bridgeChannel'
import type { ElectronRecorder } from './electronRecorder'

vi.mock('electron', async () => (await import('./electronRecorder')).makeElectronRecorder())

let electron: ElectronRecorder
let bundleFolder: string

beforeAll(async () => {
  bundleFolder = mkdtempSync(join(tmpdir(), 'barwright-desktop-'))
  writeFileSync(join(bundleFolder, 'index.html'), '<title>page</title>')
  writeFileSync(join(bundleFolder, 'index.js'), 'x')
  electron = (await import('electron')) as unknown as ElectronRecorder
  electron.app.getPath.mockReturnValue(bundleFolder)
  const { startDesktop } = await import('../../../../src-main/hosts/desktop/startDesktop')
  await startDesktop({ bundleFolder, preload: '/built/preload.cjs' })
})
afterAll(() => rmSync(bundleFolder, { recursive: true }))

describe('the window', () => {
  it('is isolated, sandboxed and without Node', () => {
    expect(electron.windows).toHaveLength(1)
    expect(electron.windows[0].options.webPreferences).toMatchObject({
      preload: '/built/preload.cjs',
      contextIsolation: true,
      sandbox: true,
      nodeIntegration: false,
      nodeIntegrationInWorker: false,
      nodeIntegrationInSubFrames: false,
      webSecurity: true,
      allowRunningInsecureContent: false,
      webviewTag: false,
      spellcheck: false,
    })
    expect(electron.windows[0].options.webPreferences).not.toHaveProperty('enableBlinkFeatures')
    expect(electron.windows[0].options.webPreferences).not.toHaveProperty('experimentalFeatures')
  })

  it('opens on the page of its own protocol, only after everything is locked', () => {
    expect(electron.windows[0].loaded).toEqual(['barwright://app/'])
    expect(electron.order).toEqual([
      'sandbox',
      'scheme',
      'ready',
      'permissions',
      'protocol',
      'channel',
      'window',
    ])
  })

  it('has no menu entry that leads to the network', () => {
    const template = electron.Menu.buildFromTemplate.mock.calls[0][0] as { role: string }[]
    expect(electron.Menu.setApplicationMenu).toHaveBeenCalledWith(template)
    expect(JSON.stringify(template)).not.toMatch(/help|http/)
  })

  it('may stand beside others, each with its own files', () => {
    const [file] = electron.Menu.buildFromTemplate.mock.calls[0][0] as {
      submenu: { label?: string; click?: () => void }[]
    }[]
    file.submenu.find(({ label }) => label === 'New window')?.click?.()
    expect(electron.windows).toHaveLength(2)
    expect(electron.windows[1].options).toEqual(electron.windows[0].options)
  })
})

describe('the contents of any window', () => {
  function makeContents() {
    const contents = Object.assign(new EventEmitter(), { setWindowOpenHandler: vi.fn() })
    electron.app.emit('web-contents-created', {}, contents)
    return contents
  }

  it.each(['will-navigate', 'will-frame-navigate', 'will-redirect', 'will-attach-webview'])(
    'have %s prevented',
    (name) => {
      const event = { preventDefault: vi.fn() }
      makeContents().emit(name, event, 'barwright://app/')
      expect(event.preventDefault).toHaveBeenCalledOnce()
    },
  )

  it('open no new window', () => {
    const [decide] = makeContents().setWindowOpenHandler.mock.calls[0] as [(details: object) => unknown]
    expect(decide({ url: 'barwright://app/' })).toEqual({ action: 'deny' })
  })
})

describe('the session', () => {
  const ask = <T>(handler: { mock: { calls: unknown[][] } }, index = 0): T =>
    handler.mock.calls[0][index] as T

  it('denies every permission and device', () => {
    const { defaultSession } = electron.session
    const decide = vi.fn()
    ask<(contents: object, permission: string, decide: unknown) => void>(
      defaultSession.setPermissionRequestHandler,
    )({}, 'media', decide)
    expect(decide).toHaveBeenCalledExactlyOnceWith(false)
    expect(ask<() => boolean>(defaultSession.setPermissionCheckHandler)()).toBe(false)
    expect(ask<() => boolean>(defaultSession.setDevicePermissionHandler)()).toBe(false)
    expect(defaultSession.setSpellCheckerEnabled).toHaveBeenCalledWith(false)
  })

  it.each([
    ['blob:barwright://app/0c1f', 0],
    ['blob:barwright://other/0c1f', 1],
    ['blob:https://example.com/0c1f', 1],
    ['https://example.com/tool.exe', 1],
    ['barwright://app/index.html', 1],
  ])('downloads only files the page has made: %s is stopped %d times', (url, stopped) => {
    const event = { preventDefault: vi.fn() }
    electron.session.defaultSession.emit('will-download', event, { getURL: () => url })
    expect(event.preventDefault).toHaveBeenCalledTimes(stopped)
  })

  it.each([
    ['barwright://app/index.js', false],
    ['barwright://other/index.js', true],
    ['barwright://app.evil.example/', true],
    ['https://example.com/', true],
    ['http://127.0.0.1/', true],
    ['file:///etc/passwd', true],
    ['ws://example.com/', true],
    ['data:text/html,x', true],
    ['blob:barwright://app/0c1f', false],
    ['blob:https://example.com/0c1f', true],
  ])('answers %s: cancelled %s', (url, cancel) => {
    const decide = vi.fn()
    ask<(details: { url: string }, decide: unknown) => void>(
      electron.session.defaultSession.webRequest.onBeforeRequest,
    )({ url }, decide)
    expect(decide).toHaveBeenCalledExactlyOnceWith({ cancel })
  })
})

describe('the protocol', () => {
  const serve = (url: string, method = 'GET'): Promise<Response> => {
    const [scheme, handler] = electron.session.defaultSession.protocol.handle.mock.calls[0] as [
      string,
      (request: Request) => Promise<Response>,
    ]
    expect(scheme).toBe('barwright')
    return handler({ url, method } as Request)
  }

  it('serves the page with the strict policy', async () => {
    const response = await serve('barwright://app/')
    expect(await response.text()).toBe('<title>page</title>')
    expect(response.headers.get('content-type')).toBe('text/html; charset=utf-8')
    expect(response.headers.get('content-security-policy')).toMatch(/^default-src 'none'; script-src 'self';/)
  })

  it.each([
    ['barwright://app/../package.json', 404],
    ['barwright://app/%2e%2e/package.json', 404],
    ['barwright://app/..%2fpackage.json', 404],
    ['barwright://other/index.js', 404],
    ['barwright://app/nothing.js', 404],
  ])('serves nothing at %s', async (url, status) => {
    expect((await serve(url)).status).toBe(status)
  })

  it('only reads', async () => {
    expect((await serve('barwright://app/', 'POST')).status).toBe(405)
  })
})

describe('the channel', () => {
  const call = (senderFrame: object | null, message: unknown): Promise<unknown> => {
    const [channel, handler] = electron.ipcMain.handle.mock.calls[0] as [
      string,
      (event: object, message: unknown) => Promise<unknown>,
    ]
    expect(channel).toBe(BRIDGE_CHANNEL)
    return handler({ senderFrame, sender: electron.windows[0].webContents }, message)
  }
  const page = { url: 'barwright://app/', parent: null }

  it('is the only one, and answers the page', async () => {
    expect(electron.ipcMain.handle).toHaveBeenCalledOnce()
    expect(await call(page, { method: 'about', args: [] })).toMatchObject({ value: { notice: NOTICE } })
  })

  it.each([
    ['another page', { url: 'https://example.com/', parent: null }],
    ['another host of the protocol', { url: 'barwright://other/', parent: null }],
    ['a frame within the page', { url: 'barwright://app/', parent: page }],
    ['a frame that is gone', null],
  ])('does not answer %s', async (_what, frame) => {
    expect(await call(frame, { method: 'about', args: [] })).toEqual({
      error: 'Only the page itself is answered.',
    })
  })

  it('checks the arguments', async () => {
    expect(await call(page, { method: 'solve', args: [{}] })).toEqual({
      error: 'Argument 1 of "solve".slot must be text.',
    })
  })

  it("reaches the window's own files", async () => {
    const path = join(bundleFolder, 'made.rig.json')
    writeFileSync(path, '{}')
    electron.dialog.showOpenDialog.mockResolvedValueOnce({ canceled: false, filePaths: [path] })
    const opened = (await call(page, { method: 'files.open', args: [] })) as { value: RigText }
    expect(opened.value).toMatchObject({ name: 'made.rig.json', text: '{}' })
    expect(electron.dialog.showOpenDialog.mock.calls[0][0]).toBe(electron.windows[0])
    expect(await call(page, { method: 'files.save', args: [path, '{"a":1}'] })).toMatchObject({
      error: expect.stringContaining('not chosen') as string,
    })
    await call(page, { method: 'files.save', args: [opened.value.place, '{"a":1}'] })
    expect(readFileSync(path, 'utf8')).toBe('{"a":1}')
  })
})
