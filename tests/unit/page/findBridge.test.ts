import { describe, expect, it, vi } from 'vitest'
import type { Bridge } from '../../../src-main/contract/bridge'
import type { BridgeReply } from '../../../src-main/contract/bridgeCall'
import { packReply } from '../../../src-main/contract/packReply'
import { CALL_CHECKS } from '../../../src-main/service/callChecks'
import { findBridge } from '../../../src-renderer/bridge/findBridge'

const pageAt = (hash: string, more: object = {}): Window =>
  ({ location: { hash }, ...more }) as unknown as Window
const packed = (reply: BridgeReply): Response =>
  new Response(packReply(reply), { headers: { 'Content-Type': 'application/octet-stream' } })

describe('findBridge', () => {
  it('finds none where the page was opened by neither host', () => {
    expect(findBridge(pageAt(''))).toBeNull()
  })

  it("takes the desktop's way where its preload script left one, with its files", async () => {
    const call = vi.fn(async () => ({ value: { name: 'Barwright' } }))
    const bridge = findBridge(pageAt('', { barwright: { call } }))
    expect(await bridge?.about()).toEqual({ name: 'Barwright' })
    expect(call).toHaveBeenCalledExactlyOnceWith('about', [])
    await bridge?.files?.()?.save('file:1', '{}')
    expect(call).toHaveBeenLastCalledWith('files.save', ['file:1', '{}'])
  })

  it('sends each method under the name that the hosts check', async () => {
    const sent: string[] = []
    const call = async (method: string) => {
      sent.push(method)
      return { value: null }
    }
    const bridge = findBridge(pageAt('', { barwright: { call } }))!
    const { files, ...methods } = bridge as Required<Bridge>
    for (const ask of [...Object.values(methods), ...Object.values(files()!)]) {
      await (ask as () => Promise<unknown>)()
    }
    expect(sent.sort()).toEqual(Object.keys(CALL_CHECKS).sort())
  })

  it("takes the browser's way with the token of the address, in a header alone, without files", async () => {
    const fetch = vi.fn(async (_path: string, _init: RequestInit) => packed({ value: Float32Array.of(1, 2) }))
    const bridge = findBridge(pageAt('#secret', { fetch }))
    const request = { slot: 's', t: 0, columns: 2 }
    expect(await bridge?.readProfile(request)).toEqual(Float32Array.of(1, 2))
    const [path, init] = fetch.mock.calls[0]
    expect(path).toBe('/bridge')
    expect(init.headers).toMatchObject({ Authorization: 'Bearer secret' })
    expect(init.body).toBe('{"method":"readProfile","args":[{"slot":"s","t":0,"columns":2}]}')
    expect(bridge?.files?.()).toBeNull()
  })

  it.each([
    ['a reply that is an error', packed({ error: 'told so' }), 'told so'],
    ['an answer that is no reply', new Response('Wrong token.', { status: 401 }), 'Wrong token.'],
  ])('rejects with the words of %s', async (_what, response, words) => {
    const bridge = findBridge(pageAt('#x', { fetch: async () => response }))
    await expect(bridge?.about()).rejects.toThrow(words)
  })
})
