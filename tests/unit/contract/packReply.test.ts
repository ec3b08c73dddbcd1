import { describe, expect, it } from 'vitest'
import type { BridgeReply } from '../../../src-main/contract/bridgeCall'
import { packReply, unpackReply } from '../../../src-main/contract/packReply'

const carry = (reply: BridgeReply): BridgeReply => unpackReply(packReply(reply).buffer)

describe('packReply', () => {
  it.each<[string, BridgeReply]>([
    ['an error', { error: 'told so' }],
    ['nothing', { value: null }],
    ['text of any script', { value: 'Zugspannung σ → 引張' }],
    ['plain data', { value: { a: [1, 'two', { three: null }], b: true } }],
    ['one array', { value: Float32Array.of(1.5, NaN, -Infinity) }],
    ['no numbers at all', { value: { t: new Float64Array(0) } }],
    [
      'arrays at any depth',
      { value: { x: Float64Array.of(0.1, 2e300), list: [{ y: Float32Array.of(3) }, 4] } },
    ],
    ['a key that looks like none', { value: { 'a.b': { 0: Float64Array.of(1) }, length: 2 } }],
  ])('carries %s', (_, reply) => {
    expect(carry(reply)).toEqual(reply)
  })

  it('carries each number to the last bit, at whatever place in the bytes it comes to lie', () => {
    for (const text of ['', 'x', 'xx', 'xxx', 'xxxxxxx']) {
      const values = Float64Array.from({ length: 100 }, (_, i) => Math.sin(i) * 10 ** (i - 50))
      const reply = { value: { text, first: Float32Array.of(1), values } }
      const { value } = carry(reply) as { value: typeof reply.value }
      expect(value.values).toEqual(values)
      expect(value.first).toEqual(Float32Array.of(1))
    }
  })

  it('packs a part of a larger array alone', () => {
    const part = Float64Array.of(1, 2, 3, 4).subarray(1, 3)
    expect(carry({ value: part })).toEqual({ value: Float64Array.of(2, 3) })
  })
})
