type Rows = (string | number)[][]

/**
 * Writes rows of two values in one line.
 *
 * @param rows - of the rig; anything else reads as empty
 * @returns such as `0 mm, 20 mm; 40 mm, 24 mm`
 */
export function writePairs(rows: unknown): string {
  if (!Array.isArray(rows)) return ''
  return rows.map((row) => (Array.isArray(row) ? row.map(String).join(', ') : String(row))).join('; ')
}

/**
 * Reads rows of two values from one line; commas within brackets belong to a formula.
 *
 * @param text - values parted by commas, rows by semicolons or line ends
 * @param plainFirst - true where the first value of a row is a plain number
 * @returns the rows, of whatever length: the rig's reader says what is wrong with them
 */
export function readPairs(text: string, plainFirst = false): Rows {
  return text
    .split(/[;\n]/)
    .map((row) => row.trim())
    .filter((row) => row !== '')
    .map((row) =>
      splitOutside(row).map((cell, i) =>
        plainFirst && i === 0 && cell !== '' && Number.isFinite(Number(cell)) ? Number(cell) : cell,
      ),
    )
}

function splitOutside(row: string): string[] {
  const cells = ['']
  let depth = 0
  for (const letter of row) {
    if (letter === '(') depth++
    if (letter === ')') depth--
    if (letter === ',' && depth <= 0) cells.push('')
    else cells[cells.length - 1] += letter
  }
  return cells.map((cell) => cell.trim())
}
