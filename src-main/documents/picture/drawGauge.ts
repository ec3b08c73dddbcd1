import type { GaugePulse, GaugeTable } from '../../contract/result'
import { markup, type Markup } from '../markup'
import type { Frame } from './drawFrame'
import { round } from './drawPath'
import { drawTraces } from './drawTraces'
import { findOverlaps } from './findOverlaps'
import { mergeStretches } from './mergeStretches'

/** Height of the bars along the edges. */
const BAR = 4

/**
 * Draws what a gauge has read: the force and the two waves that make it, the passing pulses as bars along
 * the edges, and hatching where opposite waves overlap.
 *
 * @param gauge - SI
 * @returns the picture with its key
 */
export function drawGauge(gauge: GaugeTable): Markup {
  return drawTraces(
    `Force at gauge ${gauge.name}`,
    { heading: 'time', quantity: 'time', values: gauge.t },
    { heading: 'force', quantity: 'force' },
    [
      { name: 'rightgoing wave (bar along the top edge)', values: gauge.rightgoingForce, line: 'dashed' },
      { name: 'leftgoing wave (bar along the bottom edge)', values: gauge.leftgoingForce, line: 'dotted' },
      { name: 'force; hatched while opposite waves overlap', values: gauge.force, line: 'solid' },
    ],
    (frame) => [
      drawOverlaps(gauge.pulses, frame),
      drawBars(gauge.pulses, 'right', frame.top, frame),
      drawBars(gauge.pulses, 'left', frame.top + frame.height - BAR, frame),
    ],
  )
}

/** Time that one unit of the picture stands for, below which nothing can be told apart. */
function evaluateUnit({ x, width }: Frame): number {
  return (x.to - x.from) / width
}

function drawBars(
  pulses: GaugePulse[],
  direction: GaugePulse['direction'],
  top: number,
  frame: Frame,
): Markup {
  const own = pulses.filter((pulse) => pulse.direction === direction)
  return markup`${mergeStretches(own, evaluateUnit(frame)).map(({ from, to }) => {
    const left = round(frame.x.place(from))
    return markup`<rect class="pulse" x="${left}" y="${top}" width="${round(frame.x.place(to) - left)}" height="${BAR}"/>`
  })}`
}

function drawOverlaps(pulses: GaugePulse[], frame: Frame): Markup {
  const { x, top, height } = frame
  let hatching = ''
  for (const { from, to } of mergeStretches(findOverlaps(pulses), evaluateUnit(frame))) {
    const right = x.place(to)
    for (let place = x.place(from); place < right; place += 6)
      hatching += `M${round(place)} ${top + height}v${-height}`
  }
  return hatching === '' ? markup`` : markup`<path class="overlap" d="${hatching}"/>`
}
