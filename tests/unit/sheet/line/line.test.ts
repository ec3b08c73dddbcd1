import { describe, expect, it } from 'vitest'
import type { DrawnSection, LineDrawing } from '../../../../src-main/contract/lineDrawing'
import { evaluateLayout } from '../../../../src-renderer/stores/makeLayout'
import { describeSection } from '../../../../src-renderer/sheet/line/describeSection'
import { listParts } from '../../../../src-renderer/sheet/line/listParts'
import { listSectionModels } from '../../../../src-renderer/sheet/line/makeLineModel'
import { makeLineScale } from '../../../../src-renderer/sheet/line/makeLineScale'
import { evaluateFilletPath, evaluateSectionPaths } from '../../../../src-renderer/sheet/line/outlinePaths'
import { placeCautions } from '../../../../src-renderer/sheet/line/placeCautions'
import { placeFlags } from '../../../../src-renderer/sheet/line/placeFlags'
import { placeNames } from '../../../../src-renderer/sheet/line/placeNames'

const section = (
  bar: number,
  index: number,
  from: number,
  to: number,
  d0: number,
  d1 = d0,
  bore = 0,
): DrawnSection => ({
  index,
  name: '',
  from,
  to,
  outline: [
    [from, d0, bore],
    [to, d1, bore],
  ],
  material: 'steel',
  fillet: null,
  path: `bars[${bar}].sections[${index}]`,
})

// The rig of the drawn study: striker 300 x dia 20; shaft 800 x dia 20, cone 60 to dia 30, 500 x dia 30 bore 10.
const LINE: LineDrawing = {
  bars: [
    {
      name: 'striker',
      from: 0,
      to: 0.3,
      velocity: 12,
      sections: [section(0, 0, 0, 0.3, 0.02)],
      path: 'bars[0]',
    },
    {
      name: 'shaft',
      from: 0.3,
      to: 1.66,
      velocity: 0,
      sections: [
        section(1, 0, 0.3, 1.1, 0.02),
        section(1, 1, 1.1, 1.16, 0.02, 0.03),
        section(1, 2, 1.16, 1.66, 0.03, 0.03, 0.01),
      ],
      path: 'bars[1]',
    },
  ],
  joints: [{ kind: 'contact', x: 0.3, gap: 0, path: 'joints[0]' }],
  ends: [
    { kind: 'free', x: 0, label: 'free', path: 'leftEnd' },
    { kind: 'fixed', x: 1.66, label: 'fixed', path: 'rightEnd' },
  ],
  gauges: [
    { name: 'G1', x: 0.7, path: 'gauges[0]' },
    { name: 'G2', x: 1.65, path: 'gauges[1]' },
  ],
  loads: [],
}
const layout = evaluateLayout(1280, 800)
const WHOLE = { fromX: 0, toX: 1.66, whole: 1.66 }
const scale = makeLineScale(LINE, layout, WHOLE)

describe('the scale of the line', () => {
  it('is that of the field along x, to the pixel', () => {
    expect(scale.x(0)).toBe(100)
    expect(scale.x(1.66)).toBe(800)
    expect(scale.placeAt(scale.x(0.7))).toBeCloseTo(0.7, 12)
  })

  it('stretches diameters by a round factor that fills the height and no more', () => {
    // dia 30 at 700 px / 1660 mm is 12.65 px, and 45 px are there: 3.5
    expect(scale.stretch).toBeCloseTo(3.5, 9)
    const half = scale.half(0.03)
    expect(half).toBeCloseTo((0.015 * 3.5 * 700) / 1.66, 9)
    expect(scale.centre - half).toBeGreaterThan(scale.dimensions)
    expect(scale.centre + half).toBeLessThan(scale.names)
  })

  it('keeps the drawn diameters while x is zoomed, and states what they are', () => {
    const closer = makeLineScale(LINE, layout, { ...WHOLE, fromX: 0.2, toX: 0.615 })
    expect(closer.half(0.03)).toBeCloseTo(scale.half(0.03), 9)
    expect(closer.stretch).toBeCloseTo(3.5 / 4, 9)
  })

  it('takes less of the height where the reader wants it', () => {
    expect(makeLineScale(LINE, layout, WHOLE, 0.5).stretch).toBeCloseTo(1.75, 9)
  })
})

