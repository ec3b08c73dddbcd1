import { expect, it } from 'vitest'
import { listFatigue } from '../../../../../src-main/engine/answers/fatigue/listFatigue'
import { listFatiguePlaces } from '../../../../../src-main/engine/answers/fatigue/listFatiguePlaces'
import { makeWaveMethod } from '../../../../../src-main/engine/characteristics/makeWaveMethod'
import { makeLine } from '../../../../../src-main/engine/line/makeLine'
import { makeMarch } from '../../../../../src-main/engine/march/march'
import { makeRecords } from '../../../../../src-main/engine/records/makeRecords'
import { makePlainRig } from '../makePlainLine'
import { TIRING } from './makeFatigueLine'

it('counts the pulse of a striker, there in compression and back in tension', () => {
  // rho c = 4e7, so 10 m/s onto an equal bar gives 200 MPa. The pulse of 40 us runs through 1 m of bar and back
  // from its free end as tension within 450 us: at the middle 0 -200 0 +200 0 MPa, one range of 400 MPa, whose
  // amplitude at a strength of 400 MPa lasts 0.5 (1/2)^-10 = 512 cycles. The striker bears 0 -200 0 MPa:
  // amplitude 100 MPa, 0.5 (1/4)^-10 = 524288 cycles.
  const material = { ...TIRING, fatigue: { strength: 400e6, exponent: -0.1 } }
  const rig = makePlainRig({
    duration: 390e-6,
    dt: 1e-6,
    bars: [
      { name: 'striker', velocity: 10, sections: [{ length: 0.1, diameter: 0.02, material }] },
      { name: 'bar', sections: [{ length: 1, diameter: 0.02, material }] },
    ],
  })
  const line = makeLine(rig)
  const run = makeWaveMethod(line)
  const records = makeRecords(run, false)
  for (const [span, { cells }] of line.spans.entries()) for (let p = 0; p <= cells; p++) run.addProbe(span, p)
  const march = makeMarch(run, records, line.steps)
  march.advance(march.end)
  const places = listFatiguePlaces(line, records.finish())
  const found = listFatigue(line, places, ({ span, position }) =>
    run.readTrace(span, position).force.map((force) => force / line.spans[span].area[position]),
  )
  expect(found.map(({ bar, cycles }) => [bar, cycles])).toEqual([
    ['striker', 1],
    ['bar', 1],
  ])
  expect(found[0].impacts! / 524288).toBeCloseTo(1, 9)
  expect(found[1].impacts! / 512).toBeCloseTo(1, 9)
  expect(found[1].largest[0].mean / 200e6).toBeCloseTo(0, 9)
  // The pull comes in the second half; until then the bar has only been pushed.
  expect(found[1].damageFirstHalf * 524288).toBeCloseTo(1, 9)
})
