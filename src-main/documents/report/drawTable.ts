import { markup, type Markup } from '../markup'
import type { Table } from '../tables/table'

/**
 * Draws a table for a page, with words of alarm set off by inversion.
 *
 * @param table - headings and cells
 * @param empty - what to say where there are no rows
 * @returns a `table` element, or one paragraph
 */
export function drawTable(table: Table, empty: string): Markup {
  if (table.rows.length === 0) return markup`<p>${empty}</p>`
  const kind = (column: number): Markup => (table.numeric[column] ? markup` class="number"` : markup``)
  return markup`<div class="wide"><table>
<thead><tr>${table.headings.map((heading, i) => markup`<th scope="col"${kind(i)}>${heading}</th>`)}</tr></thead>
<tbody>
${table.rows.map(
  (cells, row) =>
    markup`<tr${table.alarm[row] ? markup` class="alarm"` : ''}>${cells.map((cell, i) => markup`<td${kind(i)}>${cell}</td>`)}</tr>
`,
)}</tbody></table></div>`
}
