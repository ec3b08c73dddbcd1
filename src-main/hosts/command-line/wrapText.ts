/**
 * Breaks text into lines at its spaces.
 *
 * @param text - one paragraph
 * @param width - most characters of a line; a longer word stands alone
 * @param indent - before every line but the first
 * @returns the lines, each ended by a newline
 */
export function wrapText(text: string, width: number, indent = ''): string {
  const lines: string[] = []
  let line = ''
  for (const word of text.split(' ')) {
    if (line !== '' && line.length + 1 + word.length > width) {
      lines.push(line)
      line = indent + word
    } else {
      line += line === '' ? word : ` ${word}`
    }
  }
  return [...lines, line].map((each) => `${each}\n`).join('')
}
