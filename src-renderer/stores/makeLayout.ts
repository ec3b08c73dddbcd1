import { reactive, watch, type Ref } from 'vue'

/** A stretch of the sheet from its top [px]. */
export interface Stretch {
  top: number
  height: number
}

/** Measures of the sheet for one size of the window [px]; x and t of every view agree by them. */
export interface Layout {
  width: number
  height: number
  /** From 1500 px on everything is larger. */
  wide: boolean
  margin: number
  rowHead: number
  fieldLeft: number
  fieldWidth: number
  rulerLeft: number
  rulerWidth: number
  rightLeft: number
  rightWidth: number
  /** Left edge of the drawer; the width of the sheet where there is none. */
  drawerLeft: number
  verbs: Stretch
  line: Stretch
  strip: Stretch
  field: Stretch
  ruler: Stretch
  peaks: Stretch
  notice: Stretch
  /** Sizes of type. */
  type: { axis: number; body: number; key: number; figure: number; margin: number }
}

/** Smallest sheet; a smaller window scrolls over it. */
const LEAST_WIDTH = 1120
const LEAST_HEIGHT = 680
const WIDE = 1500
/** From here on type grows once more: a window of a 4K screen without scaling. */
const HUGE = 2800

/**
 * Reckons the measures of the sheet.
 *
 * @param windowWidth - [px]
 * @param windowHeight - [px]
 * @param wants - width of the drawer, which narrows the field, and height of the fields of a part, which
 *   lower it; 0 where there is none [px]
 * @returns the measures
 */
export function evaluateLayout(
  windowWidth: number,
  windowHeight: number,
  { drawer = 0, editor = 0 }: { drawer?: number; editor?: number } = {},
): Layout {
  const width = Math.max(windowWidth, LEAST_WIDTH)
  const height = Math.max(windowHeight, LEAST_HEIGHT)
  const wide = width >= WIDE
  const size = width >= HUGE ? 1.5 : 1
  const grid = (value: number): number => 4 * Math.round((value * size) / 4)

  const margin = grid(12)
  const rowHead = grid(wide ? 104 : 88)
  const rulerWidth = grid(wide ? 52 : 44)
  const spare = Math.max(0, width / size - 1280)
  const rightWidth = grid(424 + 0.275 * spare)
  const fieldLeft = margin + rowHead
  const fieldWidth = width - drawer - fieldLeft - rulerWidth - rightWidth - margin
  const rulerLeft = fieldLeft + fieldWidth

  // What the field does not take of a higher window goes to the line, the strip and the peaks.
  const tall = Math.max(0, height / size - 800)
  const heights = {
    verbs: grid(32),
    line: grid(120 + Math.min(80, 0.14 * tall)),
    strip: Math.max(grid(60 + Math.min(60, 0.06 * tall)), Math.min(editor, Math.floor(0.42 * height))),
    ruler: grid(20),
    peaks: grid(164 + 0.18 * tall),
    notice: grid(24),
  }
  const taken = Object.values(heights).reduce((sum, part) => sum + part, 0)
  const order = ['verbs', 'line', 'strip', 'field', 'ruler', 'peaks', 'notice'] as const
  const stretches = {} as Record<(typeof order)[number], Stretch>
  let top = 0
  for (const part of order) {
    const own = part === 'field' ? height - taken : heights[part]
    stretches[part] = { top, height: own }
    top += own
  }

  const type = wide
    ? { axis: 12, body: 13, key: 18, figure: 36, margin: 80 }
    : { axis: 11, body: 12, key: 15, figure: 28, margin: 64 }
  for (const role of Object.keys(type) as (keyof typeof type)[]) type[role] = Math.round(type[role] * size)

  return {
    width,
    height,
    wide,
    margin,
    rowHead,
    fieldLeft,
    fieldWidth,
    rulerLeft,
    rulerWidth,
    rightLeft: rulerLeft + rulerWidth,
    rightWidth,
    drawerLeft: width - drawer,
    ...stretches,
    type,
  }
}

/**
 * Makes the measures that follow the window and what is open in it.
 *
 * @param page - the page's window
 * @param editor - height of the fields of a part [px]
 * @returns one reactive object
 */
export function makeLayout(
  page: Pick<Window, 'innerWidth' | 'innerHeight' | 'addEventListener'>,
  editor: Ref<number>,
): Layout {
  const evaluate = (): Layout => evaluateLayout(page.innerWidth, page.innerHeight, { editor: editor.value })
  const layout = reactive(evaluate())
  const follow = (): unknown => Object.assign(layout, evaluate())
  page.addEventListener('resize', follow)
  watch(editor, follow, { flush: 'sync' })
  return layout
}
