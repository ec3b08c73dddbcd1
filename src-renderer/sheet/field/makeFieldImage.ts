import type { PageResult, Quantity } from '../../../src-main/contract/bridge'
import { makeSignedTable, makeUnsignedTable, type ColourTable, type Theme } from '../../plot/colour/colourMap'
import { paintField, type Limits } from '../../plot/paintField'
import { QUANTITIES } from './quantities'
import { readLimits, spreadLimits } from './readLimits'
import type { FieldPicture } from './useFieldPicture'

const tables = new Map<string, ColourTable>()

/**
 * Finds the colours of a quantity; made once.
 *
 * @param quantity - shown
 * @param theme - light or dark
 * @param stale - greyed
 */
export function findTable(quantity: Quantity, theme: Theme, stale: boolean): ColourTable {
  const make = QUANTITIES[quantity].signs ? makeSignedTable : makeUnsignedTable
  const name = `${make.name} ${theme} ${stale}`
  const known = tables.get(name)
  if (known) return known
  const table = make(theme, stale)
  tables.set(name, table)
  return table
}

/** How a picture of the field is painted. */
export interface FieldPaint {
  theme: Theme
  stale: boolean
  /** Value of the last colour [SI]. */
  limit: number
  /** Ink as `#rrggbb`, for the hatching. */
  ink: string
  /** Pixels of the picture in one of the page. */
  density: number
}

/**
 * Paints a picture of the field; where stress is over what a section may bear it is hatched.
 *
 * @param picture - as the host gave it
 * @param paint - how
 * @returns the picture for a canvas, the latest row on top
 */
export function makeFieldImage(picture: FieldPicture, paint: FieldPaint): ImageData {
  const { columns, rows, request, result } = picture
  const bytes = new Uint8ClampedArray(4 * columns * rows)
  const table = findTable(request.quantity, paint.theme, paint.stale)
  const limits = request.quantity === 'stress' ? makeLimits(picture, result, paint) : null
  paintField(picture, table, paint.limit, new Uint32Array(bytes.buffer), limits)
  return new ImageData(bytes, columns, rows)
}

function makeLimits(
  { request, columns }: FieldPicture,
  result: PageResult,
  { ink, density }: FieldPaint,
): Limits {
  const limits = readLimits(result)
  const [r, g, b] = [1, 3, 5].map((at) => Number.parseInt(ink.slice(at, at + 2), 16))
  return {
    ...spreadLimits(limits, request.fromX, request.toX, columns),
    ink: ((255 << 24) | (b << 16) | (g << 8) | r) >>> 0,
    gap: Math.max(2, 3.5 * density),
    width: Math.max(0.8, density),
  }
}

/**
 * Tells whether stress is anywhere over what its section may bear.
 *
 * @param result - of a run
 */
export function isOverAnywhere(result: Pick<PageResult, 'sections' | 'factorOfSafety'>): boolean {
  const limits = readLimits(result)
  return result.sections.some(
    ({ tension, compression }, i) => tension.peak > limits[i].high || compression.peak < limits[i].low,
  )
}
