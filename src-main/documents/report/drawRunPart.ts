import type { Result } from '../../contract/result'
import { markup, type Markup } from '../markup'
import { drawGauge } from '../picture/drawGauge'
import { makeGaugesTable, makePulsesTable } from '../tables/gaugeTables'
import { makeBarStatesTable, makeEndsTable, makeJointsTable } from '../tables/jointTables'
import { drawTable } from './drawTable'

/**
 * Draws what happened in the run: gauges with their pulses, joints, ends, and the bars at the end.
 *
 * @param result - SI
 * @returns a part of the page
 */
export function drawRunPart(result: Result): Markup {
  return markup`<h2>Gauges</h2>
${drawTable(makeGaugesTable(result.gauges), 'The rig has no gauges.')}
${result.gauges.map((gauge) => markup`<h3>${gauge.name}</h3>${drawGauge(gauge)}`)}
<h3>Pulses that pass the gauges</h3>
${drawTable(makePulsesTable(result.gauges), 'None.')}
<h2>Joints</h2>
${drawTable(makeJointsTable(result.joints), 'The line has no joints.')}
<h2>Ends</h2>
${drawTable(makeEndsTable(result.ends), 'None.')}
<h2>Bars at the end of the run</h2>
${drawTable(makeBarStatesTable(result.bars), 'The line has no bars.')}`
}
