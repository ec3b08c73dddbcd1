import { describe, expect, it } from 'vitest'
import { makeSignedTable } from '../../../src-renderer/plot/colour/colourMap'
import { findExtremes, paintField, readLargest } from '../../../src-renderer/plot/paintField'

const table = makeSignedTable('light')
const none = Number.NaN

/** Two columns and two rows: row 0 is the earliest. */
const grid = {
  columns: 2,
  rows: 2,
  values: Float32Array.of(-100, 20, 0, 0, /* later */ 10, 100, none, none),
}

describe('paintField', () => {
  it('puts the earliest row at the bottom and shows the larger extreme', () => {
    const pixels = new Uint32Array(4)
    paintField(grid, table, 100, pixels, null)
    expect(Array.from(pixels)).toEqual([table[255], table[0], table[1], table[128]])
  })

  it('hatches only what is over the limits', () => {
    const plain = new Uint32Array(4)
    paintField(grid, table, 100, plain, null)
    const pixels = new Uint32Array(4)
    const limits = {
      high: Float32Array.of(99, Infinity),
      low: Float32Array.of(-101, -Infinity),
      ink: 0xff27201a,
      gap: 1,
      width: 3,
    }
    paintField(grid, table, 100, pixels, limits)
    // Lines wider than their distance cover all of it.
    expect(pixels[0]).toBe(0xff27201a)
    expect(Array.from(pixels.subarray(1))).toEqual(Array.from(plain.subarray(1)))
  })

  it('keeps a peak that is one sample wide', () => {
    expect(readLargest(grid, 0, 0)).toBe(-100)
    expect(readLargest(grid, 0, 1)).toBe(100)
    expect(findExtremes(grid)).toEqual({ low: -100, high: 100 })
    expect(findExtremes({ columns: 1, rows: 1, values: Float32Array.of(none, none) })).toEqual({
      low: 0,
      high: 0,
    })
  })
})
