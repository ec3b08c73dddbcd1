import { describe, expect, it } from 'vitest'
import { BRIDGE_TEXT_LIMIT } from '../../../src-main/contract/bridgeCall'
import { CALL_CHECKS } from '../../../src-main/service/callChecks'
import { checkCall } from '../../../src-main/service/checkCall'

const solve = { slot: 's', text: '{}', name: 'a.json', coarse: false }
const field = { slot: 's', quantity: 'stress', fromX: 0, toX: 1, fromT: 0, toT: 1e-3, columns: 10, rows: 5 }
const profile = { slot: 's', t: 0, columns: 10 }
const sheet = { name: 'a.json', text: '{}', place: null, unsaved: true }

/** Calls that are taken: all methods, with all that they may be given. */
const GOOD: Record<string, unknown[][]> = {
  about: [[]],
  listSamples: [[]],
  readSample: [['drop-hammer-shaft']],
  solve: [[solve], [{ ...solve, method: 'both', place: 'sample:x' }]],
  progress: [['s']],
  stop: [['s']],
  readField: [[field], [{ ...field, fromX: -1e9, toX: 1e9, columns: 2048, rows: 2048 }]],
  readProfile: [[profile], [{ ...profile, part: { fromX: 0, toX: 1 } }]],
  report: [['s']],
  'files.open': [[]],
  'files.openRecent': [['file:1']],
  'files.recent': [[]],
  'files.save': [['file:1', '']],
  'files.saveAs': [['a.json', '{}']],
  'files.noteSheet': [[sheet], [{ ...sheet, place: 'file:1' }]],
}

describe('checkCall', () => {
  it('takes every method of the bridge with its arguments', () => {
    expect(Object.keys(GOOD).sort()).toEqual(Object.keys(CALL_CHECKS).sort())
    for (const [method, calls] of Object.entries(GOOD)) {
      for (const args of calls) expect(checkCall({ method, args })).toEqual({ call: { method, args } })
    }
  })

  it('keeps nothing of a message but what was checked', () => {
    const text = JSON.stringify({ method: 'about', args: [], more: 1 })
    expect(checkCall(JSON.parse(text))).toEqual({ call: { method: 'about', args: [] } })
    const given = { ...solve, method: undefined }
    const checked = checkCall({ method: 'solve', args: [given] })
    const kept = 'call' in checked ? (checked.call.args[0] as object) : {}
    expect(kept).not.toBe(given)
    expect(Object.keys(kept)).toEqual(['slot', 'text', 'name', 'coarse'])
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
    ['too many arguments', { method: 'stop', args: ['s', 's'] }, /1 argument/],
    ['arguments that look like a list', { method: 'stop', args: { length: 1, 0: '' } }, /1 argument/],
  ])('refuses %s', (_what, message, reason) => {
    expect(checkCall(message)).toEqual({ refused: expect.stringMatching(reason) as string })
  })

  it.each<[string, unknown, RegExp]>([
    ['readSample', 7, /must be text/],
    ['readSample', '', /0 characters; 1 to 100/],
    ['stop', 'x'.repeat(101), /101 characters/],
    ['report', null, /must be text/],
    ['solve', 'text', /must be an object/],
    ['solve', [solve], /must be an object/],
    ['solve', null, /must be an object/],
    ['solve', { ...solve, text: 7 }, /\.text must be text/],
    ['solve', { ...solve, slot: undefined }, /\.slot must be text/],
    ['solve', { ...solve, coarse: 1 }, /\.coarse must be true or false/],
    ['solve', { ...solve, method: 'magic' }, /\.method must be one of characteristics, elements, both/],
    ['solve', { ...solve, method: ['both'] }, /\.method must be one of/],
    ['solve', { ...solve, place: '' }, /\.place has 0 characters/],
    ['solve', { ...solve, rigPath: '/etc/passwd' }, /an entry that it does not take/],
    ['solve', JSON.parse('{"slot":"s","text":"","name":"","coarse":true,"__proto__":{}}'), /does not take/],
    ['solve', Object.create(solve), /\.slot must be text/],
    ['readField', { ...field, quantity: 'colour' }, /\.quantity must be one of/],
    ['readField', { ...field, fromX: NaN }, /\.fromX is NaN/],
    ['readField', { ...field, toX: Infinity }, /\.toX is Infinity/],
    ['readField', { ...field, toT: '1' }, /\.toT must be a number/],
    ['readField', { ...field, toX: 0 }, /fromX must be less than .*toX/],
    ['readField', { ...field, fromT: 1 }, /fromT must be less than .*toT/],
    ['readField', { ...field, columns: 0 }, /\.columns is 0; 1 to 8192/],
    ['readField', { ...field, rows: 1.5 }, /\.rows must be a whole number/],
    ['readField', { ...field, columns: 8192, rows: 8192 }, /67108864 pixels; at most 4194304/],
    ['readProfile', { ...profile, columns: 1e9 }, /\.columns is 1000000000/],
    ['readProfile', { ...profile, t: undefined }, /\.t must be a number/],
    ['readProfile', { ...profile, part: { fromX: 1, toX: 1 } }, /\.part\.fromX must be less than/],
    ['readProfile', { ...profile, part: { fromX: 0 } }, /\.part\.toX must be a number/],
    ['files.openRecent', { path: '/etc/passwd' }, /must be text/],
    ['files.noteSheet', { ...sheet, place: 7 }, /\.place must be text/],
  ])('refuses %s with %j', (method, argument, reason) => {
    expect(checkCall({ method, args: [argument] })).toEqual({
      refused: expect.stringMatching(reason) as string,
    })
  })

  it('refuses text over the limit and takes text at it', () => {
    const most = 'x'.repeat(BRIDGE_TEXT_LIMIT)
    expect(checkCall({ method: 'solve', args: [{ ...solve, text: most }] })).toHaveProperty('call')
    expect(checkCall({ method: 'solve', args: [{ ...solve, text: most + 'x' }] })).toHaveProperty('refused')
    expect(checkCall({ method: 'files.save', args: ['file:1', most + 'x'] })).toHaveProperty('refused')
  })
})
