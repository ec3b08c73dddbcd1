import { describe, expect, it } from 'vitest'
import { makeFaultList } from '../../../../src-main/engine/rig/faultList'
import { LIMITS } from '../../../../src-main/engine/rig/limits'
import { readJson } from '../../../../src-main/engine/rig/readJson'

function read(text: string) {
  const faults = makeFaultList()
  const value = readJson(text, faults)
  return { value, faults: faults.inOrder(value) }
}

describe('readJson', () => {
  it.each([
    '{"a":[1,-2.5e-3,0,"x\\n\\u00e9\\"",true,false,null,{}],"b":{"c":[]}}',
    ' [ ] ',
    '"\\ud83d\\ude00"',
    '-0.0',
    '12345678901234567890',
    '{"":0," ":1}',
  ])('reads %s as JSON.parse does', (text) => {
    expect(read(text)).toEqual({ value: JSON.parse(text), faults: [] })
  })

  it.each([
    '',
    '{',
    '[1,]',
    '{"a":1,}',
    '{a:1}',
    "{'a':1}",
    '01',
    '1.',
    '.5',
    '+1',
    '1e',
    'tru',
    'nul',
    '"\n"',
    '"\\x"',
    '"a',
    '[1 2]',
    '{"a" 1}',
    '1 2',
    'undefined',
    '\u00a0{}',
  ])('refuses %j as JSON.parse does', (text) => {
    expect(() => JSON.parse(text) as unknown).toThrow()
    expect(read(text).faults.map((fault) => fault.code)).toEqual(['not-json'])
  })

  it('skips one byte-order mark', () => {
    expect(read('\uFEFF{}')).toEqual({ value: {}, faults: [] })
    expect(read('\uFEFF\uFEFF{}').faults[0].code).toBe('not-json')
  })

  it('says where it stopped', () => {
    expect(read('{\n  "a": 1\n  "b": 2\n}').faults[0].message).toBe(
      'line 3, column 3: expected , or } after the value of "a", found "\\""',
    )
  })

  it('keeps the first of two equal keys and goes on', () => {
    const { value, faults } = read('{"a":1,\n"a":2,"b":{"c":1,"c":2}}')
    expect(value).toEqual({ a: 1, b: { c: 1 } })
    expect(faults.map(({ path }) => path)).toEqual(['a', 'b.c'])
    expect(faults[0].message).toContain('line 2')
  })

  it('takes exactly the depth it promises', () => {
    const deep = (levels: number) => '['.repeat(levels) + ']'.repeat(levels)
    expect(read(deep(LIMITS.jsonDepth)).faults).toEqual([])
    expect(read(deep(LIMITS.jsonDepth + 2)).faults.map((fault) => fault.code)).toEqual(['too-deep'])
  })

  it('takes exactly the count of values it promises', () => {
    const many = (count: number) => `[${'1,'.repeat(count - 2)}1]`
    expect(read(many(LIMITS.jsonValues)).faults).toEqual([])
    expect(read(many(LIMITS.jsonValues + 1)).faults.map((fault) => fault.code)).toEqual(['too-large'])
  })

  it('never lets a key reach a prototype', () => {
    const { value, faults } = read('{"__proto__":{"x":1},"constructor":{"prototype":{"x":1}},"ok":1}')
    expect(Object.getPrototypeOf(value)).toBe(Object.prototype)
    expect(Object.keys(value as object)).toEqual(['ok'])
    expect(faults.map(({ path }) => path).sort()).toEqual([
      '__proto__',
      'constructor',
      'constructor.prototype',
    ])
  })
})
