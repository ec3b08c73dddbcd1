import type { LineDrawing } from '../../../src-main/contract/lineDrawing'
import { makeLinearScale } from '../../plot/linearScale'
import type { Layout } from '../../stores/makeLayout'

/** Where everything of the line's drawing stands, in px of the sheet from its left and the line's top. */
export interface LineScale {
  /** Place along the line [m] to px, the same as in the field. */
  x(place: number): number
  /** Place at a pixel [m]. */
  placeAt(pixel: number): number
  /** Half a diameter [m] as drawn [px]. */
  half(diameter: number): number
  /** Metres of diameter for a pixel of height. */
  diameterOfPixel: number
  /** How much larger diameters are drawn than lengths. */
  stretch: number
  /** Height of the centre line. */
  centre: number
  /** Heights of the dimension lines and of the names. */
  dimensions: number
  names: number
  /** The field's edges. */
  left: number
  right: number
}

const ABOVE = 55
const BELOW = 20
/** Stretches of diameter that are chosen from; what is drawn is stated. */
const STRETCHES = [1, 1.5, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 10]

/**
 * Makes the scales of the line's drawing: lengths as in the field, diameters stretched by a round factor
 * that fills the height, or by one of the reader's own.
 *
 * @param line - drawn
 * @param layout - of the sheet
 * @param view - what is seen of the line [m], and how long it is
 * @param wanted - factor over the chosen one, 1 for that itself
 * @returns the scales
 */
export function makeLineScale(
  line: LineDrawing,
  layout: Pick<Layout, 'fieldLeft' | 'fieldWidth' | 'line'>,
  view: { fromX: number; toX: number; whole: number },
  wanted = 1,
): LineScale {
  const left = layout.fieldLeft
  const right = left + layout.fieldWidth
  const along = makeLinearScale(view.fromX, view.toX, left, right)
  const room = (layout.line.height - ABOVE - BELOW) / 2
  const unzoomed = layout.fieldWidth / view.whole
  const radius = findLargestDiameter(line) / 2
  const chosen = radius > 0 ? roundDown(room / (radius * unzoomed)) : 1
  const perMetre = Math.min(chosen * wanted, room / (radius * unzoomed || 1)) * unzoomed
  return {
    x: along.at,
    placeAt: along.valueAt,
    half: (diameter) => (diameter / 2) * perMetre,
    diameterOfPixel: 2 / perMetre,
    stretch: (perMetre * (view.toX - view.fromX)) / layout.fieldWidth,
    centre: ABOVE + room,
    dimensions: 31,
    names: layout.line.height - 6,
    left,
    right,
  }
}

function findLargestDiameter({ bars }: LineDrawing): number {
  let largest = 0
  for (const { sections } of bars)
    for (const { outline } of sections)
      for (const [, diameter] of outline) largest = Math.max(largest, diameter)
  return largest
}

/** The largest of the round factors, or of them times a power of ten, that fits. */
function roundDown(fits: number): number {
  const power = 10 ** Math.floor(Math.log10(fits))
  return (STRETCHES.findLast((one) => one <= fits / power + 1e-9) ?? 1) * power
}
