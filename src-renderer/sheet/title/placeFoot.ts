import type { Layout } from '../../stores/makeLayout'

/** Where the ratios and the title block stand, side by side under the traces [px]. */
export interface FootPlace {
  top: number
  height: number
  ratiosWidth: number
  /** Column of names in the ratios. */
  names: number
  titleLeft: number
  titleWidth: number
}

const GAP = 12

/**
 * Places the ratios and the title block.
 *
 * @param layout - of the sheet
 */
export function placeFoot({ peaks, notice, rightLeft, rightWidth, type }: Layout): FootPlace {
  const ratiosWidth = Math.round((rightWidth - GAP) / 2)
  const top = peaks.top + 8
  return {
    top,
    height: notice.top - top,
    ratiosWidth,
    names: Math.round(type.body * 4.3),
    titleLeft: rightLeft + ratiosWidth + GAP,
    titleWidth: rightWidth - ratiosWidth - GAP,
  }
}
