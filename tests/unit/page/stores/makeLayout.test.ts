import { describe, expect, it } from 'vitest'
import { evaluateLayout } from '../../../../src-renderer/stores/makeLayout'

describe('the measures of the sheet', () => {
  it('are those of the drawn study at 1280 x 800', () => {
    const layout = evaluateLayout(1280, 800)
    const { margin, rowHead, fieldLeft, fieldWidth, rulerWidth, rightLeft, rightWidth, type } = layout
    expect({ margin, rowHead, fieldLeft, fieldWidth, rulerWidth, rightLeft, rightWidth }).toEqual({
      margin: 12,
      rowHead: 88,
      fieldLeft: 100,
      fieldWidth: 700,
      rulerWidth: 44,
      rightLeft: 844,
      rightWidth: 424,
    })
    expect([
      layout.verbs,
      layout.line,
      layout.strip,
      layout.field,
      layout.ruler,
      layout.peaks,
      layout.notice,
    ]).toEqual([
      { top: 0, height: 32 },
      { top: 32, height: 120 },
      { top: 152, height: 60 },
      { top: 212, height: 380 },
      { top: 592, height: 20 },
      { top: 612, height: 164 },
      { top: 776, height: 24 },
    ])
    expect(type).toEqual({ axis: 11, body: 12, key: 15, figure: 28, margin: 64 })
  })

  it.each([
    [640, 400],
    [1280, 800],
    [1499, 900],
    [1920, 1080],
    [3840, 2160],
  ])('fill a window of %i x %i from edge to edge, the field most', (width, height) => {
    const layout = evaluateLayout(width, height)
    expect(layout.fieldLeft + layout.fieldWidth + layout.rulerWidth).toBe(layout.rightLeft)
    expect(layout.rightLeft + layout.rightWidth + layout.margin).toBe(layout.width)
    expect(layout.notice.top + layout.notice.height).toBe(layout.height)
    expect(layout.fieldWidth).toBeGreaterThan(layout.rightWidth)
    expect(layout.field.height).toBeGreaterThan(layout.peaks.height)
    expect(layout.width).toBeGreaterThanOrEqual(width)
  })

  it('grow the type from 1500 px on', () => {
    expect(evaluateLayout(1500, 900).type).toEqual({ axis: 12, body: 13, key: 18, figure: 36, margin: 80 })
    expect(evaluateLayout(1499, 900).type.margin).toBe(64)
  })

  it('make room for a drawer and for the fields of a part at the cost of the field alone', () => {
    const plain = evaluateLayout(1280, 800)
    const open = evaluateLayout(1280, 800, { drawer: 340, editor: 110 })
    expect(open.fieldWidth).toBe(plain.fieldWidth - 340)
    expect(open.strip.height).toBe(110)
    expect(open.field.height).toBe(plain.field.height - 50)
    expect(open.peaks).toEqual(plain.peaks)
  })
})
