import { describe, expect, it } from 'vitest'
import { makeElementLine } from '../../src-main/engine/elements/makeElementLine'
import { makeElementMethod } from '../../src-main/engine/elements/makeElementMethod'
import { makeWaveMethod } from '../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../src-main/engine/line/makeLine'
import { makeMarch } from '../../src-main/engine/march/march'
import type { MethodRun } from '../../src-main/engine/march/methodRun'
import { makeRecords } from '../../src-main/engine/records/makeRecords'
import { makeBar, makeRig, makeSection } from '../unit/engine/testRig'

const STEPS = 1e6
const DT = 1e-6
const C = 5000
const AREA = 1e-3

/** A bar with a step and a cone, thrown against another bar and bound for ever between a spring and a fixed end. */
const rig = makeRig(
  [
    makeBar('bar', [makeSection(4 * C * DT, AREA), makeSection(5 * C * DT, (s) => AREA * (1 + s) ** 2)], {
      uniformVelocity: 10,
    }),
    makeBar('next', [makeSection(6 * C * DT, 2 * AREA)]),
  ],
  { duration: STEPS * DT, timeStep: DT },
  {
    joints: [{ kind: 'bonded' }],
    leftEnd: { kind: 'support', stiffness: 1e9, damping: 0, mass: 0.05, joint: 'bonded', gap: 0 },
    rightEnd: { kind: 'fixed' },
  },
)

/** The energy ledger and the drift of the stored energy. */
function march(run: MethodRun) {
  const records = makeRecords(run, false)
  const march = makeMarch(run, records, run.line.steps)
  march.advance(march.end)
  expect(march.broken).toBe(false)
  expect(march.step).toBeGreaterThan(STEPS)
  const { energy } = records.finish()
  const stored = energy.kinetic.map((one, i) => one + energy.strain[i])
  const drift = Math.max(...stored.map((one) => Math.abs(one - stored[0]))) / stored[0]
  return { energy, drift }
}

describe('a run of a million steps', () => {
  it.each([
    ['characteristics', () => makeWaveMethod(makeLine(rig))],
    ['elements', () => makeElementMethod(makeElementLine(makeLine(rig)))],
  ])('by %s keeps its energy to 1e-9', (_name, make) => {
    const { energy, drift } = march(make())
    expect(energy.closure).toBeLessThan(1e-9)
    expect(drift).toBeLessThan(1e-9)
    expect(energy.kinetic[0]).toBeGreaterThan(1)
  })
})
