import type { Result } from '../../contract/result'
import { describeGoverning } from '../describeGoverning'
import { formatQuantity } from '../format/formatQuantity'
import { listStrikerFacts } from '../listFacts'
import { markup, type Markup } from '../markup'
import { drawFacts } from './drawFacts'

/**
 * Draws the top of the report: title, safety notice, governing margin, striker and cautions.
 *
 * @param result - SI
 * @returns the first part of the page
 */
export function drawHead(result: Result): Markup {
  return markup`<h1>${result.rig.title === '' ? 'Rig without a title' : result.rig.title}</h1>
<p class="key">${result.software.name} ${result.software.version}, method: ${result.method}${result.comparison === null ? '' : ', compared with elements'},
run of ${formatQuantity(result.run.duration, 'time')}</p>
<p class="notice">${result.notice}</p>
${drawGoverning(result)}
<h2>Striker</h2>
${drawFacts(listStrikerFacts(result.striker))}
<h2>Cautions</h2>
${drawCautions(result)}`
}

function drawGoverning(result: Result): Markup {
  const { margin, negative, verdict, place } = describeGoverning(result)
  return markup`<section class="governing${negative ? ' negative' : ''}">
<p>Governing margin of safety</p>
<p class="margin">${margin}</p>
<p class="verdict">${verdict}</p>
<p>${place}</p>
</section>`
}

function drawCautions({ cautions }: Result): Markup {
  if (cautions.length === 0) return markup`<p>None was raised by this run.</p>`
  return markup`<ol class="cautions">${cautions.map(
    ({ where, message }) => markup`<li>${where === '' ? '' : markup`<b>${where}</b>: `}${message}</li>
`,
  )}</ol>`
}
