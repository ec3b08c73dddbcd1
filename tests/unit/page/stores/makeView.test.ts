// @vitest-environment jsdom
import { effectScope, nextTick, shallowRef } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import { makeCursor } from '../../../../src-renderer/stores/makeCursor'
import type { Run } from '../../../../src-renderer/stores/makeRun'
import { makeView } from '../../../../src-renderer/stores/makeView'

const runOf = (length: number, duration: number, more: object = {}) => ({
  line: { bars: [{ to: length }] },
  result: { line: { length }, run: { duration }, governing: null, sections: [], ...more },
})

function start(length = 2, duration = 1e-3, more: object = {}) {
  const first = runOf(length, duration, more)
  const run = { line: shallowRef(first.line), result: shallowRef(first.result) }
  const set = (next: ReturnType<typeof runOf>): void => {
    run.line.value = next.line
    run.result.value = next.result
  }
  const view = effectScope().run(() => makeView(run as unknown as Run))!
  const cursor = makeCursor(run as unknown as Run, view, () => ({ width: 100, height: 50 }))
  const seen = () => [view.fromX.value, view.toX.value, view.fromT.value, view.toT.value]
  return { view, cursor, set, seen }
}

describe('what is looked at', () => {
  beforeEach(() => localStorage.clear())

  it('is the whole until it is zoomed, and follows the whole as it changes', () => {
    const { view, set, seen } = start()
    expect(seen()).toEqual([0, 2, 0, 1e-3])
    set(runOf(3, 2e-3))
    expect([seen(), view.zoomed.value]).toEqual([[0, 3, 0, 2e-3], false])
    view.zoomTo(1, 2, 0, 2e-3)
    set(runOf(4, 2e-3))
    expect([seen(), view.zoomed.value]).toEqual([[1, 2, 0, 2e-3], true])
    view.zoomOut()
    expect([seen(), view.zoomed.value]).toEqual([[0, 4, 0, 2e-3], false])
  })

  it('stays inside and keeps its width while it is moved', () => {
    const { view, seen } = start()
    view.zoomTo(0.5, 1, 0, 1e-3)
    view.pan(5, 5)
    expect(seen()).toEqual([1.5, 2, 0, 1e-3])
    view.pan(-5, 0)
    expect(seen()).toEqual([0, 0.5, 0, 1e-3])
  })

  it('zooms about a place, which stays where it is, and no closer than a thousandth', () => {
    const { view, seen } = start()
    view.zoomAbout(0.5, 0, 0.5, 1)
    expect(seen()).toEqual([0.25, 1.25, 0, 1e-3])
    view.zoomTo(1, 1, 0, 1e-3)
    expect(view.toX.value - view.fromX.value).toBeCloseTo(2e-3, 12)
  })

  it('keeps units and theme for the user, and no nonsense', async () => {
    const { view } = start()
    view.units.value = 'us'
    view.theme.value = 'dark'
    await nextTick()
    expect([start().view.units.value, start().view.theme.value]).toEqual(['us', 'dark'])
    localStorage.setItem('barwright.units', 'furlongs')
    expect(start().view.units.value).toBe('si')
  })
})

describe('the cursor', () => {
  const peak = (value: number, at: number, time: number) => ({
    peak: value,
    at,
    time,
    localAt: at,
    localTime: time,
  })
  const governed = {
    governing: { bar: 'shaft', section: 1, sense: 'tension', margin: 0.4 },
    sections: [
      { bar: 'shaft', section: 0, tension: peak(9, 0.1, 1e-4), compression: peak(-9, 0.2, 2e-4) },
      { bar: 'shaft', section: 1, tension: peak(5, 1.1, 6e-4), compression: peak(-1, 1.2, 3e-4) },
    ],
  }

  it('rests at the governing point, without a margin at the largest stress', () => {
    expect(start(2, 1e-3, governed).cursor.place.value).toEqual({ x: 1.1, t: 6e-4 })
    const { cursor } = start(2, 1e-3, { ...governed, governing: null })
    expect(cursor.place.value).toEqual({ x: 0.1, t: 1e-4 })
  })

  it('follows the hand until it is held, and steps by pixels', () => {
    const { cursor } = start(2, 1e-3, governed)
    cursor.setHover(0.5, 5e-4)
    expect(cursor.place.value).toEqual({ x: 0.5, t: 5e-4 })
    cursor.hold(1, 5e-4)
    cursor.setHover(0.2, 1e-4)
    cursor.step(2, -1)
    // 2 m over 100 px, 1 ms over 50 px
    expect(cursor.x.value).toBeCloseTo(1.04, 12)
    expect(cursor.t.value).toBeCloseTo(4.8e-4, 15)
    cursor.step(1000, 1000)
    expect(cursor.place.value).toEqual({ x: 2, t: 1e-3 })
    cursor.letGo()
    expect([cursor.held.value, cursor.place.value]).toEqual([false, { x: 1.1, t: 6e-4 }])
  })
})
