import { describe, expect, it } from 'vitest'
import { evaluateHatchCover, listHatchLines } from '../../../src-renderer/plot/hatching'

const area = { left: 10, top: 20, right: 50, bottom: 40 }

describe('hatching', () => {
  it.each(['rising', 'falling'] as const)('runs at 45 degrees, %s, cut to its area', (lean) => {
    const lines = listHatchLines(area, 5, lean)
    // Across a 40 x 20 area the diagonals lie 60 px apart in x + y: every 5 sqrt(2).
    expect(lines.length).toBeGreaterThanOrEqual(Math.floor(60 / (5 * Math.SQRT2)))
    for (const [x1, y1, x2, y2] of lines) {
      expect(y2 - y1).toBeCloseTo(lean === 'rising' ? x1 - x2 : x2 - x1, 9)
      for (const x of [x1, x2]) expect(x >= 10 - 1e-9 && x <= 50 + 1e-9).toBe(true)
      for (const y of [y1, y2]) expect(y >= 20 - 1e-9 && y <= 40 + 1e-9).toBe(true)
    }
  })

  it('lies on one grid, so that areas side by side join', () => {
    const whole = listHatchLines({ left: 0, top: 0, right: 40, bottom: 10 }, 4, 'rising')
    const right = listHatchLines({ left: 20, top: 0, right: 40, bottom: 10 }, 4, 'rising')
    const sums = whole.map(([x, y]) => x + y)
    for (const [x, y] of right) expect(sums.some((sum) => Math.abs(sum - x - y) < 1e-9)).toBe(true)
  })

  it('covers pixels by the share of line to gap', () => {
    let cover = 0
    for (let y = 0; y < 200; y++)
      for (let x = 0; x < 200; x++) cover += evaluateHatchCover(x, y, 5, 1, 'rising')
    // One pixel in five; the pixel's own slope rounds it by less than 5 %, seen by eye only.
    expect(cover / 40_000).toBeGreaterThan(0.19)
    expect(cover / 40_000).toBeLessThan(0.21)
  })

  it('draws nothing in an empty area', () => {
    expect(listHatchLines({ ...area, right: 10 }, 5, 'rising')).toEqual([])
  })
})
