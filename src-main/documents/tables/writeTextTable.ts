import { cleanLine } from '../format/cleanLine'
import type { Table } from './table'

/**
 * Writes a table for a terminal, its columns aligned by spaces.
 *
 * @param table - headings and cells
 * @returns lines that end with a newline; control characters in cells are shown as codes
 */
export function writeTextTable(table: Table): string {
  const lines = [table.headings, ...table.rows].map((cells) => cells.map(cleanLine))
  const widths = table.headings.map((_heading, column) =>
    Math.max(...lines.map((cells) => countCharacters(cells[column]))),
  )
  return lines
    .map((cells) => {
      const padded = cells.map((cell, i) => pad(cell, widths[i], table.numeric[i]))
      return `  ${padded.join('  ')}`.trimEnd() + '\n'
    })
    .join('')
}

function pad(cell: string, width: number, atRight: boolean): string {
  const spaces = ' '.repeat(width - countCharacters(cell))
  return atRight ? spaces + cell : cell + spaces
}

function countCharacters(text: string): number {
  return [...text].length
}
