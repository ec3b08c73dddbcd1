import { describe, expect, it } from 'vitest'
import { BRIDGE_TEXT_LIMIT } from '../../../src-main/contract/bridge'
import { checkCall } from '../../../src-main/service/checkCall'

describe('checkCall', () => {
  it('takes the methods of the bridge with their arguments, and keeps nothing else', () => {
    expect(checkCall({ method: 'about', args: [], more: 1 })).toEqual({ call: { method: 'about', args: [] } })
    expect(checkCall({ method: 'solve', args: ['{}'] })).toEqual({ call: { method: 'solve', args: ['{}'] } })
  })

  it.each([
    ['nothing', undefined, /object/],
    ['null', null, /object/],
    ['text', 'solve', /object/],
    ['a list', ['solve'], /no method/],
    ['an unknown method', { method: 'write', args: [] }, /no method/],
    ['a method of every object', { method: 'toString', args: [] }, /no method/],
    ['the prototype', { method: '__proto__', args: [] }, /no method/],
    ['a method that is no text', { method: { toString: () => 'about' }, args: [] }, /no method/],
    ['no arguments', { method: 'about' }, /0 argument/],
    ['too few arguments', { method: 'solve', args: [] }, /1 argument/],
    ['too many arguments', { method: 'solve', args: ['', ''] }, /1 argument/],
    ['arguments that look like a list', { method: 'solve', args: { length: 1, 0: '' } }, /1 argument/],
    ['a number for text', { method: 'solve', args: [1] }, /text only/],
    ['an object for text', { method: 'solve', args: [{}] }, /text only/],
  ])('refuses %s', (_what, message, reason) => {
    expect(checkCall(message)).toEqual({ refused: expect.stringMatching(reason) as string })
  })

  it('refuses text over the limit and takes text at it', () => {
    const most = 'x'.repeat(BRIDGE_TEXT_LIMIT)
    expect(checkCall({ method: 'solve', args: [most] })).toHaveProperty('call')
    expect(checkCall({ method: 'solve', args: [most + 'x'] })).toHaveProperty('refused')
  })
})
