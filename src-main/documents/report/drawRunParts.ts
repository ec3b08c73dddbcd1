import type { GaugeTable, Result } from '../../contract/result'
import { markup, type Markup } from '../markup'
import { drawGauge } from '../picture/drawGauge'
import { makeGaugesTable, makePulsesTable } from '../tables/gaugeTables'
import { makeBarStatesTable, makeEndsTable, makeJointsTable } from '../tables/jointTables'
import { drawTable } from './drawTable'

/** Pulses listed for each gauge; a long run has thousands. */
const PULSES_PER_GAUGE = 60

/**
 * Draws what happened in the run: gauges with their pulses, joints, ends, and the bars at the end.
 *
 * @param result - SI
 * @returns the parts of the page, each gauge one of its own
 */
export function* drawRunParts(result: Result): Generator<Markup> {
  yield markup`<h2>Gauges</h2>
${drawTable(makeGaugesTable(result.gauges), 'The rig has no gauges.')}`
  for (const gauge of result.gauges) yield markup`<h3>${gauge.name}</h3>${drawGauge(gauge)}`
  yield markup`<h3>Pulses that pass the gauges</h3>
${drawPulses(result.gauges)}
<h2>Joints</h2>
${drawTable(makeJointsTable(result.joints), 'The line has no joints.')}
<h2>Ends</h2>
${drawTable(makeEndsTable(result.ends), 'None.')}
<h2>Bars at the end of the run</h2>
${drawTable(makeBarStatesTable(result.bars), 'The line has no bars.')}`
}

function drawPulses(gauges: GaugeTable[]): Markup {
  const hidden = gauges.reduce((sum, { pulses }) => sum + Math.max(0, pulses.length - PULSES_PER_GAUGE), 0)
  return markup`${drawTable(makePulsesTable(gauges, PULSES_PER_GAUGE), 'None.')}
${hidden === 0 ? '' : markup`<p>The first ${PULSES_PER_GAUGE} of each gauge; ${hidden} later ones stand in result.json.</p>`}`
}
