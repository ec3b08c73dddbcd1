import { describe, expect, it } from 'vitest'
import {
  COLLISION_SOURCE,
  COLLISIONS,
  type CollisionRow,
} from '../../src-main/engine/exact/published/collisions'
import { marchRig } from '../unit/engine/march'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'
import { expectNear } from './expectNear'
import { solveText } from './solveText'

/** The travel times are whole numbers of steps, so that the march is exact but for rounding. */
const ROUNDING = 1e-12
const SPEED = 10
const DT = 1e-6
/** Cells of the march for each of the row's. */
const FINER = 12

/** Marches one row until just after the faces have parted. */
function collide({ impedanceRatio, cells1, cells2, unit, part }: CollisionRow) {
  const cell = 5000 * DT
  const striker = makeBar('striker', [makeSection(cells1 * FINER * cell, impedanceRatio * 1e-3)], {
    uniformVelocity: SPEED,
  })
  const target = makeBar('target', [makeSection(cells2 * FINER * cell, 1e-3)])
  const steps = (part / unit) * FINER + FINER
  const { record } = marchRig(makeRig([striker, target], { duration: steps * DT, timeStep: DT }))
  const { forceLeft, velocityLeft, velocityRight } = record.node(1)!
  const Z1v = impedanceRatio * 1e-3 * 4e7 * SPEED
  const force = Array.from(forceLeft, (F) => -F / Z1v)
  const closed = force.map((F) => F > ROUNDING)
  let gap = 0
  let parts = -1
  velocityLeft.forEach((vl, k) => {
    gap += DT * (velocityRight[k] - vl)
    if (parts < 0 && gap > 1e-9 * SPEED * DT) parts = k
  })
  const [V1, V2] = record.bars.map(({ momentum, mass }) => momentum / mass / SPEED)
  return {
    force,
    forceSteps: force.filter((F, k) => closed[k] && (k === 0 || Math.abs(F - force[k - 1]) > ROUNDING)),
    /** Steps at which the force changes, closed ones only. */
    changes: force.flatMap((F, k) => (k > 0 && Math.abs(F - force[k - 1]) > ROUNDING ? [k] : [])),
    forceEnds: closed.lastIndexOf(true) + 1,
    part: parts,
    V1,
    V2,
    energy: record.energy,
  }
}

describe(`marched collisions of two bars: ${COLLISION_SOURCE}`, () => {
  for (const row of COLLISIONS) {
    const { impedanceRatio, cells1, cells2, unit } = row
    it(`Z1/Z2 = ${impedanceRatio}, T1 = ${cells1 * unit}, T2 = ${cells2 * unit}`, () => {
      const found = collide(row)
      const inSteps = (time: number) => (time / unit) * FINER
      expect(found.forceSteps).toHaveLength(row.forceSteps.length)
      found.forceSteps.forEach((force, i) => expectNear(force, row.forceSteps[i], ROUNDING))
      expect(found.forceEnds).toBe(inSteps(row.forceEnds))
      expect(found.part).toBe(inSteps(row.part))
      // The force steps down each time the front comes back through the shorter bar.
      const lasts = 2 * Math.min(cells1, cells2) * FINER
      expect(found.changes).toEqual(
        row.forceSteps.map((_, i) =>
          i + 1 < row.forceSteps.length ? (i + 1) * lasts : inSteps(row.forceEnds),
        ),
      )
      expectNear(found.V1, row.V1, ROUNDING)
      expectNear(found.V2, row.V2, ROUNDING)
      expectNear(found.V2 - found.V1, row.restitution, ROUNDING)
      expect(found.energy.closure).toBeLessThan(ROUNDING)
      expect(found.energy.momentumClosure).toBeLessThan(ROUNDING)
    })
  }

  it('has all 18 rows', () => expect(COLLISIONS).toHaveLength(18))

  it('like bars, L1 <= L2: vibration takes the share 1 - L1/L2 of the energy', () => {
    for (const row of COLLISIONS.filter((one) => one.impedanceRatio === 1 && one.cells1 <= one.cells2)) {
      const { V1, V2, energy } = collide(row)
      const last = energy.kinetic.length - 1
      const all = energy.kinetic[last] + energy.strain[last]
      const mass = (cells: number) => 4e7 * 1e-3 * cells * FINER * DT
      const rigid = ((mass(row.cells1) * V1 ** 2 + mass(row.cells2) * V2 ** 2) * SPEED ** 2) / 2
      expectNear(1 - rigid / all, 1 - row.cells1 / row.cells2, ROUNDING)
    }
  })
})

describe('like bars of E = 200 GPa, rho = 8000 kg/m^3 at 10 m/s, 0.3 m on 0.9 m: values recomputed', () => {
  it('200 MPa for 120 us, parted at 360 us, V1 = 0, V2 = 3.3333333 m/s, e = 1/3: from a rig file', () => {
    const material = { density: '8000 kg/m^3', modulus: '200 GPa', poisson: 0.3 }
    const { solution } = solveText({
      format: 'barwright-rig/1',
      title: 'Like bars',
      materials: { steel: material },
      leftEnd: { kind: 'free' },
      bars: [
        {
          name: 'striker',
          material: 'steel',
          velocity: '10 m/s',
          sections: [{ length: '0.3 m', diameter: '20 mm' }],
        },
        { name: 'target', material: 'steel', sections: [{ length: '0.9 m', diameter: '20 mm' }] },
      ],
      rightEnd: { kind: 'free' },
      gauges: [
        { name: 'left face', bar: 'striker', at: '0.3 m' },
        { name: 'right face', bar: 'target', at: '0 m' },
      ],
      run: { duration: '380 us', cell: '3 mm' },
    })
    const [joint] = solution.joints
    const area = Math.PI * 0.01 ** 2
    expectNear(joint.peakForce / area, -200e6, 200e6 * ROUNDING)
    expectNear(joint.contactTime, 120e-6, 120e-6 * ROUNDING)
    expect(joint.closedFrom).toBe(0)
    expect(joint.energyLost).toBe(0)
    expectNear(solution.striker!.pulseDuration!, 120e-6, 120e-6 * ROUNDING)
    expectNear(solution.bars[0].velocity, 0, 10 * ROUNDING)
    expectNear(solution.bars[1].velocity, 10 / 3, 10 * ROUNDING)
    expectNear((solution.bars[1].velocity - solution.bars[0].velocity) / 10, 1 / 3, ROUNDING)
    const [left, right] = solution.gauges
    let gap = 0
    const parted = left.t.filter((_, k) => (gap += right.velocity[k] - left.velocity[k]) > 1e-9)
    expectNear(parted[0], 360e-6, 360e-6 * ROUNDING)
  })
})