describe('sections in longitudinal section', () => {
  it('are closed outlines about the centre line', () => {
    const { body, cut, bore, half } = evaluateSectionPaths(LINE.bars[1].sections[1], scale)
    const numbers = body.match(/-?\d+\.\d+/g)!.map(Number)
    expect(numbers.filter((_, i) => i % 2 === 0)).toEqual([563.86, 589.16, 589.16, 563.86])
    const heights = numbers.filter((_, i) => i % 2 === 1).map((y) => y - scale.centre)
    expect(heights[0]).toBeCloseTo(-heights[3], 2)
    expect(heights[1]).toBeCloseTo(-heights[2], 2)
    expect([cut, bore]).toEqual([body, ''])
    expect(half).toBeCloseTo(scale.half(0.03), 9)
  })

  it('hatch the walls of a bored one, not its bore', () => {
    const { cut, bore } = evaluateSectionPaths(LINE.bars[1].sections[2], scale)
    expect(cut.match(/Z/g)).toHaveLength(2)
    expect(bore.match(/M/g)).toHaveLength(2)
  })

  it('draw a fillet in the corner of the smaller side', () => {
    const left = { ...section(0, 0, 0, 0.5, 0.02), fillet: 0.004 }
    const right = section(0, 1, 0.5, 1, 0.04)
    const xs = (path: string) => [...path.matchAll(/[ML](\d+\.\d+) /g)].map(([, x]) => Number(x))
    expect(Math.min(...xs(evaluateFilletPath(left, right, scale)))).toBeLessThan(scale.x(0.5) - 1)
    expect(Math.max(...xs(evaluateFilletPath(left, right, scale)))).toBeCloseTo(scale.x(0.5), 1)
    const falling = evaluateFilletPath(
      { ...section(0, 0, 0, 0.5, 0.04), fillet: 0.004 },
      section(0, 1, 0.5, 1, 0.02),
      scale,
    )
    expect(Math.max(...xs(falling))).toBeGreaterThan(scale.x(0.5) + 1)
    expect(evaluateFilletPath(left, section(0, 1, 0.5, 1, 0.02), scale)).toBe('')
  })

  it('are named as on a drawing', () => {
    const [one, cone, bored] = LINE.bars[1].sections
    expect(describeSection(one, 'si', true)).toBe('Ø20')
    expect(describeSection(cone, 'si', true)).toBe('Ø20–30')
    expect(describeSection(bored, 'si', true)).toBe('Ø30, bore Ø10')
    expect(describeSection(one, 'si', false)).toBe('314.2 mm²')
    expect(describeSection(section(0, 0, 0, 1, 0.0254), 'us', true)).toBe('Ø1')
  })

  it('lean their hatching the other way in the next bar', () => {
    const models = listSectionModels(LINE, scale, {}, 'si')
    expect(models.map(({ hatch }) => hatch)).toEqual([
      'url(#hatch-0-0)',
      'url(#hatch-0-1)',
      'url(#hatch-0-1)',
      'url(#hatch-0-1)',
    ])
    expect(models[1].name).toBe('shaft, section 1: 800 mm long, Ø20, steel')
    expect([models[0].next, models[1].next?.path]).toEqual([null, 'bars[1].sections[1]'])
  })
})

describe('parts of the line', () => {
  it('follow one another from left to right', () => {
    expect(listParts(LINE).map(({ path }) => path)).toEqual([
      'leftEnd',
      'bars[0].sections[0]',
      'joints[0]',
      'bars[1].sections[0]',
      'gauges[0]',
      'bars[1].sections[1]',
      'bars[1].sections[2]',
      'gauges[1]',
      'rightEnd',
    ])
  })

  it('have flags that lean to where there is room', () => {
    const [first, second] = placeFlags(LINE, scale, 11)
    expect([first.lean, second.lean]).toEqual([1, -1])
    expect(first.edge).toBeCloseTo(scale.centre - scale.half(0.02), 9)
    expect(second.edge).toBeCloseTo(scale.centre - scale.half(0.03), 9)
  })

  it('carry the numbers of the cautions that name them, clear of flags and of one another', () => {
    const models = listSectionModels(LINE, scale, {}, 'si')
    const caution = (where: string) => ({ code: 'near-step' as const, message: '', where })
    const flags = placeFlags(LINE, scale, 11)
    const boxes = placeCautions(
      [caution('shaft, section 3 (tail); striker'), caution(''), caution('shaft, section 3')],
      models,
      flags,
      scale,
    )
    expect(boxes.map(({ path, number }) => [number, path])).toEqual([
      [1, 'bars[0].sections[0]'],
      [1, 'bars[1].sections[2]'],
      [3, 'bars[1].sections[2]'],
    ])
    const [, one, other] = boxes
    expect(Math.abs(one.x - other.x)).toBeGreaterThanOrEqual(13)
    for (const { x } of [one, other]) expect(x + 13).toBeLessThan(flags[1].x - flags[1].width)
  })

  it('give way: names are shortened, then left out', () => {
    const name = (x: number) => ({
      path: `at ${x}`,
      x,
      forms: [
        ['shaft 1', 'Ø20'],
        ['1', ''],
      ] as [string, string][],
    })
    expect(placeNames([name(100), name(300)], 0, 400, 12).map(({ bold, light }) => bold + light)).toEqual([
      'shaft 1Ø20',
      'shaft 1Ø20',
    ])
    const tight = placeNames([name(100), name(140), name(146)], 0, 400, 12)
    expect(tight).toHaveLength(2)
    expect(tight.some(({ bold }) => bold === '1')).toBe(true)
  })
})
