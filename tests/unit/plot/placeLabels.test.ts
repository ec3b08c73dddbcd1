import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { placeLabels } from '../../../src-renderer/plot/placeLabels'

const room = { left: 0, top: 0, right: 100, bottom: 100 }

describe('placeLabels', () => {
  it('gives the later label its second place, or none', () => {
    const size = { width: 20, height: 10 }
    const placed = placeLabels(
      [
        { text: 'a', places: [{ x: 50, y: 50 }], ...size },
        {
          text: 'b',
          places: [
            { x: 55, y: 52 },
            { x: 55, y: 70 },
          ],
          ...size,
        },
        { text: 'c', places: [{ x: 50, y: 50 }], ...size },
        { text: 'd', places: [{ x: 95, y: 20 }], ...size },
      ],
      room,
    )
    expect(placed).toEqual([
      { text: 'a', x: 50, y: 50 },
      { text: 'b', x: 55, y: 70 },
    ])
  })

  it('never lets two labels cover each other, a taken area or the edge', () => {
    const place = fc.record({ x: fc.integer({ min: -10, max: 110 }), y: fc.integer({ min: -10, max: 110 }) })
    const label = fc.record({
      text: fc.constant('x'),
      places: fc.array(place, { minLength: 1, maxLength: 3 }),
      width: fc.constant(18),
      height: fc.constant(10),
    })
    const taken = { left: 40, top: 40, right: 60, bottom: 60 }
    fc.assert(
      fc.property(fc.array(label, { maxLength: 30 }), (labels) => {
        const placed = placeLabels(labels, room, [taken])
        placed.forEach((one, i) => {
          expect(one.x - 9 >= 0 && one.x + 9 <= 100 && one.y - 5 >= 0 && one.y + 5 <= 100).toBe(true)
          expect(Math.abs(one.x - 50) >= 19 || Math.abs(one.y - 50) >= 15).toBe(true)
          for (const other of placed.slice(i + 1)) {
            expect(Math.abs(one.x - other.x) >= 18 || Math.abs(one.y - other.y) >= 10).toBe(true)
          }
        })
      }),
    )
  })
})
