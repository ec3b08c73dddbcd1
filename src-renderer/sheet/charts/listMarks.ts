import { UNITS, type UnitDimension, type UnitSystem } from '../../format/units'
import { listTicks } from '../../plot/listTicks'
import type { Mark } from './frameSpec'

/** Width of a digit of the type, as a share of its size. */
const DIGIT = 0.5

/**
 * Lists the numbered marks of an axis, in round numbers of the reader's unit.
 *
 * @param from - one end of the axis, SI
 * @param to - the other end, SI
 * @param dimension - what the axis measures
 * @param units - the reader's
 * @param wanted - largest count
 * @returns marks within the axis, SI, ascending
 */
export function listMarks(
  from: number,
  to: number,
  dimension: UnitDimension,
  units: UnitSystem,
  wanted: number,
): Mark[] {
  const { size } = UNITS[dimension][units]
  const { major, places } = listTicks(from / size, to / size, wanted)
  return major.map((value) => ({ at: value * size, text: value.toFixed(places).replace('-', '−') }))
}

/**
 * Leaves out the marks across whose words would reach over the edge of the canvas.
 *
 * @param marks - of the axis across
 * @param at - place of a value on the canvas [px]
 * @param width - of the canvas [px]
 * @param size - of the type [px]
 */
export function keepWithin(
  marks: Mark[],
  at: (value: number) => number,
  width: number,
  size: number,
): Mark[] {
  return marks.filter((mark) => {
    const half = (mark.text.length * size * DIGIT) / 2
    return at(mark.at) - half >= 0 && at(mark.at) + half <= width
  })
}
