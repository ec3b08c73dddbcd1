import type { Result } from '../../contract/result'
import { formatQuantity } from '../format/formatQuantity'
import { markup, type Markup } from '../markup'
import { coarsenField, type CoarseField } from './coarsenField'
import { SHADES } from './colourMap'
import { drawFrame, type Frame } from './drawFrame'
import { round } from './drawPath'

const HEIGHT = 520
const COLUMNS = 180
const ROWS = 130
const MOST_FRONTS = 1500

/**
 * Draws the stress over place and time, the wavefront lines on it, and the gauges' places.
 *
 * @param result - SI
 * @returns the picture with its key; words where there is no field
 */
export function drawField(result: Result): Markup {
  const coarse = coarsenField(result.field, COLUMNS, ROWS)
  if (!coarse) return markup`<p>The run recorded no field.</p>`
  const fronts = [...result.wavefronts]
    .sort((a, b) => Math.abs(b.force) - Math.abs(a.force))
    .slice(0, MOST_FRONTS)
  const picture = drawFrame(
    'Stress over place and time',
    HEIGHT,
    {
      x: { heading: 'place', quantity: 'length', domain: [0, result.line.length] },
      y: { heading: 'time', quantity: 'time', domain: [0, result.run.steps * result.run.timeStep] },
      down: true,
    },
    (frame) => [drawShades(coarse, frame), drawFronts(fronts, frame), drawPlaces(result, frame)],
  )
  const left = result.wavefronts.length - fronts.length
  return markup`${picture}
<p class="key"><span class="swatch s0"></span> compression ${formatQuantity(-coarse.largest, 'stress')}
<span class="swatch s${(SHADES - 1) / 2}"></span> zero
<span class="swatch s${SHADES - 1}"></span> tension ${formatQuantity(coarse.largest, 'stress')}.
Each patch shows the largest stress within it. Lines: wavefronts, dashed where a taper spreads them${
    left > 0 ? `; the ${left} weakest are left out` : ''
  }. Chain lines: gauges.</p>`
}

/** One path for each shade: neighbours of equal shade in a row make one rectangle. */
function drawShades({ x, t, stress, largest }: CoarseField, frame: Frame): Markup {
  const paths: string[] = Array.from({ length: SHADES }, () => '')
  stress.forEach((row, j) => {
    const top = round(frame.y.place(t[j]))
    const height = round(frame.y.place(t[j + 1]) - top)
    const shades = row.map((value) => chooseShade(value, largest))
    for (let from = 0, to = 0; from < row.length; from = to) {
      while (to < row.length && shades[to] === shades[from]) to++
      const left = round(frame.x.place(x[from]))
      const width = round(frame.x.place(x[to]) - left)
      paths[shades[from]] += `M${left} ${top}h${width}v${height}h${-width}z`
    }
  })
  return markup`<g class="field">${paths.map((path, i) =>
    path === '' ? '' : markup`<path class="s${i}" d="${path}"/>`,
  )}</g>`
}

function chooseShade(value: number, largest: number): number {
  const middle = (SHADES - 1) / 2
  return largest === 0 ? middle : middle + Math.round((value / largest) * middle)
}

function drawFronts(fronts: Result['wavefronts'], { x, y }: Frame): Markup {
  return markup`<g class="fronts">${fronts.map((front) => {
    const from = `${round(x.place(front.fromX))} ${round(y.place(front.fromT))}`
    const to = `${round(x.place(front.toX))} ${round(y.place(front.toT))}`
    const weight = Math.min(1, Math.max(0.2, Math.abs(front.force)))
    return markup`<path${front.spread ? markup` class="dashed"` : ''} opacity="${round(weight)}" d="M${from}L${to}"/>`
  })}</g>`
}

function drawPlaces(result: Result, { x, top, height }: Frame): Markup {
  return markup`${result.gauges.map((gauge) => {
    const at = round(x.place(gauge.x))
    return markup`<path class="chain" d="M${at} ${top}v${height}"/>
<text class="tick middle" x="${at}" y="${top - 4}">${gauge.name}</text>`
  })}`
}
