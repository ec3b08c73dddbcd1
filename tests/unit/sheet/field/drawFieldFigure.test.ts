import { describe, expect, it } from 'vitest'
import { makeSignedTable } from '../../../../src-renderer/plot/colour/colourMap'
import { listTicks } from '../../../../src-renderer/plot/listTicks'
import { SvgContext } from '../../../../src-renderer/sheet/charts/svg/svgContext'
import {
  drawFieldFigure,
  evaluateFigureSize,
  type FieldFigure,
} from '../../../../src-renderer/sheet/field/draw/drawFieldFigure'
import { makeFieldScales } from '../../../../src-renderer/sheet/field/draw/fieldScales'
import type { FieldModel } from '../../../../src-renderer/sheet/field/draw/fieldModel'

const colours = ['paper', 'drawer', 'ink', 'unit', 'stale', 'rule', 'grid', 'accent', 'wash']
const palette = {
  theme: 'light',
  ...Object.fromEntries(colours.map((role, i) => [role, `#00000${i}`])),
} as unknown as FieldModel['palette']
const front = { fromX: 0, fromT: 0, toX: 1, toT: 1e-3, direction: 'right', force: 1, spread: false } as const

function draw(change: Partial<FieldModel>): string {
  const scales = makeFieldScales({ fromX: 0, toX: 1, fromT: 0, toT: 1e-3 }, 700, 380)
  const ruler = (from: number, to: number, unit: string, size: number) => ({
    ticks: listTicks(from / size, to / size, 10),
    unit,
    size,
    writeTick: String,
    write: String,
  })
  const [x, t] = [ruler(0, 1, 'mm', 1e-3), ruler(0, 1e-3, 'ms', 1e-3)]
  const model: FieldModel = {
    palette,
    stale: false,
    axisSize: 11,
    bodySize: 12,
    xTicks: x.ticks,
    tTicks: t.ticks,
    xUnit: x.size,
    tUnit: t.size,
    line: null,
    fronts: [],
    contacts: [],
    spalls: [],
    signs: [],
    governing: null,
    key: [],
    ...change,
  }
  const figure: FieldFigure = {
    title: 'A shaft: stress',
    model,
    scales,
    x,
    t,
    painted: null,
    bar: { table: makeSignedTable('light'), isSigned: true, words: ['+350 MPa', '0', '−350 MPa'] },
  }
  const { width, height } = evaluateFigureSize(scales)
  const context = new SvgContext(width, height, (text) => 6 * text.length)
  drawFieldFigure(context as unknown as CanvasRenderingContext2D, figure)
  return context.finish('x', '#ffffff')
}
const count = (text: string, part: string | RegExp): number => text.split(part).length - 1

describe('the field as it is saved', () => {
  it('has its title, both rulers and its colours', () => {
    const svg = draw({})
    for (const word of ['A shaft: stress', 'x, mm', 't, ms', '>1000<', '>0.5<', '+350 MPa', '−350 MPa']) {
      expect(svg).toContain(word)
    }
  })

  it('draws fronts solid, and dashed where they are spread, with their force', () => {
    const solid = draw({ fronts: [front] })
    expect(solid).toContain('+1.00')
    expect(count(solid, 'stroke-dasharray')).toBe(0)
    const spread = draw({ fronts: [{ ...front, spread: true, force: -0.5 }] })
    expect(spread).toContain('−0.50')
    expect(count(spread, 'stroke-dasharray')).toBe(1)
  })

  it('draws a contact for as long as it carries force', () => {
    const svg = draw({ contacts: [{ x: 0.5, from: 2e-4, to: 5e-4 }] })
    // Half-way across 700 px, from 0.2 to 0.5 of 380 px up, in the figure's margins of 96 and 36 px.
    expect(svg).toContain('M443.5 226L448.5 226L448.5 340L443.5 340Z')
  })

  it('rings the governing point and keeps the key and the numbers clear of it', () => {
    const governing = { x: 0.9, t: 1e-4, text: '326 MPa', over: false }
    const free = draw({ key: ['solid: front'] })
    const ringed = draw({ key: ['solid: front'], governing })
    expect(ringed).toContain('326 MPa')
    const placeOfKey = (svg: string): number => Number(/y="([\d.]+)"[^>]*>solid: front/.exec(svg)?.[1])
    expect(placeOfKey(free)).toBeGreaterThan(300)
    expect(placeOfKey(ringed)).toBeLessThan(60)
  })

  it('greys with a stale result', () => {
    const svg = draw({ fronts: [front], stale: true })
    expect(svg).toContain('stroke="#000004"')
    expect(svg).not.toContain('stroke="#000002" stroke-width="1.25"')
  })
})
