import type { Result } from '../../contract/result'
import { markup, type Markup } from '../markup'
import { makeFragmentsTable, makeSpallsTable } from '../tables/spallTables'
import { drawTable } from './drawTable'

/**
 * Draws where bars came apart and what became of the pieces.
 *
 * @param result - SI
 * @returns a part of the page; nothing where no bar came apart
 */
export function drawSpallPart({ spalls, fragments }: Pick<Result, 'spalls' | 'fragments'>): Markup {
  if (spalls.length === 0) return markup``
  return markup`<h2>Spall</h2>
<p>A place comes apart at once where its tension reaches the material's spall stress, and is a contact from then on;
how long the tension has to last is not asked.</p>
${drawTable(makeSpallsTable(spalls), 'None.')}
<h3>Pieces at the end of the run</h3>
${drawTable(makeFragmentsTable(fragments), 'None.')}`
}
