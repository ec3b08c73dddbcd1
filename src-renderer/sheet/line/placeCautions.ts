import type { Caution } from '../../../src-main/contract/result'
import type { LineScale } from './makeLineScale'
import type { SectionModel } from './makeLineModel'
import type { Flag } from './placeFlags'

/** The boxed number of a caution above a part of the line. */
export interface CautionBox {
  path: string
  number: number
  /** Upper left corner [px]. */
  x: number
  y: number
}

const STEP = 17

/**
 * Places the numbers of cautions above the sections or bars they name, clear of the gauges' flags; one that
 * finds no room is told by the list alone.
 *
 * @param cautions - of the result, numbered from 1 in their order
 * @param models - sections of the line
 * @param flags - of the gauges
 * @param scale - of the drawing
 * @returns boxes
 */
export function placeCautions(
  cautions: readonly Caution[],
  models: readonly SectionModel[],
  flags: readonly Flag[],
  scale: LineScale,
): CautionBox[] {
  const boxes: CautionBox[] = []
  const taken = flags.map(({ x, lean, width }) => (lean === 1 ? [x, x + width] : [x - width, x]))
  for (const [index, { where }] of cautions.entries()) {
    const named = where.split('; ')
    for (const model of models) {
      if (!isNamed(model, named)) continue
      const from = Math.max(model.left, scale.left) + 4
      const to = Math.min(model.right, scale.right) - STEP - 3
      for (let x = to; x >= from; x -= STEP) {
        if (taken.some(([left, right]) => x < right + 3 && x + 13 > left - 3)) continue
        taken.push([x, x + 13])
        boxes.push({ path: model.path, number: index + 1, x, y: scale.centre - model.half - 19 })
        break
      }
    }
  }
  return boxes
}

function isNamed({ barName, section }: SectionModel, named: readonly string[]): boolean {
  if (section.index === 0 && named.includes(barName)) return true
  const name = `${barName}, section ${section.index + 1}`
  return named.some((one) => one === name || one.startsWith(`${name} (`))
}
