import type { Bridge } from '../../src-main/contract/bridge'
import type { BridgeReply } from '../../src-main/contract/bridgeCall'
import { BRIDGE_GLOBAL } from '../../src-main/contract/bridgeChannel'
import { unpackReply } from '../../src-main/contract/packReply'
import { makeBridge, type CarryCall } from './makeBridge'

/**
 * Finds the host that opened the page: the desktop window by what its preload script left, the browser
 * host by the token in the address.
 *
 * @param page - the page's window
 * @returns the bridge; null where the page was opened without either
 */
export function findBridge(page: Window): Bridge | null {
  const desktop = (page as unknown as Record<string, { call: CarryCall } | undefined>)[BRIDGE_GLOBAL]
  if (desktop) return makeBridge(desktop.call, true)
  const token = page.location.hash.slice(1)
  return token === '' ? null : makeBridge((method, args) => post(page, token, { method, args }), false)
}

async function post(page: Window, token: string, message: unknown): Promise<BridgeReply> {
  const response = await page.fetch('/bridge', {
    method: 'POST',
    headers: { Authorization: `Bearer ${token}`, 'Content-Type': 'application/json' },
    body: JSON.stringify(message),
  })
  const isReply = response.headers.get('Content-Type') === 'application/octet-stream'
  return isReply ? unpackReply(await response.arrayBuffer()) : { error: await response.text() }
}
