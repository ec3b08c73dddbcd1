import type { Bridge, DocumentFiles } from '../../src-main/contract/bridge'
import type { BridgeMethod, BridgeReply } from '../../src-main/contract/bridgeCall'

/** How one host carries a message: rejects where the host cannot be reached. */
export type CarryCall = (method: BridgeMethod, args: unknown[]) => Promise<BridgeReply>

/**
 * Makes the page's bridge out of one host's way of carrying messages.
 *
 * @param carry - the host's way
 * @param hasFiles - true where the host opens and saves rig files itself
 * @returns the bridge; each method rejects with the host's words where it gives no value
 */
export function makeBridge(carry: CarryCall, hasFiles: boolean): Bridge {
  const pass =
    <A extends unknown[], T>(method: BridgeMethod) =>
    async (...args: A): Promise<T> => {
      const reply = await carry(method, args)
      if ('error' in reply) throw new Error(reply.error)
      return reply.value as T
    }
  const files: DocumentFiles | null = hasFiles
    ? {
        open: pass('files.open'),
        openRecent: pass('files.openRecent'),
        recent: pass('files.recent'),
        save: pass('files.save'),
        saveAs: pass('files.saveAs'),
        noteSheet: pass('files.noteSheet'),
      }
    : null
  return {
    about: pass('about'),
    listSamples: pass('listSamples'),
    readSample: pass('readSample'),
    solve: pass('solve'),
    progress: pass('progress'),
    stop: pass('stop'),
    readField: pass('readField'),
    readProfile: pass('readProfile'),
    report: pass('report'),
    files: () => files,
  }
}
