import type { Result } from '../../contract/result'
import { markup, type Markup } from '../markup'
import { drawEnvelope } from '../picture/drawEnvelope'
import { drawField } from '../picture/drawField'
import { makePeaksTable } from '../tables/peaksTable'
import { drawTable } from './drawTable'

/**
 * Draws the stresses: peaks and margins of the sections, the envelope and the field.
 *
 * @param result - SI
 * @returns a part of the page
 */
export function drawStressPart(result: Result): Markup {
  return markup`<h2>Peaks and margins of the sections</h2>
<p>Places are measured along the line from its left end; sections count from 1. The local stress is the larger of
the nominal peak and Kt times the nominal stress at a fillet; margin = allowable / (factor of safety × local) − 1.</p>
${drawTable(makePeaksTable(result), 'The line has no sections.')}
<h2>Envelope</h2>
${drawEnvelope(result)}
<h2>Stress over place and time</h2>
${drawField(result)}`
}
