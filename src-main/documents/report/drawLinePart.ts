import type { Result, TaperAnswer } from '../../contract/result'
import { formatQuantity } from '../format/formatQuantity'
import { markup, type Markup } from '../markup'
import { drawTraces } from '../picture/drawTraces'
import { makeBarsTable, makeInterfacesTable, makeTapersTable } from '../tables/lineTables'
import { drawTable } from './drawTable'

/**
 * Draws the line itself: its bars, and what its steps and tapers do to a wave.
 *
 * @param result - SI
 * @returns a part of the page
 */
export function drawLinePart(result: Result): Markup {
  return markup`<h2>The line</h2>
<p>Length ${formatQuantity(result.line.length, 'length')}, from the left.</p>
${drawTable(makeBarsTable(result.line.bars), 'The line has no bars.')}
<h2>Steps and joints</h2>
<p>Shares of what arrives; Z is the impedance. A negative reflected force turns compression into tension.</p>
${drawTable(makeInterfacesTable(result.interfaces), 'The line has no steps.')}
<h2>Tapers</h2>
${drawTable(makeTapersTable(result.tapers), 'The line has no tapers.')}
${result.tapers.map(drawTaper)}`
}

function drawTaper(taper: TaperAnswer): Markup {
  return drawTraces(
    `Harmonic waves through taper ${taper.name}`,
    { heading: 'frequency', quantity: 'frequency', values: taper.frequency },
    { heading: 'share', quantity: 'ratio' },
    [
      { name: 'reflected force', values: taper.reflectedForce, line: 'dashed' },
      { name: 'transmitted force', values: taper.transmittedForce, line: 'solid' },
      { name: 'transmitted energy', values: taper.transmittedEnergy, line: 'dotted' },
    ],
  )
}
