import { makeSignedTable, type ColourTable, type Theme } from '../../plot/colour/colourMap'
import type { Palette } from '../../plot/usePalette'

/** Colours and type that a drawing is made with. */
export interface Inks {
  theme: Theme
  paper: string
  /** Lines and figures; grey where the result is stale. */
  ink: string
  /** Units and what is said by the way. */
  unit: string
  rule: string
  grid: string
  /** Of signed values. */
  map: ColourTable
  /** Size of type on axes [px]. */
  size: number
}

export const FONT_FAMILY = "'IBM Plex Sans Condensed', sans-serif"

/**
 * Writes a font as a canvas takes it.
 *
 * @param size - [px]
 * @param weight - regular or semibold
 */
export function writeFont(size: number, weight: 400 | 600 = 400): string {
  return `${weight} ${size}px ${FONT_FAMILY}`
}

/**
 * Puts the sheet's colours together for a drawing.
 *
 * @param palette - of the page
 * @param stale - true where the result no longer belongs to its rig
 * @param size - of type on axes [px]
 */
export function makeInks(
  { theme, paper, ink, unit, stale: grey, rule, grid }: Palette,
  stale: boolean,
  size: number,
): Inks {
  return {
    theme,
    paper,
    ink: stale ? grey : ink,
    unit: stale ? grey : unit,
    rule,
    grid,
    map: makeSignedTable(theme, stale),
    size,
  }
}
