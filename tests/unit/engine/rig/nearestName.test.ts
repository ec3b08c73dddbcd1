import { describe, expect, it } from 'vitest'
import { nearestName } from '../../../../src-main/engine/rig/nearestName'

const KNOWN = ['diameter', 'length', 'bore', 'area', 'MPa', 'mm', 'fillet']

describe('nearestName', () => {
  it.each([
    ['diametre', 'diameter'],
    ['Diameter', 'diameter'],
    ['lenght', 'length'],
    ['lengths', 'length'],
    ['mpa', 'MPa'],
    ['filet', 'fillet'],
    ['boer', 'bore'],
    ['velocity', null],
    ['x', null],
    ['', null],
  ])('finds for %j %j', (name, nearest) => {
    expect(nearestName(name, KNOWN)).toBe(nearest)
  })
})
