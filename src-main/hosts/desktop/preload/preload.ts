import { contextBridge, ipcRenderer } from 'electron'
import { BRIDGE_CHANNEL, BRIDGE_GLOBAL } from '../../../contract/bridgeChannel'

contextBridge.exposeInMainWorld(BRIDGE_GLOBAL, {
  call: (method: unknown, args: unknown): Promise<unknown> =>
    ipcRenderer.invoke(BRIDGE_CHANNEL, { method, args }),
})
