import { describe, expect, it } from 'vitest'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { listFieldColumns, listSampleSteps } from '../../../../src-main/engine/records/fieldColumns'
import { marchRig } from '../march'
import { makeBar, makeRig, makeSection } from '../testRig'

const DT = 1e-6
const CELL = 5000 * DT
const rig = (cells: number) =>
  makeRig(
    [
      makeBar('bar', [makeSection(cells * CELL, 1e-3), makeSection(3 * CELL, 3e-3)], { preload: 6e3 }),
      makeBar('next', [makeSection(cells * CELL, 2e-3)]),
    ],
    { duration: 4 * DT, timeStep: DT },
  )

describe('the columns of the field', () => {
  it('are every position of a small line and of one asked for in full', () => {
    const small = listFieldColumns(makeLine(rig(10)), false)
    expect(small.map(({ span, position }) => [span, position])).toEqual(
      [11, 4, 11].flatMap((count, span) => Array.from({ length: count }, (_, p) => [span, p])),
    )
    expect(listFieldColumns(makeLine(rig(900)), true)).toHaveLength(901 + 4 + 901)
  })

  it('are about 240 of a long one, evenly spread, with both faces of every section', () => {
    const line = makeLine(rig(900))
    const columns = listFieldColumns(line, false)
    expect(columns.length).toBeGreaterThan(235)
    expect(columns.length).toBeLessThan(250)
    line.spans.forEach(({ cells }, span) => {
      const positions = columns.filter((column) => column.span === span).map(({ position }) => position)
      expect([positions[0], positions[positions.length - 1]]).toEqual([0, cells])
      const strides = positions.slice(1).map((p, i) => p - positions[i])
      expect(Math.max(...strides) - Math.min(...strides)).toBeLessThanOrEqual(1)
    })
    expect(columns.every(({ x }, i) => i === 0 || x >= columns[i - 1].x)).toBe(true)
  })

  it('have the area of their own side: the stress jumps at a step, the force does not', () => {
    const { field } = marchRig(rig(10)).record
    const [left, right] = [field.stress[0][10], field.stress[0][11]]
    expect([field.x[10], field.x[11]]).toEqual([field.x[10], field.x[10]])
    expect(left).toBeCloseTo(6e6, 6)
    expect(right).toBeCloseTo(2e6, 6)
  })
})

describe('the sampled steps', () => {
  it('are all of a short run and of one in full, and always the first and the last', () => {
    expect([...listSampleSteps(3, false)]).toEqual([0, 1, 2, 3])
    expect(listSampleSteps(5000, true)).toHaveLength(5001)
    for (const steps of [1, 127, 128, 129, 999, 123_457]) {
      const chosen = listSampleSteps(steps, false)
      expect([chosen[0], chosen[chosen.length - 1]]).toEqual([0, steps])
      expect(chosen.every((k, i) => i === 0 || k > chosen[i - 1])).toBe(true)
      expect(chosen.length).toBeLessThanOrEqual(242)
    }
  })
})
