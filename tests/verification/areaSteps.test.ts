import { describe, expect, it } from 'vitest'
import type { End, Material, Section } from '../../src-main/contract/rig'
import { listInterfaces } from '../../src-main/engine/answers/listInterfaces'
import { STEEL_INTO, STEP_RATIOS } from '../../src-main/engine/exact/published/stepRatios'
import { makeLine } from '../../src-main/engine/line/makeLine'
import { marchRig } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection, ROUND_STEEL } from '../unit/engine/testRig'
import { expectNear } from './expectNear'

/** Nine printed digits, half a unit of the tenth. */
const PRINTED = 0.51e-9
const DT = 1e-6
const CELLS = 40
const PULSE = 10 * DT

const rectangle = makePulse((t) => (t < PULSE - DT / 2 ? -1000 : 0))
const halfSine = makePulse((t) => (t < PULSE ? -1000 * Math.sin((Math.PI * t) / PULSE) : 0))

const make = (density: number, modulus: number): Material => ({ ...ROUND_STEEL, density, modulus })
const ofCells = (material: Material, area: number, cells = CELLS): Section =>
  makeSection(cells * Math.sqrt(material.modulus / material.density) * DT, area, { material })

/**
 * Sends a pulse from the left end over the step in the middle, and reads the waves that leave it:
 * force, velocity, stress and energy as shares of those that arrived.
 */
function marchStep(sections: Section[], rightEnd: End, pulse = rectangle) {
  const steps = (sections.length === 1 ? 2.4 : 1.9) * CELLS
  const bar = makeBar('bar', sections)
  const middle = sections.map(({ length }) => length / 2)
  const gauges = middle.map((half, i) => ({
    name: `G${i}`,
    bar: 0,
    at: half + sections.slice(0, i).reduce((sum, { length }) => sum + length, 0),
    bridge: null,
  }))
  const rig = makeRig(
    [bar],
    { duration: steps * DT, timeStep: DT },
    { leftEnd: { kind: 'force', pulse }, rightEnd, gauges },
  )
  const { line, record } = marchRig(rig)
  const [before, after] = record.gauges
  const end = record.node(line.spans.length)!
  // What the far end sees of the one bar at a free or fixed end; the second bar otherwise.
  const passed = after ?? { force: end.forceLeft, velocity: end.velocityLeft, area: 1, impedance: Infinity }
  const at = (values: Float64Array) =>
    values.reduce((best, v) => (Math.abs(v) > Math.abs(best) ? v : best), 0)
  const energy = (values: Float64Array, Z: number) => values.reduce((sum, F) => sum + (F * F) / Z, 0)
  // The pulse passes the middle at steps 20 to 30, what comes back at 60 to 70.
  const [incident, reflected] = [at(before.force.slice(0, 45)), at(before.force.slice(45))]
  const velocities = [at(before.velocity.slice(0, 45)), at(before.velocity.slice(45))]
  return {
    forceReflected: reflected / incident,
    forceTransmitted: at(passed.force) / incident,
    velocityReflected: velocities[1] / velocities[0],
    velocityTransmitted: at(passed.velocity) / velocities[0],
    stressTransmitted: at(passed.force) / passed.area / (incident / before.area),
    energyReflected: energy(before.leftgoing, before.impedance) / energy(before.rightgoing, before.impedance),
    energyTransmitted: energy(passed.force, passed.impedance) / energy(before.rightgoing, before.impedance),
  }
}

