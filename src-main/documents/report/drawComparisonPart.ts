import type { Comparison } from '../../contract/result'
import { listComparison } from '../listFacts'
import { markup, type Markup } from '../markup'
import { makeComparisonTable } from '../tables/comparisonTable'
import { drawFacts } from './drawFacts'
import { drawTable } from './drawTable'

/**
 * Draws what the two methods make of the rig, and which to trust.
 *
 * @param comparison - null where one method was run
 * @returns a part of the page; nothing without a comparison
 */
export function drawComparisonPart(comparison: Comparison | null): Markup {
  if (comparison === null) return markup``
  return markup`<h2>The two methods compared</h2>
<p><b>${comparison.verdict}</b> All other parts of this page show the characteristics.</p>
${drawFacts(listComparison(comparison))}
${drawTable(makeComparisonTable(comparison.gauges), 'The rig has no gauges to compare.')}`
}
