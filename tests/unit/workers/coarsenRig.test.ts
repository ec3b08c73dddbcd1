import { describe, expect, it } from 'vitest'
import { readRig } from '../../../src-main/engine/rig/readRig'
import { makeSolve } from '../../../src-main/engine/solveRig'
import { coarsenRig } from '../../../src-main/workers/coarsenRig'
import { PIN_RIG } from './pinRig'

function read(changes: object = {}) {
  const { rig, faults } = readRig(JSON.stringify({ ...PIN_RIG, ...changes }))
  if (rig === null) throw new Error(JSON.stringify(faults))
  return rig
}
const countCells = (rig: Parameters<typeof makeSolve>[0]) =>
  makeSolve(rig).line.spans.reduce((sum, { cells }) => sum + cells, 0)

describe('coarsenRig', () => {
  it('leaves about 120 cells and few steps, however fine and long the run', () => {
    expect(countCells(coarsenRig(read({ run: { duration: '1 ms', cell: '0.1 mm' } })))).toBeLessThan(175)
    const long = makeSolve(coarsenRig(read({ run: { duration: '1 s', timeStep: '1 us' } })))
    expect(long.line.steps).toBeLessThan(6000)
  })

  it('makes no run finer than it was', () => {
    const rig = read({ run: { duration: '1 ms', cell: '20 mm' } })
    expect(countCells(coarsenRig(rig))).toBe(countCells(rig))
  })

  it('solves by one method, by elements only where the rig asks for them alone', () => {
    const methodOf = (method: string) =>
      coarsenRig(read({ run: { duration: '1 ms', cell: '2 mm', method } })).run.method
    expect(methodOf('both')).toBe('characteristics')
    expect(methodOf('characteristics')).toBe('characteristics')
    expect(methodOf('elements')).toBe('elements')
  })

  it('does not run again for fatigue', () => {
    const steel = { ...PIN_RIG.materials.steel, fatigue: { strength: '900 MPa', exponent: -0.09 } }
    const rig = read({ materials: { steel } })
    const once = makeSolve(rig).line.steps + 1
    expect(makeSolve(rig).steps).toBe(2 * once)
    const coarse = makeSolve(coarsenRig(rig))
    expect(coarse.steps).toBe(coarse.line.steps + 1)
  })

  it('leaves the rig as it was', () => {
    const rig = read()
    const before = JSON.stringify(rig)
    coarsenRig(rig)
    expect(JSON.stringify(rig)).toBe(before)
  })

  it('is near the full answer: the margin that governs within a tenth', () => {
    // A mass on a stepped pin, smooth behind its first front: 120 cells resolve it.
    const solve = (rig: Parameters<typeof makeSolve>[0]) => {
      const run = makeSolve(rig)
      run.advance(run.steps)
      return run.finish().governing!
    }
    const [full, coarse] = [solve(read()), solve(coarsenRig(read()))]
    expect(coarse.section).toBe(full.section)
    expect(Math.abs((1 + coarse.margin) / (1 + full.margin) - 1)).toBeLessThan(0.1)
  })
})
