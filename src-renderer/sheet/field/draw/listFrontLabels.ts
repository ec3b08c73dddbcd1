import type { Wavefront } from '../../../../src-main/contract/result'
import type { Label } from '../../../plot/placeLabels'
import type { FieldScales } from './fieldScales'

/** A front in the pixels of the field, cut to what is shown. */
export interface FrontLine {
  x1: number
  y1: number
  x2: number
  y2: number
  force: number
  spread: boolean
  /** Where along the bar it runs and which way; fronts of one course follow each other. */
  course: string
  /** When it starts [s]. */
  fromT: number
}

/** Share of the first front under which a front is left out. */
export const WEAKEST_FRONT = 0.05

/** Most fronts that are drawn at once. */
const MOST_FRONTS = 300

/** Share of the first front under which a front bears no number, and the length on the screen it needs [px]. */
const WEAKEST_LABEL = 0.2
const LEAST_LENGTH = 72

/** Most numbers, and the clear space about each [px]. */
const MOST_LABELS = 28
const CLEAR_ACROSS = 24
const CLEAR_UPRIGHT = 6

/** Where along its line a number may stand, best first. */
const PLACES = [0.5, 0.36, 0.64, 0.24, 0.76]

/**
 * Cuts the fronts to what is shown, the strongest first.
 *
 * @param fronts - of a result
 * @param scales - of the field
 * @returns lines in pixels, at most 300, none weaker than a twentieth of the first front
 */
export function listFrontLines(fronts: readonly Wavefront[], scales: FieldScales): FrontLine[] {
  const lines: FrontLine[] = []
  for (const { fromX, fromT, toX, toT, force, spread } of fronts) {
    if (Math.abs(force) < WEAKEST_FRONT) continue
    const cut = cutLine(
      scales.x.at(fromX),
      scales.t.at(fromT),
      scales.x.at(toX),
      scales.t.at(toT),
      scales.width,
      scales.height,
    )
    if (cut) lines.push({ ...cut, force, spread, course: `${fromX} ${toX}`, fromT })
  }
  return lines.sort(compareStrength).slice(0, MOST_FRONTS)
}

/**
 * Makes the numbers of the fronts: their force relative to the first one, such as `+0.38`. Of fronts that
 * repeat each other on one course, as in a striker that rings, the first bears the number. Strong and early
 * fronts come before weak and late ones.
 *
 * @param lines - the strongest first
 * @param measure - width of a text [px]
 * @param lineHeight - of a line of text [px]
 * @param height - of the field [px]
 */
export function listFrontLabels(
  lines: readonly FrontLine[],
  measure: (text: string) => number,
  lineHeight: number,
  height: number,
): Label[] {
  const told = new Set<string>()
  return lines
    .filter(({ force, course, x1, y1, x2, y2 }) => {
      if (Math.abs(force) < WEAKEST_LABEL || Math.hypot(x2 - x1, y2 - y1) < LEAST_LENGTH) return false
      const name = `${course} ${writeShare(force)}`
      return !told.has(name) && told.add(name)
    })
    .sort((one, other) => weigh(other, height) - weigh(one, height))
    .slice(0, MOST_LABELS)
    .map(({ force, x1, y1, x2, y2 }) => {
      const text = writeShare(force)
      return {
        text,
        width: measure(text) + CLEAR_ACROSS,
        height: lineHeight + CLEAR_UPRIGHT,
        places: PLACES.map((share) => ({ x: x1 + (x2 - x1) * share, y: y1 + (y2 - y1) * share })),
      }
    })
}

/** Strength of a front, of one on the upper edge two fifths. */
function weigh({ force, y1, y2 }: FrontLine, height: number): number {
  return Math.abs(force) * (0.4 + (0.3 * (y1 + y2)) / height)
}

/**
 * Writes a share with its sign and two places.
 *
 * @param share - of the first front
 * @returns such as `+1.00` or `−0.38`
 */
export function writeShare(share: number): string {
  return `${share < 0 ? '−' : '+'}${Math.abs(share).toFixed(2)}`
}

/** The strongest first; of equal ones the earliest, equal within rounding of what is written. */
function compareStrength(one: FrontLine, other: FrontLine): number {
  const strength = ({ force }: FrontLine): number => Math.round(Math.abs(force) * 100)
  return strength(other) - strength(one) || one.fromT - other.fromT
}

/** The part of a line inside a picture; null where it passes outside (the slabs of both axes). */
function cutLine(
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  width: number,
  height: number,
): { x1: number; y1: number; x2: number; y2: number } | null {
  let from = 0
  let to = 1
  for (const [start, run, size] of [
    [x1, x2 - x1, width],
    [y1, y2 - y1, height],
  ]) {
    if (run === 0) {
      if (start < 0 || start > size) return null
      continue
    }
    const one = -start / run
    const other = (size - start) / run
    from = Math.max(from, Math.min(one, other))
    to = Math.min(to, Math.max(one, other))
  }
  if (!(from < to)) return null
  const at = (share: number) => [x1 + (x2 - x1) * share, y1 + (y2 - y1) * share]
  const [[startX, startY], [endX, endY]] = [at(from), at(to)]
  return { x1: startX, y1: startY, x2: endX, y2: endY }
}
