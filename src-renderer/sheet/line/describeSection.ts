import type { DrawnSection } from '../../../src-main/contract/lineDrawing'
import { formatQuantity } from '../../format/formatQuantity'
import type { UnitSystem } from '../../format/units'

/**
 * Writes the diameters of a section as a drawing does.
 *
 * @param section - drawn
 * @param units - whose units
 * @param round - false for a section given by its area
 * @returns such as `Ø20`, `Ø20–30`, `Ø30, bore Ø10` or `314.2 mm²`
 */
export function describeSection({ outline }: DrawnSection, units: UnitSystem, round: boolean): string {
  const [, from, boreFrom] = outline[0]
  const [, to, boreTo] = outline[outline.length - 1]
  const area = (diameter: number): number => (Math.PI / 4) * diameter ** 2
  const number = (value: number): string => formatQuantity(value, 'length', units, { trim: true }).text
  const range = (one: number, other: number): string => {
    const [a, b] = [number(one), number(other)]
    return a === b ? a : `${a}–${b}`
  }
  if (!round) {
    const one = formatQuantity(area(from), 'area', units, { trim: true })
    const other = formatQuantity(area(to), 'area', units, { trim: true })
    return one.text === other.text ? `${one.text} ${one.unit}` : `${one.text}–${other.text} ${one.unit}`
  }
  const bored = outline.some(([, , bore]) => bore > 0)
  return `Ø${range(from, to)}${bored ? `, bore Ø${range(boreFrom, boreTo)}` : ''}`
}
