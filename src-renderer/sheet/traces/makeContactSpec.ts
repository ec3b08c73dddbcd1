import { drawHaloText } from '../../plot/haloText'
import type { FrameSpec } from '../charts/frameSpec'
import { writeFont } from '../charts/inks'
import { listColourStops } from './colourStops'
import { writeDuration } from './describeWindow'
import type { Stretch } from './pulseWindow'
import { makeDimension, makeLine, makeTraceSpec, type TraceFrame } from './traceFrame'
import { thinPoints } from './thinPoints'

/** Force in a joint as it was read for the sheet. */
export interface JointTrace {
  /** [s], shape (n) */
  t: Float64Array
  /** [N], tension positive, shape (n) */
  force: Float64Array
}

/**
 * Describes the chart of a joint: the force that it carries, and its first whole contact as a dimension line.
 *
 * @param trace - in the range of time that is shown
 * @param contact - the one whose duration is shown, whole [s]; null for none
 * @param peak - force of largest magnitude in the whole run, so that the axis stays as it is under zoom [N]
 * @param frame - shared by all traces
 * @param width - of the plot [px]
 * @param frozen - the same joint of a run laid under; null for none
 */
export function makeContactSpec(
  trace: JointTrace,
  contact: Stretch | null,
  peak: number,
  frame: TraceFrame,
  width: number,
  frozen: JointTrace | null,
): FrameSpec {
  const { fromT, toT, height, inks } = frame
  let low = Math.min(0, peak)
  let high = Math.max(0, peak)
  for (const { force } of frozen ? [trace, frozen] : [trace]) {
    for (const value of force) {
      low = Math.min(low, value)
      high = Math.max(high, value)
    }
  }
  const limit = Math.max(-low, high) || 1
  const room = 0.3 * limit
  const ends: [number, number] = [
    low < 0 || high === 0 ? low - room || -limit : -0.08 * limit,
    high > 0 ? high + room : 0.08 * limit,
  ]
  const spec = makeTraceSpec(frame, width, ends, 'force', 3)
  const points = thinPoints(trace.t, trace.force, frame)
  spec.curves.push({ points, colour: inks.ink, width: 1.5 })
  if (frozen) {
    spec.curves.push({
      points: thinPoints(frozen.t, frozen.force, frame),
      colour: inks.unit,
      width: 1,
      dash: [4, 2],
    })
  }
  const colour = listColourStops(points, fromT, toT, inks.map, 1.4 * limit)
  spec.curves.push({ points, colour: 'transparent', width: 0, fill: { to: 'zero', colour } })
  spec.annotations.push(makeLine({ x: 0 }, inks))

  if (contact) {
    const pixels = ((contact.to - contact.from) * height) / (toT - fromT)
    const beside = low < 0 ? low - 0.5 * room : high + 0.5 * room
    spec.annotations.push(makeDimension(beside, contact.from, contact.to, '', pixels, inks))
    spec.above = ({ context, y, area }) => {
      const at = y.at(contact.to) - inks.size / 2 - 3
      if (at - inks.size / 2 < area.top || y.at(contact.to) > area.bottom) return
      drawHaloText(context, writeDuration(contact.to - contact.from), area.left + 4, at, {
        font: writeFont(inks.size, 600),
        ink: inks.ink,
        halo: inks.paper,
        align: 'left',
      })
    }
  }
  return spec
}
