import { describe, expect, it } from 'vitest'
import { makeFaultList } from '../../../../src-main/engine/rig/faultList'
import { faultText } from '../../../../src-main/engine/rig/faultText'
import { LIMITS } from '../../../../src-main/engine/rig/limits'
import { formatPlace } from '../../../../src-main/engine/rig/place'

const SOME = faultText.missing('something')

describe('faultList', () => {
  it('lists faults in the order of the file, missing keys after those that are there', () => {
    const faults = makeFaultList()
    const document = { b: [{ z: 1, y: 2 }, { x: 1 }], a: 1 }
    faults.add(['a'], SOME)
    faults.add(['b', 1, 'x'], SOME)
    faults.add(['b', 0, 'gone'], SOME)
    faults.add(['b', 0, 'y'], SOME)
    faults.add(['b', 0, 'z'], SOME)
    faults.add(['b', 0], SOME)
    faults.add(['gone'], SOME)
    faults.add([], SOME)
    const paths = faults.inOrder(document).map(({ path }) => path)
    expect(paths).toEqual(['', 'b[0]', 'b[0].z', 'b[0].y', 'b[0].gone', 'b[1].x', 'a', 'gone'])
  })

  it('counts what is over the limit and does not put it in words', () => {
    const faults = makeFaultList()
    let written = 0
    for (let i = 0; i < LIMITS.faults + 5; i++) {
      faults.add(['a', i], () => {
        written++
        return SOME
      })
    }
    const all = faults.inOrder({})
    expect(all.length).toBe(LIMITS.faults + 1)
    expect(written).toBe(LIMITS.faults)
    expect(all[LIMITS.faults].message).toContain('5 more faults')
  })
})

describe('formatPlace', () => {
  it.each([
    [[], ''],
    [['bars', 0, 'sections', 1, 'length'], 'bars[0].sections[1].length'],
    [['materials', 'steel-1', 'density'], 'materials.steel-1.density'],
    [['materials', 'a b.c', 'density'], 'materials["a b.c"].density'],
    [['variables', '\u001b[31m'], 'variables["\\u001b[31m"]'],
    [['variables', '\u202e'], 'variables["\\u202e"]'],
  ] as const)('writes %j', (place, text) => {
    expect(formatPlace(place)).toBe(text)
  })
})
