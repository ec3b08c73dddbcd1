const LONGEST = 60

/** Characters that a terminal or a page would obey and not show: controls, and marks of direction or width. */
const UNSEEN = /[\u007F-\u009F\u00AD\u061C\u200B-\u200F\u2028-\u202E\u2060-\u206F\uFEFF\uFFF9-\uFFFB]/g

/**
 * Puts a text of a rig file between quotes for a message: short, on one line, nothing in it unseen.
 * @param text any
 */
export function quote(text: string): string {
  const short = text.length > LONGEST ? `${text.slice(0, LONGEST)}...` : text
  return JSON.stringify(short).replace(UNSEEN, (it) => `\\u${it.charCodeAt(0).toString(16).padStart(4, '0')}`)
}

/**
 * Writes a value of a rig file into a message: short, on one line.
 * @param value as it was read
 * @returns such as `"25 mm"`, `true`, `a list` or `an object`
 */
export function showValue(value: unknown): string {
  if (Array.isArray(value)) return 'a list'
  if (typeof value === 'object' && value !== null) return 'an object'
  if (typeof value !== 'string') return String(value)
  return quote(value)
}

/**
 * Writes a number with at most six digits, in the same way on every machine.
 * @param value any
 * @returns such as `32` or `1.25e-7`
 */
export function showNumber(value: number): string {
  return String(Number(value.toPrecision(6)))
}

/**
 * Writes a length in millimetres.
 * @param length [m]
 */
export function showLength(length: number): string {
  return `${showNumber(length * 1000)} mm`
}
