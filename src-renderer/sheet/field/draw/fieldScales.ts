import { makeLinearScale, type LinearScale } from '../../../plot/linearScale'

/** What part of the run is drawn, and where: x to the right, time upward. */
export interface FieldScales {
  x: LinearScale
  t: LinearScale
  /** [px] */
  width: number
  height: number
}

/**
 * Makes the two scales of the field.
 *
 * @param range - shown, [m] and [s]
 * @param width - of the field [px]
 * @param height - of the field [px]
 */
export function makeFieldScales(
  range: { fromX: number; toX: number; fromT: number; toT: number },
  width: number,
  height: number,
): FieldScales {
  return {
    x: makeLinearScale(range.fromX, range.toX, 0, width),
    t: makeLinearScale(range.fromT, range.toT, height, 0),
    width,
    height,
  }
}
