import { createApp, shallowRef, computed } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import { makeCursor, type Cursor } from '../../../../src-renderer/stores/makeCursor'
import { makeView, type View } from '../../../../src-renderer/stores/makeView'
import { STORE_KEYS } from '../../../../src-renderer/stores/storeKeys'
import { makeFieldScales } from '../../../../src-renderer/sheet/field/draw/fieldScales'
import { useFieldKeys } from '../../../../src-renderer/sheet/field/useFieldKeys'
import { useFieldPointer } from '../../../../src-renderer/sheet/field/useFieldPointer'

/** A run of 1 m and 1 ms in a field of 700 x 400 px. */
function makeBench() {
  const run = {
    result: shallowRef({ line: { length: 1 }, run: { duration: 1e-3 }, governing: null, sections: [] }),
    line: shallowRef(null),
  } as never
  const view = makeView(run)
  const cursor = makeCursor(run, view, () => ({ width: 700, height: 400 }))
  const app = createApp({})
  app.provide(STORE_KEYS.view, view)
  app.provide(STORE_KEYS.cursor, cursor)
  const scales = computed(() =>
    makeFieldScales(
      { fromX: view.fromX.value, toX: view.toX.value, fromT: view.fromT.value, toT: view.toT.value },
      700,
      400,
    ),
  )
  return app.runWithContext(() => ({ view, cursor, act: useFieldKeys(), ...useFieldPointer(scales) }))
}

let bench: ReturnType<typeof makeBench>
let view: View
let cursor: Cursor
beforeEach(() => {
  bench = makeBench()
  ;({ view, cursor } = bench)
})

describe('keys in the field', () => {
  const press = (key: string, keys: Partial<KeyboardEvent> = {}): boolean => {
    let taken = false
    bench.act({ key, ...keys, preventDefault: () => (taken = true), stopPropagation() {} } as never)
    return taken
  }

  it('step by a pixel, ten with Shift, and hold', () => {
    cursor.setHover(0.5, 5e-4)
    press('ArrowRight')
    press('ArrowUp', { shiftKey: true })
    expect(cursor.x.value).toBeCloseTo(0.5 + 1 / 700, 12)
    expect(cursor.t.value).toBeCloseTo(5e-4 + (10 * 1e-3) / 400, 12)
    expect(cursor.held.value).toBe(true)
  })

  it('let go with Escape once, and pass it on where nothing is held', () => {
    cursor.hold(0.5, 5e-4)
    expect(press('Escape')).toBe(true)
    expect(cursor.x.value).toBeNull()
    expect(press('Escape')).toBe(false)
  })

  it('zoom about the cursor, pan with Control, and go back to the whole', () => {
    cursor.hold(0.5, 5e-4)
    press('+')
    expect([view.fromX.value, view.toX.value]).toEqual([expect.closeTo(0.15, 12), expect.closeTo(0.85, 12)])
    press('ArrowRight', { ctrlKey: true })
    expect(view.fromX.value).toBeCloseTo(0.22, 12)
    press('0')
    expect(view.zoomed.value).toBe(false)
  })

  it('leave the sheet its own keys', () => {
    cursor.hold(0.5, 5e-4)
    expect(press('z', { ctrlKey: true })).toBe(false)
    expect(press('Tab')).toBe(false)
  })
})

describe('the pointer in the field', () => {
  const point = (kind: string, x: number, y: number, more: object = {}): void =>
    bench.handlers[kind]({
      clientX: x + 100,
      clientY: y + 200,
      button: 0,
      currentTarget: { getBoundingClientRect: () => ({ left: 100, top: 200 }), setPointerCapture() {} },
      preventDefault() {},
      stopPropagation() {},
      ...more,
    } as never)

  it('moves the cursor, holds it with a click, and lets it follow no longer', () => {
    point('pointermove', 350, 100)
    expect([cursor.x.value, cursor.t.value]).toEqual([0.5, expect.closeTo(7.5e-4, 12)])
    point('pointerdown', 70, 400)
    point('pointerup', 70, 400)
    expect([cursor.x.value, cursor.t.value, cursor.held.value]).toEqual([expect.closeTo(0.1, 12), 0, true])
    point('pointermove', 350, 100)
    expect(cursor.x.value).toBeCloseTo(0.1, 12)
  })

  it('rests again when it leaves', () => {
    point('pointermove', 350, 100)
    point('pointerleave', 0, 0)
    expect(cursor.x.value).toBeNull()
  })

  it('looks closer at what is drawn, and at a range of one axis where it is thin', () => {
    point('pointerdown', 70, 300)
    point('pointermove', 350, 100)
    expect(bench.area.value).toEqual({ left: 70, top: 100, width: 280, height: 200 })
    point('pointerup', 350, 100)
    expect(bench.area.value).toBeNull()
    expect([view.fromX.value, view.toX.value]).toEqual([expect.closeTo(0.1, 12), expect.closeTo(0.5, 12)])
    expect([view.fromT.value, view.toT.value]).toEqual([
      expect.closeTo(2.5e-4, 12),
      expect.closeTo(7.5e-4, 12),
    ])
    bench.handlers.dblclick(undefined as never)
    point('pointerdown', 70, 300)
    point('pointermove', 350, 305)
    point('pointerup', 350, 305)
    expect(view.toX.value).toBeCloseTo(0.5, 12)
    expect([view.fromT.value, view.toT.value]).toEqual([0, 1e-3])
  })

  it('zooms about the place below the wheel, x alone with Shift, time alone with Alt', () => {
    point('wheel', 350, 200, { deltaY: -200, deltaX: 0, deltaMode: 0, shiftKey: true })
    expect(view.fromX.value).toBeGreaterThan(0.1)
    expect(view.fromX.value + view.toX.value).toBeCloseTo(1, 12)
    expect(view.fromT.value).toBe(0)
    point('wheel', 350, 200, { deltaY: -200, deltaX: 0, deltaMode: 0, altKey: true })
    expect(view.fromT.value + view.toT.value).toBeCloseTo(1e-3, 12)
    expect(view.fromT.value).toBeGreaterThan(1e-4)
  })

  it('pans with Shift', () => {
    view.zoomTo(0.2, 0.6, 0, 1e-3)
    point('pointerdown', 350, 200, { shiftKey: true })
    point('pointermove', 420, 200, { shiftKey: true })
    point('pointerup', 420, 200, { shiftKey: true })
    expect([view.fromX.value, view.toX.value]).toEqual([expect.closeTo(0.16, 12), expect.closeTo(0.56, 12)])
    expect(cursor.held.value).toBe(false)
  })
})
