import { describe, expect, it, vi } from 'vitest'
import { findBridge } from '../../../src-renderer/bridge/findBridge'

const pageAt = (hash: string, more: object = {}): Window =>
  ({ location: { hash }, ...more }) as unknown as Window
const json = (value: unknown): Response => Response.json(value)

describe('findBridge', () => {
  it('finds none where the page was opened by neither host', () => {
    expect(findBridge(pageAt(''))).toBeNull()
  })

  it("takes the desktop's way where its preload script left one", async () => {
    const call = vi.fn(async () => ({ value: { name: 'Barwright' } }))
    const bridge = findBridge(pageAt('', { barwright: { call } }))
    expect(await bridge?.about()).toEqual({ name: 'Barwright' })
    expect(call).toHaveBeenCalledExactlyOnceWith('about', [])
  })

  it("takes the browser's way with the token of the address, in a header alone", async () => {
    const fetch = vi.fn(async (_path: string, _init: RequestInit) => json({ value: 1 }))
    const bridge = findBridge(pageAt('#secret', { fetch }))
    await bridge?.solve('{}')
    const [path, init] = fetch.mock.calls[0]
    expect(path).toBe('/bridge')
    expect(init.headers).toMatchObject({ Authorization: 'Bearer secret' })
    expect(init.body).toBe('{"method":"solve","args":["{}"]}')
  })

  it.each([
    ['a reply that is an error', json({ error: 'told so' }), 'told so'],
    ['an answer that is no reply', new Response('Wrong token.', { status: 401 }), 'Wrong token.'],
  ])('rejects with the words of %s', async (_what, response, words) => {
    const bridge = findBridge(pageAt('#x', { fetch: async () => response }))
    await expect(bridge?.about()).rejects.toThrow(words)
  })
})
