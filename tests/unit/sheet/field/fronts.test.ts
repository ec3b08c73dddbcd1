import { describe, expect, it } from 'vitest'
import type { Wavefront } from '../../../../src-main/contract/result'
import { makeFieldScales } from '../../../../src-renderer/sheet/field/draw/fieldScales'
import {
  listFrontLabels,
  listFrontLines,
  writeShare,
} from '../../../../src-renderer/sheet/field/draw/listFrontLabels'

const scales = makeFieldScales({ fromX: 0, toX: 1, fromT: 0, toT: 1e-3 }, 700, 400)
const front = (fromX: number, fromT: number, toX: number, toT: number, force = 1): Wavefront => ({
  fromX,
  fromT,
  toX,
  toT,
  force,
  spread: false,
  direction: toX > fromX ? 'right' : 'left',
})
const measure = (text: string): number => 6 * text.length

describe('fronts', () => {
  it('run upward from the lower left, cut to what is shown', () => {
    const [line] = listFrontLines([front(-0.5, -0.5e-3, 1.5, 1.5e-3)], scales)
    expect(line).toMatchObject({ x1: 0, y1: 400, x2: 700, y2: 0 })
    expect(listFrontLines([front(0, 2e-3, 1, 3e-3)], scales)).toEqual([])
  })

  it('come the strongest first, and not under a twentieth', () => {
    const lines = listFrontLines(
      [front(0, 0, 1, 1e-3, 0.3), front(0, 0, 1, 1e-3, 0.04), front(0, 0, 1, 1e-3, -0.9)],
      scales,
    )
    expect(lines.map(({ force }) => force)).toEqual([-0.9, 0.3])
  })

  it('bear a number where they are strong and long; the first of those that repeat', () => {
    const lines = listFrontLines(
      [
        front(0, 5e-4, 1, 6e-4, 1),
        front(0, 1e-4, 1, 2e-4, 1.0000001),
        front(1, 1e-4, 0, 2e-4, 1),
        front(0, 1e-4, 1, 2e-4, 0.1),
        front(0, 0, 0.01, 1e-5, 1),
      ],
      scales,
    )
    const labels = listFrontLabels(lines, measure, 11, 400)
    expect(labels.map(({ text }) => text)).toEqual(['+1.00', '+1.00'])
    // The middle of the front that starts at 0.1 ms: 0.15 ms up.
    expect(labels.map(({ places }) => places[0].y)).toEqual([340, 340])
  })

  it('are written with a sign and a true minus', () => {
    expect([1, -0.384, 0.995].map(writeShare)).toEqual(['+1.00', '−0.38', '+0.99'])
  })
})
