import { describe, expect, it } from 'vitest'
import { marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'
import { evaluateOrders } from './evaluateOrders'

const AREA = 1e-3
/** Travel time of the striker [s]. */
const T = 1e-4
const LENGTH = 5000 * T

describe('a gap that closes inside a step', () => {
  /** Cells of the striker; each grid is four times as fine, so that the gap always closes a third into a step. */
  const grids = [24, 96, 384, 1536]
  const SPEED = 10
  const meet = (cells: number) => {
    const dt = T / cells
    const gap = SPEED * (T / 24) * (7 + 1 / 3)
    const rig = makeRig(
      [
        makeBar('striker', [makeSection(LENGTH, AREA)], { uniformVelocity: SPEED }),
        makeBar('target', [makeSection(2 * LENGTH, AREA / 2)]),
      ],
      { duration: 5 * T, timeStep: dt },
      { joints: [{ kind: 'contact', gap }] },
    )
    const { record } = marchRig(rig)
    const [striker, target] = record.bars
    const start = record.energy.kinetic[0] + record.energy.strain[0] + record.energy.dissipated[0]
    return {
      missedSpeed: Math.abs(target.momentum / target.mass - (8 / 9) * SPEED),
      loss: record.jointLoss[0] / start,
      closure: record.energy.closure,
      momentumClosure: record.energy.momentumClosure,
      total: striker.momentum + target.momentum,
      right: striker.mass * SPEED,
      pulls: Math.max(...record.node(1)!.forceLeft),
    }
  }
  const found = grids.map(meet)

  it('loses energy of first order in the cell, booked under the joint', () => {
    for (const { loss, closure } of found) {
      expect(loss).toBeGreaterThan(0)
      expect(closure).toBeLessThan(1e-12)
    }
    for (const order of evaluateOrders(
      found.map(({ loss }) => loss),
      4,
    )) {
      expect(order).toBeGreaterThan(0.9)
      expect(order).toBeLessThan(1.1)
    }
    // A third of a step's worth of a contact that lasts 48 steps: well under the 1e-4 at 800 cells.
    expect(found[2].loss).toBeLessThan(1e-3)
  })

  it('gives final speeds that are no worse than first order', () => {
    const errors = found.map(({ missedSpeed }) => missedSpeed)
    for (let i = 1; i < errors.length; i++) expect(errors[i]).toBeLessThan(errors[i - 1] / 4 ** 0.9 + 1e-12)
  })

  it('keeps the total momentum to rounding and never pulls', () => {
    for (const { total, right, momentumClosure, pulls } of found) {
      expect(Math.abs(total / right - 1)).toBeLessThan(1e-12)
      expect(momentumClosure).toBeLessThan(1e-12)
      expect(pulls).toBeLessThanOrEqual(0)
    }
  })
})
