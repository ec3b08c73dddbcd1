import { fromOklch, readHex, toOklch, type Oklch, type Rgb } from './oklch'

export type Theme = 'light' | 'dark'

/**
 * Colours of a field by value: 256 entries, each red, green, blue and full opacity in the order of the
 * bytes of an `ImageData` on a little-endian machine. Entry 0 stands for no value (paper); entries 1 to
 * 255 run from minus the limit through zero (128) to plus the limit.
 */
export type ColourTable = Uint32Array

/** Compression, half of it, zero, half tension, tension. */
const SIGNED: Record<Theme, readonly string[]> = {
  light: ['#1E5099', '#78A2CF', '#FBFAF6', '#DCA377', '#B45600'],
  dark: ['#61B2F4', '#2F6789', '#15191E', '#86632A', '#F5AD53'],
}

/** Zero and largest of a quantity without sign: from paper toward ink, so that no sign is read into it. */
const UNSIGNED: Record<Theme, readonly string[]> = {
  light: ['#FBFAF6', '#555F69'],
  dark: ['#15191E', '#AEB6BD'],
}

/** Colours between which a stale picture is drawn, by how much of its chroma is left. */
const STALE_CHROMA = 0.4

/** How much of the way to paper a stale picture goes. */
const STALE_FADE = 0.45

/**
 * Makes the table of a signed field: blue for compression through paper to orange for tension, straight
 * in OKLCH between five colours at -1, -1/2, 0, 1/2 and 1 of the limit. Paper takes the hue of the colour
 * on its side, so that no third hue comes in.
 *
 * @param theme - light or dark
 * @param stale - greyed, for a result that no longer belongs to its rig
 * @returns 256 entries
 */
export function makeSignedTable(theme: Theme, stale = false): ColourTable {
  const stops = SIGNED[theme].map((hex) => toOklch(readHex(hex)))
  return makeTable((share) => mixStops(stops, (share + 1) / 2), stops[2], stale)
}

/**
 * Makes the table of a field without sign, such as energy: paper to grey. Negative values, which it does
 * not have, read as zero.
 *
 * @param theme - light or dark
 * @param stale - greyed further
 * @returns 256 entries
 */
export function makeUnsignedTable(theme: Theme, stale = false): ColourTable {
  const stops = UNSIGNED[theme].map((hex) => toOklch(readHex(hex)))
  const table = makeTable((share) => mixStops(stops, Math.max(0, share)), stops[0], stale)
  return table.fill(table[0], 0, 129)
}

/**
 * Finds the entry of a value.
 *
 * @param value - of the quantity; outside the limits it takes their colour, not finite: no value
 * @param limit - value of the last entry, positive
 * @returns 0..255
 */
export function findEntry(value: number, limit: number): number {
  const entry = 128 + Math.round((127 * value) / limit)
  return Number.isFinite(value) ? Math.min(255, Math.max(1, entry)) : 0
}

/**
 * Writes an entry for a style sheet or a canvas.
 *
 * @param table - of a field
 * @param entry - 0..255
 * @returns such as `rgb(30, 80, 153)`
 */
export function writeColour(table: ColourTable, entry: number): string {
  return `rgb(${readEntry(table, entry).join(', ')})`
}

/**
 * Reads an entry as red, green and blue.
 *
 * @param table - of a field
 * @param entry - 0..255
 * @returns 0..255 each
 */
export function readEntry(table: ColourTable, entry: number): Rgb {
  const packed = table[entry]
  return [packed & 255, (packed >>> 8) & 255, (packed >>> 16) & 255]
}

function makeTable(colourOf: (share: number) => Oklch, paper: Oklch, stale: boolean): ColourTable {
  const table = new Uint32Array(256)
  const fade = (colour: Oklch): Oklch => ({
    lightness: colour.lightness + (paper.lightness - colour.lightness) * STALE_FADE,
    chroma: colour.chroma * STALE_CHROMA,
    hue: colour.hue,
  })
  table[0] = pack(paper)
  for (let entry = 1; entry < 256; entry++) {
    const colour = colourOf((entry - 128) / 127)
    table[entry] = pack(stale ? fade(colour) : colour)
  }
  // Zero is paper to the bit, whatever its neighbours' hue.
  table[128] = table[0]
  return table
}

/** Straight in OKLCH between evenly spaced colours; a colour with next to no chroma has no hue of its own. */
function mixStops(stops: readonly Oklch[], share: number): Oklch {
  const place = share * (stops.length - 1)
  const first = Math.min(stops.length - 2, Math.floor(place))
  const one = stops[first]
  const other = stops[first + 1]
  const part = place - first
  const greyOne = one.chroma < 0.02
  const greyOther = other.chroma < 0.02
  const hue = greyOne ? other.hue : greyOther ? one.hue : one.hue + turn(other.hue - one.hue) * part
  return {
    lightness: one.lightness + (other.lightness - one.lightness) * part,
    chroma: one.chroma + (other.chroma - one.chroma) * part,
    hue,
  }
}

/** The same angle by the shorter way round. */
function turn(angle: number): number {
  return Math.atan2(Math.sin(angle), Math.cos(angle))
}

/** A colour as an entry of a table. */
function pack(colour: Oklch): number {
  const [r, g, b] = fromOklch(colour)
  return ((255 << 24) | (b << 16) | (g << 8) | r) >>> 0
}
