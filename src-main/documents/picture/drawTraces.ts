import type { Quantity } from '../format/quantity'
import { markup, type Markup } from '../markup'
import { drawFrame, type Frame } from './drawFrame'
import { drawPath } from './drawPath'
import { findRange } from './findRange'
import { thinByExtremes } from './thinByExtremes'

const HEIGHT = 240
const COLUMNS = 800

/** A line in a picture of traces. */
export interface Trace {
  name: string
  /** One value for each place on the axis across. */
  values: ArrayLike<number>
  /** How the line is drawn, which its key repeats. */
  line: 'solid' | 'dashed' | 'dotted' | 'thin'
}

/**
 * Draws traces over one common axis.
 *
 * @param title - what the picture shows
 * @param across - heading, kind and values of the axis, ascending
 * @param upwards - heading and kind of the traces' axis
 * @param traces - each with one value per place on the axis
 * @param under - draws beneath the traces
 * @returns the picture with its key; words where there is nothing to draw
 */
export function drawTraces(
  title: string,
  across: { heading: string; quantity: Quantity; values: ArrayLike<number> },
  upwards: { heading: string; quantity: Quantity },
  traces: Trace[],
  under: (frame: Frame) => Markup[] = () => [],
): Markup {
  const count = across.values.length
  if (count < 2) return markup`<p>${title}: nothing was recorded.</p>`
  const picture = drawFrame(
    title,
    HEIGHT,
    {
      x: { ...across, domain: [across.values[0], across.values[count - 1]] },
      y: { ...upwards, domain: findRange(traces.map((trace) => trace.values)) },
    },
    (frame) => [...under(frame), ...traces.map((trace) => drawTrace(across.values, trace, frame))],
  )
  return markup`${picture}
<p class="key">${traces.map(
    (trace) =>
      markup`<svg class="sample" viewBox="0 0 36 8"><path class="trace ${trace.line}" d="M0 4H36"/></svg> ${trace.name} `,
  )}</p>`
}

function drawTrace(x: ArrayLike<number>, trace: Trace, frame: Frame): Markup {
  const points = thinByExtremes(x, trace.values, COLUMNS).map((i) => [x[i], trace.values[i]] as const)
  return markup`<path class="trace ${trace.line}" d="${drawPath(points, frame.x, frame.y)}"/>`
}
