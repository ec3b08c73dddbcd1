import { describe, expect, it } from 'vitest'
import { findUnit } from '../../../../../src-main/engine/rig/formula/findUnit'

describe('findUnit', () => {
  it('leaves the odd words of the table free for variables', () => {
    for (const name of [
      'drop',
      'rod',
      'cup',
      'link',
      'stick',
      'L',
      'A',
      'h',
      'min',
      'B',
      'b',
      'day',
      'hp',
      't',
      'x',
    ]) {
      expect(findUnit(name)).toBeNull()
    }
  })

  it('finds no unit in names that every object has', () => {
    for (const name of ['constructor', 'toString', '__proto__', 'hasOwnProperty', 'valueOf']) {
      expect(findUnit(name)).toBeNull()
    }
  })

  it('says why a unit is refused', () => {
    for (const name of ['ton', 'degC', 'K', 'degF']) expect(typeof findUnit(name)).toBe('string')
  })
})
