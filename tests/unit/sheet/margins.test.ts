import { describe, expect, it } from 'vitest'
import { makeFieldScales } from '../../../src-renderer/sheet/field/draw/fieldScales'
import { makePlot } from '../../../src-renderer/sheet/charts/makeFrameConfig'
import { writeSvg } from '../../../src-renderer/sheet/charts/writeSvg'
import { describeMargin, describeSafeSpeed } from '../../../src-renderer/sheet/margin/describeMargin'
import { findOuterDiameter } from '../../../src-renderer/sheet/margin/findOuterDiameter'
import { findStressRange, listBounds } from '../../../src-renderer/sheet/peaks/listBounds'
import { makePeaksSpec, type PeaksFrame } from '../../../src-renderer/sheet/peaks/makePeaksSpec'
import { findStep } from '../../../src-renderer/sheet/ratios/findStep'
import { writeShare } from '../../../src-renderer/sheet/ratios/writeShare'
import { solvePage, STEPPED_RIG } from './solvePage'
import { testInks } from './testInks'

const result = solvePage(STEPPED_RIG)
const faster = solvePage({
  ...STEPPED_RIG,
  bars: [{ ...STEPPED_RIG.bars[0], velocity: '24 m/s' }, STEPPED_RIG.bars[1]],
})
const frame: PeaksFrame = {
  width: 700,
  height: 156,
  left: 37,
  right: 40,
  fromX: 0,
  toX: result.line.length,
  limit: 350e6,
  inks: testInks,
  units: 'si',
}

describe('the governing margin in words', () => {
  it('states stress, limit and factor so that they give the margin', () => {
    const words = describeMargin(result, 'si')!
    const limit = /of ([\d.]+) MPa \(([\d.]+) ÷ ([\d.]+)\)/.exec(words.limit)!
    expect(Number(limit[1])).toBeCloseTo(Number(limit[2]) / Number(limit[3]), 0)
    // Three digits of each: the quotient may stray by 1 %.
    expect(Number(limit[1]) / Number(words.stress) - 1).toBeCloseTo(result.governing!.margin, 1)
    expect(words.over).toBe(false)
  })

  it('says when it is over', () => {
    const words = describeMargin(faster, 'si')!
    expect(words.over).toBe(true)
    expect(words.figure).toMatch(/^−0\.\d\d$/)
  })

  it('has no words without a margin', () => {
    expect(describeMargin({ ...result, governing: null }, 'si')).toBeNull()
  })

  it('rounds the safe speed down, never up', () => {
    const striker = { ...result.striker!, safeSpeed: -17.1999 }
    expect(describeSafeSpeed(striker, 'si')).toEqual({ text: '17.1', unit: 'm/s safe striker speed' })
    expect(describeSafeSpeed({ ...striker, safeSpeed: 17.2 }, 'si')?.text).toBe('17.2')
    expect(describeSafeSpeed({ ...striker, safeSpeed: null }, 'si')?.unit).toBe(
      'no one safe speed for this rig',
    )
    expect(describeSafeSpeed(null, 'si')).toBeNull()
  })
})

describe('peaks', () => {
  it('stand on the x of the field to the pixel, zoomed or not', () => {
    for (const [fromX, toX] of [
      [0, result.line.length],
      [0.4173, 1.2009],
    ]) {
      const field = makeFieldScales({ fromX, toX, fromT: 0, toT: 1 }, frame.width, 380)
      const plot = makePlot(
        makePeaksSpec(result, null, { ...frame, fromX, toX }),
        {} as CanvasRenderingContext2D,
      )
      for (const x of [fromX, 0.7, toX]) expect(plot.x.at(x) - frame.left).toBeCloseTo(field.x.at(x), 9)
    }
  })

  it('show allowables over the factor of safety, neighbours that agree as one', () => {
    // 700 and 900 MPa over 1.5, the same in every section.
    expect(listBounds(result, 'tension')).toEqual([
      { from: 0, to: expect.closeTo(result.line.length, 9), stress: expect.closeTo(700e6 / 1.5, 0) },
    ])
    expect(listBounds(result, 'compression')[0].stress).toBeCloseTo(-600e6, 0)
    const [low, high] = findStressRange(result, null)
    expect(low).toBeLessThan(-600e6)
    expect(high).toBeGreaterThan(700e6 / 1.5)
  })

  it('leave far allowables off the scale, so that the curves keep their height', () => {
    const calm = solvePage({
      ...STEPPED_RIG,
      bars: [{ ...STEPPED_RIG.bars[0], velocity: '1 m/s' }, STEPPED_RIG.bars[1]],
    })
    expect(findStressRange(calm, null)[1]).toBeLessThan(700e6 / 1.5)
  })

  it('write every negative margin', () => {
    const spec = makePeaksSpec(faster, null, frame)
    const svg = writeSvg(
      {
        title: 'Peaks',
        width: 777,
        height: 156,
        parts: [{ spec, left: 0, top: 0 }],
        words: [],
        inks: testInks,
      },
      (text) => 5.2 * text.length,
    )
    const negative = faster.sections.flatMap(({ tension, compression }) =>
      [tension, compression].filter(({ margin }) => margin !== null && margin < 0),
    )
    expect(negative.length).toBeGreaterThan(3)
    expect(svg.match(/>−0\.\d\d<\/text>/g)).toHaveLength(negative.length)
  })
})

