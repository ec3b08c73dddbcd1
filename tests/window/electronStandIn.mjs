/**
 * Stands in for the module `electron` in the main process of the packed program: it answers what the
 * program asks of its protocol and its channel over loopback, so that the packed page and preload script
 * can be loaded in Chromium. It opens no window and confines nothing: it shows wiring, not safety.
 */
import { createServer } from 'node:http'
import { serialize } from 'node:v8'

let servePage = null
const channels = new Map()
const nothing = () => {}

export const app = {
  enableSandbox: nothing,
  on: nothing,
  quit: nothing,
  whenReady: async () => {},
  // No list of recent files is kept: there is no such folder.
  getPath: () => '/nowhere',
}
export const dialog = {}
export const protocol = { registerSchemesAsPrivileged: nothing }
export const Menu = { buildFromTemplate: nothing, setApplicationMenu: nothing }
export const ipcMain = { handle: (name, answer) => channels.set(name, answer) }
export const session = {
  defaultSession: {
    setPermissionRequestHandler: nothing,
    setPermissionCheckHandler: nothing,
    setDevicePermissionHandler: nothing,
    setSpellCheckerEnabled: nothing,
    on: nothing,
    webRequest: { onBeforeRequest: nothing },
    protocol: { handle: (_scheme, serve) => (servePage = serve) },
  },
}

export class BrowserWindow {
  constructor({ webPreferences }) {
    this.preload = webPreferences.preload
    this.webContents = {}
  }
  once() {}
  on() {}
  async loadURL(address) {
    const server = createServer(async (request, response) => {
      if (request.method === 'POST') {
        const { channel, message } = JSON.parse(Buffer.concat(await request.toArray()).toString())
        const frame = { url: address, parent: null }
        const event = { senderFrame: frame, sender: this.webContents }
        // Between Electron's processes values are cloned as these bytes are, arrays and all.
        response.end(serialize(await channels.get(channel)(event, message)))
        return
      }
      const answer = await servePage({ method: request.method, url: new URL(request.url, address).href })
      response.writeHead(answer.status, Object.fromEntries(answer.headers))
      response.end(Buffer.from(await answer.arrayBuffer()))
    })
    server.listen(0, '127.0.0.1', () =>
      console.log(JSON.stringify({ port: server.address().port, preload: this.preload })),
    )
  }
}
