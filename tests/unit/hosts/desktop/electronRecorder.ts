import { EventEmitter } from 'node:events'
import { vi } from 'vitest'

/** What the desktop host asked of `electron`, recorded by a stand-in; it draws nothing and confines nothing. */
export interface ElectronRecorder {
  app: EventEmitter & {
    enableSandbox: unknown
    whenReady: () => Promise<void>
    quit: unknown
    getPath: ReturnType<typeof vi.fn>
  }
  dialog: {
    showOpenDialog: ReturnType<typeof vi.fn>
    showSaveDialog: ReturnType<typeof vi.fn>
    showMessageBox: ReturnType<typeof vi.fn>
    showErrorBox: ReturnType<typeof vi.fn>
  }
  ipcMain: { handle: ReturnType<typeof vi.fn> }
  Menu: { buildFromTemplate: ReturnType<typeof vi.fn>; setApplicationMenu: ReturnType<typeof vi.fn> }
  protocol: { registerSchemesAsPrivileged: ReturnType<typeof vi.fn> }
  session: { defaultSession: RecordedSession }
  BrowserWindow: unknown
  /** Everything of note in the order in which it happened. */
  order: string[]
  windows: RecordedWindow[]
}

export interface RecordedSession extends EventEmitter {
  setPermissionRequestHandler: ReturnType<typeof vi.fn>
  setPermissionCheckHandler: ReturnType<typeof vi.fn>
  setDevicePermissionHandler: ReturnType<typeof vi.fn>
  setSpellCheckerEnabled: ReturnType<typeof vi.fn>
  webRequest: { onBeforeRequest: ReturnType<typeof vi.fn> }
  protocol: { handle: ReturnType<typeof vi.fn> }
}

export interface RecordedWindow extends EventEmitter {
  webContents: object
  destroy: ReturnType<typeof vi.fn>
  options: { webPreferences: Record<string, unknown> }
  loaded: string[]
}

/**
 * Makes a stand-in for the module `electron` that records what is asked of it.
 *
 * @returns the stand-in, to be handed to `vi.mock`
 */
export function makeElectronRecorder(): ElectronRecorder {
  const order: string[] = []
  const windows: RecordedWindow[] = []
  const note = (what: string) => vi.fn(() => void order.push(what))

  class BrowserWindow extends EventEmitter {
    loaded: string[] = []
    show = vi.fn()
    destroy = vi.fn()
    webContents = {}
    constructor(public options: RecordedWindow['options']) {
      super()
      order.push('window')
      windows.push(this)
    }
    loadURL(address: string): Promise<void> {
      this.loaded.push(address)
      return Promise.resolve()
    }
  }

  return {
    order,
    windows,
    BrowserWindow,
    app: Object.assign(new EventEmitter(), {
      enableSandbox: note('sandbox'),
      quit: vi.fn(),
      getPath: vi.fn(() => '/nowhere'),
      whenReady: () => {
        order.push('ready')
        return Promise.resolve()
      },
    }),
    dialog: {
      showOpenDialog: vi.fn(async () => ({ canceled: true, filePaths: [] })),
      showSaveDialog: vi.fn(async () => ({ canceled: true, filePath: '' })),
      showMessageBox: vi.fn(async () => ({ response: 2 })),
      showErrorBox: vi.fn(),
    },
    ipcMain: { handle: note('channel') },
    Menu: { buildFromTemplate: vi.fn((template: unknown) => template), setApplicationMenu: vi.fn() },
    protocol: { registerSchemesAsPrivileged: note('scheme') },
    session: {
      defaultSession: Object.assign(new EventEmitter(), {
        setPermissionRequestHandler: note('permissions'),
        setPermissionCheckHandler: vi.fn(),
        setDevicePermissionHandler: vi.fn(),
        setSpellCheckerEnabled: vi.fn(),
        webRequest: { onBeforeRequest: vi.fn() },
        protocol: { handle: note('protocol') },
      }),
    },
  }
}
