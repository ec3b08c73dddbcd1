import type { Layout } from '../../stores/makeLayout'

/** Where the margin, its facts and the cautions stand [px]. */
export interface MarginPlace {
  figureWidth: number
  height: number
  factsLeft: number
  factsWidth: number
  /** Of a line of text. */
  row: number
}

/** Room under the margin for the verbs of the traces [px]. */
const VERBS = 14

/**
 * Places the margin and what stands beside it, over the traces.
 *
 * @param layout - of the sheet
 * @param over - true where the margin is negative: its block is wider by its edge and its hatching
 */
export function placeMargin(
  { line, strip, rightLeft, rightWidth, type }: Layout,
  over: boolean,
): MarginPlace {
  const figureWidth = Math.round(type.margin * 2.5) + (over ? 28 : 0)
  const factsLeft = rightLeft + figureWidth + (over ? 4 : 12)
  return {
    figureWidth,
    height: Math.min(strip.top - VERBS - line.top - 8, type.margin + 2 * type.body + 24),
    factsLeft,
    factsWidth: rightLeft + rightWidth - factsLeft,
    row: type.body + 4,
  }
}
