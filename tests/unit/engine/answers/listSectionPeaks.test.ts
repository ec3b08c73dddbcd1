import { describe, expect, it } from 'vitest'
import { findGoverning } from '../../../../src-main/engine/answers/findGoverning'
import { listSectionPeaks } from '../../../../src-main/engine/answers/listSectionPeaks'
import type { Line } from '../../../../src-main/engine/line/line'
import type { ForceEnvelope } from '../../../../src-main/engine/records/record'
import { makePlainLine, STEEL } from './makePlainLine'

/** An envelope from the force at every span and position; steps are 10 times the position along the line. */
function makeEnvelope(
  line: Line,
  tension: (span: number, p: number) => number,
  compression = tension,
): ForceEnvelope {
  const start = new Int32Array(line.spans.length + 1)
  line.spans.forEach((span, i) => (start[i + 1] = start[i] + span.cells + 1))
  const count = start[line.spans.length]
  const made = {
    start,
    tension: new Float64Array(count),
    tensionStep: new Int32Array(count),
    compression: new Float64Array(count),
    compressionStep: new Int32Array(count),
  }
  line.spans.forEach((span, i) => {
    for (let p = 0; p <= span.cells; p++) {
      made.tension[start[i] + p] = Math.max(0, tension(i, p))
      made.compression[start[i] + p] = Math.min(0, compression(i, p))
      made.tensionStep[start[i] + p] = made.compressionStep[start[i] + p] = 10 * (start[i] + p)
    }
  })
  return made
}

const shaft = (fillet?: number) =>
  makePlainLine({
    factorOfSafety: 1.5,
    bars: [
      {
        name: 'shaft',
        sections: [
          { length: 0.02, diameter: 0.02, fillet },
          { length: 0.02, diameter: 0.04 },
        ],
      },
    ],
  })
const small = (Math.PI / 4) * 0.02 ** 2

