import type { Result } from '../../contract/result'
import { listClosures, listRunFacts } from '../listFacts'
import { markup, type Markup } from '../markup'
import { drawTraces } from '../picture/drawTraces'
import { makeRoundingTable } from '../tables/lineTables'
import { drawFacts } from './drawFacts'
import { drawTable } from './drawTable'

/**
 * Draws what the numbers rest on: energy and momentum, the facts of the run, the rig file.
 *
 * @param result - SI
 * @param rigText - the rig file as it was read; left out where it is not at hand
 * @returns the last part of the page
 */
export function drawProofPart(result: Result, rigText?: string): Markup {
  const { energy } = result
  return markup`<h2>Energy and momentum</h2>
<p>A closure is what the balance misses over the run, as a share of the largest amount at play.</p>
${drawFacts(listClosures(result))}
${drawTraces(
  'Energy over time',
  { heading: 'time', quantity: 'time', values: energy.t },
  { heading: 'energy', quantity: 'energy' },
  [
    { name: 'kinetic', values: energy.kinetic, line: 'solid' },
    { name: 'strain', values: energy.strain, line: 'dashed' },
    { name: 'dissipated', values: energy.dissipated, line: 'dotted' },
    { name: 'work of the surroundings', values: energy.work, line: 'thin' },
  ],
)}
<h2>The run</h2>
${drawFacts(listRunFacts(result))}
<h3>Rounding of travel times to whole cells</h3>
${drawTable(makeRoundingTable(result.run.travelTimeRounding), 'None.')}
${rigText === undefined ? '' : markup`<h2>The rig file</h2><pre>${rigText}</pre>`}`
}
