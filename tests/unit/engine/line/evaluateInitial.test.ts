import { describe, expect, it } from 'vitest'
import type { Bar } from '../../../../src-main/contract/rig'
import { evaluateInitial } from '../../../../src-main/engine/line/evaluateInitial'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { makeBar, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT

/** Two bars, of which the second starts as given; its second section is twice as wide. */
const cut = (start: Partial<Bar>) =>
  makeLine(
    makeRig(
      [
        makeBar('first', [makeSection(10 * CELL, 1e-3)]),
        makeBar('second', [makeSection(10 * CELL, 1e-3), makeSection(10 * CELL, 2e-3)], start),
      ],
      { duration: DT, timeStep: DT },
    ),
  )

describe('the state at the start', () => {
  it('is at rest without force unless said otherwise', () => {
    expect(evaluateInitial(cut({}), 0, 3)).toEqual({ force: 0, velocity: 0 })
  })

  it('has the preload as a force in every section', () => {
    const line = cut({ preload: -7e3 })
    expect(evaluateInitial(line, 1, 0)).toEqual({ force: -7e3, velocity: 0 })
    expect(evaluateInitial(line, 2, 10)).toEqual({ force: -7e3, velocity: 0 })
  })

  it("knows a velocity by the place in its own bar, from that bar's left face", () => {
    const line = cut({ velocity: (x, s) => 100 * x + s, uniformVelocity: null })
    expect(evaluateInitial(line, 1, 0).velocity).toBeCloseTo(0, 12)
    expect(evaluateInitial(line, 1, 4).velocity).toBeCloseTo(100 * 4 * CELL + 0.2, 12)
    expect(evaluateInitial(line, 2, 10).velocity).toBeCloseTo(100 * 20 * CELL + 1, 12)
  })

  it('has the strain of a displacement, E A du/dx, exact up to the fourth power, at the ends too', () => {
    const length = 20 * CELL
    const line = cut({ displacement: (x) => 1e-4 * (x + 3 * x ** 2 - 20 * x ** 3 + 100 * x ** 4) })
    const strain = (x: number) => 1e-4 * (1 + 6 * x - 60 * x ** 2 + 400 * x ** 3)
    for (const [span, p, x, area] of [
      [1, 0, 0, 1e-3],
      [1, 7, 7 * CELL, 1e-3],
      [1, 10, 10 * CELL, 1e-3],
      [2, 0, 10 * CELL, 2e-3],
      [2, 10, length, 2e-3],
    ]) {
      const { force } = evaluateInitial(line, span, p)
      // Differences over a thousandth of the bar: rounding of 1e-16 over 1e-3 and a little more.
      expect(Math.abs(force / (200e9 * area * strain(x)) - 1)).toBeLessThan(1e-11)
    }
  })

  it('has the strain of a wave to fourth order', () => {
    const line = cut({ displacement: (_x, s) => 1e-4 * Math.sin(9 * s) })
    const { force } = evaluateInitial(line, 1, 5)
    const right = (200e9 * 1e-3 * 1e-4 * 9 * Math.cos(9 / 4)) / (20 * CELL)
    expect(Math.abs(force / right - 1)).toBeLessThan(1e-8)
  })
})
