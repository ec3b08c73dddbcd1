import { describe, expect, it } from 'vitest'
import { formatPlace } from '../../../../src-main/engine/rig/place'
import { joinPath } from '../../../../src-renderer/stores/document/joinPath'
import { parsePath } from '../../../../src-renderer/stores/document/parsePath'
import { readAt } from '../../../../src-renderer/stores/document/readAt'
import { writeAt } from '../../../../src-renderer/stores/document/writeAt'

describe('paths', () => {
  it.each([
    [['bars', 0, 'sections', 12, 'length']],
    [['materials', 'a "b" [0].c', 'density']],
    [['materials', '304 annealed', 'allowable', 'tension']],
    [['leftEnd']],
    [[]],
  ])('reads what faults write: %j', (place) => {
    const text = formatPlace(place)
    expect(parsePath(text)).toEqual(place)
    expect(place.reduce((path: string, part) => joinPath(path, part), '')).toBe(text)
  })

  it('refuses what is no path', () => {
    expect(() => parsePath('bars[x]')).toThrow('not a path')
  })

  it('reads own values only', () => {
    expect(readAt({ a: [{ b: 1 }] }, 'a[0].b')).toBe(1)
    expect(readAt({ a: [{ b: 1 }] }, 'a[1].b')).toBeUndefined()
    expect(readAt({}, 'constructor.name')).toBeUndefined()
  })

  it('writes a new document and shares what did not change', () => {
    const before = { bars: [{ name: 'a' }, { name: 'b' }], run: { cell: '1 mm' } }
    const after = writeAt(before, 'bars[1].name', 'c')
    expect(before.bars[1].name).toBe('b')
    expect(after).toEqual({ bars: [{ name: 'a' }, { name: 'c' }], run: { cell: '1 mm' } })
    expect(after.run).toBe(before.run)
    expect(after.bars[0]).toBe(before.bars[0])
  })

  it('makes what is missing on the way, and takes out what it leaves empty', () => {
    const made = writeAt({} as object, 'allowable.tension', '1 MPa')
    expect(made).toEqual({ allowable: { tension: '1 MPa' } })
    expect(writeAt(made, 'allowable.tension', undefined)).toEqual({})
    expect(writeAt({ list: [1, 2, 3] }, 'list[1]', undefined)).toEqual({ list: [1, 3] })
  })

  it('leaves the prototype of objects alone', () => {
    writeAt({} as object, '__proto__.polluted', 'yes')
    expect(({} as Record<string, unknown>).polluted).toBeUndefined()
  })
})
