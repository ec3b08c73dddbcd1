// Control characters, line and paragraph separators, and marks that turn the direction of writing.
const UNPRINTABLE = /[\u0000-\u001f\u007f-\u009f\u2028\u2029\u200e\u200f\u202a-\u202e\u2066-\u2069]/g

/**
 * Makes any text safe to print as part of one line on a terminal: what would move the cursor, colour or
 * reorder the text is shown as its code instead.
 *
 * @param text - text of any origin
 * @returns the same text on one line, such as `a\u{1b}[2Jb`
 */
export function cleanLine(text: string): string {
  return text.replace(UNPRINTABLE, (mark) => `\\u{${mark.charCodeAt(0).toString(16)}}`)
}