describe(`marched waves, ${STEP_RATIOS.label}: ${STEP_RATIOS.source}`, () => {
  for (const [ratio, R, T, vT, ER, ET, stress] of STEP_RATIOS.rows) {
    const bonded = ratio > 0 && ratio < Infinity
    for (const [name, pulse] of [
      ['a rectangle', rectangle],
      ['a half sine', halfSine],
    ] as const)
      it(`Z2/Z1 = ${ratio}, ${name}`, () => {
        const first = ofCells(ROUND_STEEL, 1e-3)
        const second = bonded ? [ofCells(ROUND_STEEL, ratio * 1e-3)] : []
        const end: End = { kind: ratio === 0 ? 'free' : ratio === Infinity ? 'fixed' : 'free' }
        const found = marchStep([first, ...second], end, pulse)
        expectNear(found.forceReflected, R, PRINTED)
        expectNear(found.forceTransmitted, T, PRINTED)
        expectNear(found.velocityReflected, -R, PRINTED)
        expectNear(found.velocityTransmitted, vT, PRINTED)
        expectNear(found.energyReflected, ER, PRINTED)
        if (!bonded) return
        expectNear(found.energyTransmitted, ET, PRINTED)
        expectNear(found.stressTransmitted, stress, PRINTED)
        expectNear(found.energyReflected + found.energyTransmitted, 1, 1e-14)
      })
  }

  it('the reverse steps: -1/3, 2/3, stress 4/3 for 2:1 and -3/5, 2/5, stress 8/5 for 4:1', () => {
    for (const [ratio, R, T, stress] of [
      [2, -1 / 3, 2 / 3, 4 / 3],
      [4, -3 / 5, 2 / 5, 8 / 5],
    ]) {
      const found = marchStep([ofCells(ROUND_STEEL, ratio * 1e-3), ofCells(ROUND_STEEL, 1e-3)], {
        kind: 'free',
      })
      expectNear(found.forceReflected, R, 1e-14)
      expectNear(found.forceTransmitted, T, 1e-14)
      expectNear(found.stressTransmitted, stress, 1e-14)
    }
  })
})

describe(`marched waves, ${STEEL_INTO.label}: ${STEEL_INTO.source}`, () => {
  const steel = make(7850, 207e9)
  it.each(STEEL_INTO.rows)('density %d, modulus %d', (density, modulus, _ratio, R, T, ET) => {
    const found = marchStep([ofCells(steel, 1e-3), ofCells(make(density, modulus), 1e-3)], { kind: 'free' })
    expectNear(found.forceReflected, R, PRINTED)
    expectNear(found.forceTransmitted, T, 0.51e-8)
    expectNear(found.energyTransmitted, ET, PRINTED)
  })

  it('no reflection into aluminium of the matching area, A2/A1 = 2.95548329', () => {
    const found = marchStep([ofCells(steel, 1e-3), ofCells(make(2700, 68.9e9), 2.95548329e-3)], {
      kind: 'free',
    })
    expectNear(found.forceReflected, 0, PRINTED)
    expectNear(found.energyTransmitted, 1, 1e-15)
  })
})

describe('marched waves, silver to gold at equal areas: a textbook problem, values recomputed', () => {
  it('velocity 0.864194736 passes and -0.135805264 comes back, stress 1.13580526 passes', () => {
    const [silver, gold] = [make(10500, 83e9), make(19300, 78e9)]
    const found = marchStep([ofCells(silver, 1e-3), ofCells(gold, 1e-3)], { kind: 'free' })
    expectNear(found.velocityTransmitted, 0.864194736, PRINTED)
    expectNear(found.velocityReflected, -0.135805264, PRINTED)
    expectNear(found.stressTransmitted, 1.13580526, 0.51e-8)
  })

  it('in a line whose c are 2811.54084 and 2010.33599 m/s, Z1/Z2 = 0.760865233', () => {
    const sections = [ofCells(make(10500, 83e9), 1e-3), ofCells(make(19300, 78e9), 1e-3)]
    const line = makeLine(makeRig([makeBar('bar', sections)], { duration: 1e-4, timeStep: DT }))
    expectNear(line.spans[0].speed, 2811.54084, 0.51e-5)
    expectNear(line.spans[1].speed, 2010.33599, 0.51e-5)
    expectNear(line.spans[0].impedance[0] / line.spans[1].impedance[0], 0.760865233, PRINTED)
    expect(line.spans.map(({ cells }) => cells)).toEqual([CELLS, CELLS])
  })
})

describe('the interface ratios of the answers say what the march does', () => {
  it('for a step of area and material', () => {
    const sections = [ofCells(make(7850, 207e9), 2e-3), ofCells(make(4430, 114e9), 1e-3)]
    for (const way of ['fromLeft', 'fromRight'] as const) {
      const inOrder = way === 'fromLeft' ? sections : [...sections].reverse()
      const line = makeLine(makeRig([makeBar('bar', sections)], { duration: 1e-4, timeStep: DT }))
      const [row] = listInterfaces(line)
      const found = marchStep(inOrder, { kind: 'free' })
      expectNear(found.forceReflected, row[way].reflectedForce, 1e-14)
      expectNear(found.forceTransmitted, row[way].transmittedForce, 1e-14)
      expectNear(found.stressTransmitted, row[way].transmittedStress, 1e-14)
      expectNear(found.energyReflected, row[way].reflectedEnergy, 1e-14)
      expectNear(found.energyTransmitted, row[way].transmittedEnergy, 1e-14)
    }
  })
})
