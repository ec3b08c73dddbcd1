import type { GaugePulse, GaugeTable } from '../../contract/result'
import { markup, type Markup } from '../markup'
import type { Frame } from './drawFrame'
import { round } from './drawPath'
import { drawTraces } from './drawTraces'

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
    (frame) => gauge.pulses.map((pulse) => drawPulse(pulse, gauge.pulses, frame)),
  )
}

function drawPulse(pulse: GaugePulse, pulses: GaugePulse[], frame: Frame): Markup {
  const left = round(frame.x.place(pulse.from))
  const width = round(frame.x.place(pulse.to) - left)
  const rightward = pulse.direction === 'right'
  const top = rightward ? frame.top : frame.top + frame.height - 4
  const overlaps = rightward ? pulses.filter((other) => other.direction === 'left') : []
  return markup`${overlaps.map((other) => drawOverlap(pulse, other, frame))}<rect class="pulse" x="${left}" y="${top}" width="${width}" height="4"/>`
}

function drawOverlap(pulse: GaugePulse, other: GaugePulse, { x, top, height }: Frame): Markup {
  const from = Math.max(pulse.from, other.from)
  const to = Math.min(pulse.to, other.to)
  if (from >= to) return markup``
  const left = round(x.place(from))
  const right = round(x.place(to))
  let hatching = ''
  for (let place = left; place < right; place += 6) hatching += `M${round(place)} ${top + height}v${-height}`
  return markup`<path class="overlap" d="${hatching}"/>`
}