describe('peaks of the sections', () => {
  it('counts the fillet in the smaller section, with the nominal stress at its face', () => {
    const line = shaft(0.002)
    // 10 kN along the smaller section, 20 kN in the larger one: at the step the force is the same, 20 kN.
    const envelope = makeEnvelope(line, (i, p) => (i === 0 && p < line.spans[0].cells ? 10e3 : 20e3))
    const [first, second] = listSectionPeaks(line, { envelope })
    // D/d = 2, r/d = 0.1: Kt = 1.964545 (Pilkey, round, recomputed from the coefficients).
    expect(first.tension.kt).toBeCloseTo(1.964545, 6)
    expect(first.tension.peak).toBeCloseTo(20e3 / small, 3)
    expect(first.tension.at).toBeCloseTo(0.02, 14)
    expect(first.tension.time).toBeCloseTo(40e-6, 14)
    expect(first.tension.local / first.tension.peak).toBeCloseTo(1.964545, 6)
    expect(first.tension.margin).toBeCloseTo(400e6 / (1.5 * 1.964545 * (20e3 / small)) - 1, 6)
    expect(first.tension.localAt).toBeCloseTo(0.02, 14)
    expect(first.tension.localTime).toBe(first.tension.time)
    expect(second.tension).toMatchObject({ kt: null, peak: second.tension.local })
    expect(second.tension.peak).toBeCloseTo(20e3 / (4 * small), 3)
    expect(second).toMatchObject({ bar: 'shaft', section: 1 })
    expect(second.from).toBeCloseTo(0.02, 14)
  })

  it('tells the place of the local stress apart from that of the nominal peak', () => {
    const line = shaft(0.002)
    // 30 kN at one place inside, 20 kN at the fillet: 1.96 x 20 is more than 30.
    const envelope = makeEnvelope(line, (i, p) => (i === 0 && p === 1 ? 30e3 : 20e3))
    const [{ tension }] = listSectionPeaks(line, { envelope })
    expect(tension.peak).toBeCloseTo(30e3 / small, 3)
    expect(tension.at).toBeCloseTo(0.005, 14)
    expect(tension.time).toBeCloseTo(10e-6, 14)
    expect(tension.local / (20e3 / small)).toBeCloseTo(1.964545, 6)
    expect(tension.localAt).toBeCloseTo(0.02, 14)
    expect(tension.localTime).toBeCloseTo(40e-6, 14)
  })

  it('reads what is rounding beside the largest stress of the run as none', () => {
    const line = shaft(0.002)
    const envelope = makeEnvelope(
      line,
      () => 1e-9,
      (i) => (i === 0 ? -20e3 : -1e-9),
    )
    const [first, second] = listSectionPeaks(line, { envelope })
    for (const { peak, local, margin } of [first.tension, second.tension, second.compression]) {
      expect([peak, local, margin]).toEqual([0, 0, null])
    }
    expect(first.compression.margin).not.toBeNull()
  })

  it('keeps the nominal peak where it is larger than the local stress at the shoulder', () => {
    const line = shaft(0.002)
    const envelope = makeEnvelope(line, (i, p) => (i === 0 && p === 1 ? -90e3 : -10e3))
    const [first] = listSectionPeaks(line, { envelope })
    expect(first.compression.peak).toBeCloseTo(-90e3 / small, 3)
    expect(first.compression.local).toBe(first.compression.peak)
    expect(first.compression.kt).toBeCloseTo(1.964545, 6)
    expect(first.compression.at).toBeCloseTo(0.005, 14)
    expect(first.compression.margin).toBeCloseTo(500e6 / (1.5 * (90e3 / small)) - 1, 9)
  })

  it('takes the fillet of the section before a step down as well', () => {
    const line = makePlainLine({
      bars: [
        {
          sections: [
            { length: 0.02, diameter: 0.04, fillet: 0.002 },
            { length: 0.02, diameter: 0.02 },
          ],
        },
      ],
    })
    const [first, second] = listSectionPeaks(line, { envelope: makeEnvelope(line, () => 1e3) })
    expect(first.tension.kt).toBeNull()
    expect(second.tension.kt).toBeCloseTo(1.964545, 6)
  })

  it('has no factor for a sharp corner, a missing fillet, a tube, a taper, a plain area or a change of material', () => {
    const pair = (first: object, second: object) => {
      const line = makePlainLine({
        bars: [
          {
            sections: [
              { length: 0.02, diameter: 0.02, fillet: 0.002, ...first },
              { length: 0.02, diameter: 0.04, ...second },
            ],
          },
        ],
      })
      return listSectionPeaks(line, { envelope: makeEnvelope(line, () => 1e3) })[0].tension.kt
    }
    expect(pair({}, {})).not.toBeNull()
    expect(pair({ fillet: 0 }, {})).toBeNull()
    expect(pair({ fillet: undefined }, {})).toBeNull()
    expect(pair({ bore: 0.005 }, {})).toBeNull()
    expect(pair({}, { bore: 0.005 })).toBeNull()
    expect(pair({ diameter: [0.01, 0.02] }, {})).toBeNull()
    expect(pair({}, { diameter: undefined, area: () => 1e-3 })).toBeNull()
    expect(pair({}, { material: { ...STEEL, modulus: 70e9 } })).toBeNull()
  })

  it('shows a bar without stress as zeros without sign and without a margin', () => {
    const line = shaft(0.002)
    const [first] = listSectionPeaks(line, { envelope: makeEnvelope(line, () => -0) })
    for (const sense of [first.tension, first.compression]) {
      expect(Object.is(sense.peak, 0)).toBe(true)
      expect(Object.is(sense.local, 0)).toBe(true)
      expect(sense.margin).toBeNull()
    }
  })

  it('names the earliest place where rounding alone tells equal peaks apart', () => {
    const line = shaft()
    const envelope = makeEnvelope(line, (_, p) => 1e3 * (1 + (p % 2) * 1e-15))
    expect(listSectionPeaks(line, { envelope })[0].tension).toMatchObject({ at: 0, time: 0 })
  })
})

describe('governing margin', () => {
  it('is the smallest of all sections and both senses', () => {
    const line = shaft(0.002)
    const sections = listSectionPeaks(line, {
      envelope: makeEnvelope(
        line,
        () => 20e3,
        () => -60e3,
      ),
    })
    expect(findGoverning(sections)).toEqual({
      bar: 'shaft',
      section: 0,
      sense: 'compression',
      margin: sections[0].compression.margin,
    })
  })

  it('is null without allowables', () => {
    const line = makePlainLine({
      bars: [
        { sections: [{ length: 0.02, diameter: 0.02, allowable: { tension: null, compression: null } }] },
      ],
    })
    const sections = listSectionPeaks(line, { envelope: makeEnvelope(line, () => 20e3) })
    expect(sections[0].tension).toMatchObject({ allowable: null, margin: null })
    expect(findGoverning(sections)).toBeNull()
  })
})
