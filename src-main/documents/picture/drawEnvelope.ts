import type { Result, SectionPeaks } from '../../contract/result'
import { formatNumber } from '../format/formatNumber'
import { markup, type Markup } from '../markup'
import { drawFrame, type Frame } from './drawFrame'
import { drawPath, round } from './drawPath'
import { findRange } from './findRange'

const HEIGHT = 340

/**
 * Draws the largest tension and compression along the line, with the limits of each section.
 *
 * @param result - SI
 * @returns the picture with its key
 */
export function drawEnvelope(result: Result): Markup {
  const { envelope, sections, factorOfSafety } = result
  const limits = listLimits(sections, factorOfSafety)
  const domain = findRange([envelope.tension, envelope.compression, limits.map((limit) => limit.stress)])
  const picture = drawFrame(
    'Largest tension and compression along the line',
    HEIGHT,
    {
      x: { heading: 'place', quantity: 'length', domain: [0, result.line.length] },
      y: { heading: 'stress', quantity: 'stress', domain },
    },
    (frame) => [
      ...limits.map((limit) => drawLimit(limit, frame)),
      markup`<path class="trace tension" d="${drawPath(pairs(envelope.x, envelope.tension), frame.x, frame.y)}"/>`,
      markup`<path class="trace compression" d="${drawPath(pairs(envelope.x, envelope.compression), frame.x, frame.y)}"/>`,
    ],
  )
  const meaning = `allowables divided by the factor of safety, ${formatNumber(factorOfSafety)}`
  return markup`${picture}
<p class="key">Nominal stresses, tension positive. Hatched lines: ${limits.length === 0 ? 'none, no allowable was given' : meaning};
the hatching is on the forbidden side. Local stresses at fillets are higher; the table of peaks counts them.</p>`
}

interface Limit {
  from: number
  to: number
  /** [Pa], negative in compression */
  stress: number
}

function listLimits(sections: SectionPeaks[], factor: number): Limit[] {
  return sections.flatMap(({ from, to, tension, compression }) => {
    const limits: Limit[] = []
    if (tension.allowable !== null) limits.push({ from, to, stress: tension.allowable / factor })
    if (compression.allowable !== null) limits.push({ from, to, stress: -compression.allowable / factor })
    return limits
  })
}

function drawLimit({ from, to, stress }: Limit, { x, y }: Frame): Markup {
  const left = round(x.place(from))
  const right = round(x.place(to))
  const at = round(y.place(stress))
  const up = stress > 0 ? -6 : 6
  let hatching = ''
  for (let place = left; place < right - 5; place += 7) hatching += `M${round(place)} ${at}l5 ${up}`
  return markup`<path class="limit" d="M${left} ${at}H${right}${hatching}"/>`
}

function* pairs(x: ArrayLike<number>, y: ArrayLike<number>): Generator<[number, number]> {
  for (let i = 0; i < x.length; i++) yield [x[i], y[i]]
}
