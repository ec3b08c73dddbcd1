import type { About, Bridge, BridgeMethod, BridgeReply, SolveAnswer } from '../../src-main/contract/bridge'

/** How one host carries a message: rejects where the host cannot be reached. */
export type CarryCall = (method: BridgeMethod, args: string[]) => Promise<BridgeReply>

/**
 * Makes the page's bridge out of one host's way of carrying messages.
 *
 * @param carry - the host's way
 * @returns the bridge; each method rejects with the host's words where it gives no value
 */
export function makeBridge(carry: CarryCall): Bridge {
  async function ask<T>(method: BridgeMethod, ...args: string[]): Promise<T> {
    const reply = await carry(method, args)
    if ('error' in reply) throw new Error(reply.error)
    return reply.value as T
  }
  return {
    about: () => ask<About>('about'),
    solve: (text) => ask<SolveAnswer>('solve', text),
  }
}
