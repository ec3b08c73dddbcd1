import type { FatigueAnswer } from '../../contract/result'
import { formatNumber } from '../format/formatNumber'
import { formatQuantity } from '../format/formatQuantity'
import { formatSection } from '../format/formatSection'
import { markup, type Markup } from '../markup'
import { makeFatigueCyclesTable, makeFatigueTable } from '../tables/fatigueTables'
import { drawTable } from './drawTable'

/**
 * Draws how many equal impacts the bars bear, with the rule, the lines and the largest cycles.
 *
 * @param fatigue - from the left, SI
 * @returns a part of the page; one sentence where no bar has an answer
 */
export function drawFatiguePart(fatigue: FatigueAnswer[]): Markup {
  if (fatigue.length === 0)
    return markup`<h2>Fatigue</h2><p>Not looked at: no material of the rig has a fatigue line.</p>`
  return markup`<h2>Fatigue</h2>
<p>Cycles of the local stress by the rainflow count (ASTM E1049-85) of one impact, repeated from the same start;
impacts to failure = 1 / damage, damage = sum of cycles / N, amplitude = strength (2 N)<sup>exponent</sup>. The cautions
say what is not counted.</p>
${drawTable(makeFatigueTable(fatigue), 'None.')}
<p>Lines of the materials: ${fatigue.map(describeLine).join('; ')}.</p>
<h3>Largest cycles of one impact</h3>
${drawTable(makeFatigueCyclesTable(fatigue), 'No stress changes in the bars looked at.')}`
}

function describeLine({ bar, section, strength, exponent }: FatigueAnswer): string {
  return `${formatSection(bar, section)}: strength ${formatQuantity(strength, 'stress')}, exponent ${formatNumber(exponent)}`
}