describe('ratios', () => {
  it('are those of the nearest step, from both sides', () => {
    const step = findStep(result, 0.29)!
    expect(step).toMatchObject({ name: result.interfaces[0].name, isTaper: false })
    const force = step.rows.find(({ name }) => name === 'force')!
    expect(force.fromRight.reflected).toBe(result.interfaces[0].fromRight.reflectedForce)
    expect(findStep({ interfaces: [], tapers: [] }, 0.5)).toBeNull()
  })

  it('of a taper from the right are those of the same rig turned round, or are not given', () => {
    const { bars } = STEPPED_RIG
    const turned = solvePage({
      ...STEPPED_RIG,
      bars: [
        bars[0],
        {
          ...bars[1],
          sections: [
            { length: '500 mm', diameter: '30 mm', bore: '10 mm' },
            { length: '60 mm', diameter: { from: '30 mm', to: '20 mm' } },
            { length: '800 mm', diameter: '20 mm' },
          ],
        },
      ],
      gauges: [],
    })
    const here = findStep({ interfaces: [], tapers: result.tapers }, 1.1)!
    const there = findStep({ interfaces: [], tapers: turned.tapers }, 0.8)!
    for (const name of ['long force', 'short force']) {
      const one = here.rows.find((row) => row.name === name)!
      const other = there.rows.find((row) => row.name === name)!
      expect(one.fromRight.transmitted).toBeCloseTo(other.fromLeft.transmitted, 12)
      if (one.fromRight.reflected !== null)
        expect(one.fromRight.reflected).toBeCloseTo(other.fromLeft.reflected!, 12)
    }
    // The bore begins at the cone's right end: a step there, which a short pulse from the right meets.
    expect(here.rows.find(({ name }) => name === 'short force')!.fromRight.reflected).toBeNull()
    const smooth = solvePage({
      ...STEPPED_RIG,
      bars: [
        bars[0],
        { ...bars[1], sections: [...bars[1].sections.slice(0, 2), { length: '500 mm', diameter: '30 mm' }] },
      ],
      gauges: [],
    })
    const flush = findStep({ interfaces: [], tapers: smooth.tapers }, 1.1)!
    expect(flush.rows.find(({ name }) => name === 'short force')!.fromRight.reflected).toBe(0)
    for (const side of ['fromLeft', 'fromRight'] as const) {
      const energy = here.rows.find(({ name }) => name === 'energy')![side]
      expect(energy.reflected! + energy.transmitted).toBeCloseTo(1, 12)
    }
  })

  it('are written with a sign only where they have one', () => {
    expect([0.3849, -0.3849, 1.2, -1e-5, null].map((share) => writeShare(share, true))).toEqual([
      '+0.385',
      '−0.385',
      '+1.200',
      '0.000',
      '–',
    ])
    expect(writeShare(0.615, false)).toBe('0.615')
  })
})

describe('findOuterDiameter', () => {
  it('takes the larger face at a step and goes straight along a cone', () => {
    const part = (outline: [number, number, number][]) => ({ outline }) as never
    const line = {
      bars: [{ sections: [part([[0, 0.02, 0], [1, 0.02, 0]]), part([[1, 0.03, 0], [2, 0.05, 0]])] }], // prettier-ignore
    } as never
    expect([0.5, 1, 1.5, 3].map((x) => findOuterDiameter(line, x))).toEqual([0.02, 0.03, 0.04, 0])
  })
})
