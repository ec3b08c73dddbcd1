import { describe, expect, it } from 'vitest'
import { makeWaveMethod } from '../../../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../../src-main/engine/march/march'
import { makeRecords } from '../../../../src-main/engine/records/makeRecords'
import { makeBar, makePulse, makeRig, makeSection } from '../testRig'

describe('a run whose numbers stop being finite', () => {
  it.each([NaN, Infinity])('breaks at the next record after %d, and its loop knows', (value) => {
    const pulse = makePulse((t) => (t < 400e-6 ? 1000 : value))
    const line = makeLine(
      makeRig(
        [makeBar('bar', [makeSection(0.1, 1e-3)])],
        { duration: 2e-3, timeStep: 1e-6 },
        { leftEnd: { kind: 'force', pulse } },
      ),
    )
    const run = makeWaveMethod(line)
    const records = makeRecords(run, false)
    const march = makeMarch(run, records, line.steps)
    march.advance(march.end)
    expect(march.broken).toBe(true)
    expect(march.step).toBeGreaterThan(400)
    // Records come at least every hundredth of the run.
    expect(march.step).toBeLessThan(425)
  })
})
