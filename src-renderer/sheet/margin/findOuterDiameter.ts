import type { LineDrawing } from '../../../src-main/contract/lineDrawing'

/**
 * Outer diameter of the line at a place, the larger of both faces at a step.
 *
 * @param line - as it is drawn
 * @param x - [m]
 * @returns diameter [m]; 0 off the bars
 */
export function findOuterDiameter({ bars }: LineDrawing, x: number): number {
  let largest = 0
  for (const { outline } of bars.flatMap(({ sections }) => sections)) {
    for (let i = 1; i < outline.length; i++) {
      const [[x0, from], [x1, to]] = [outline[i - 1], outline[i]]
      const share = x1 === x0 ? 0 : (x - x0) / (x1 - x0)
      if (share < -1e-9 || share > 1 + 1e-9) continue
      largest = Math.max(largest, from + (to - from) * share)
    }
  }
  return largest
}
