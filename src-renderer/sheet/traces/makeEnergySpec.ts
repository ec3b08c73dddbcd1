import { drawHaloText } from '../../plot/haloText'
import { drawHatch } from '../../plot/hatching'
import { findFrom } from '../../plot/thinTrace'
import type { FrameSpec, Plot } from '../charts/frameSpec'
import { writeFont, type Inks } from '../charts/inks'
import type { EnergyShares } from './energyShares'
import { makeTraceSpec, type TraceFrame } from './traceFrame'
import { thinPoints } from './thinPoints'

/** How each share is told from its neighbours without colour. */
const HATCHES = {
  kinetic: { gap: 4, lean: 'rising' },
  strain: { gap: 9, lean: 'falling' },
  lost: { gap: 3, lean: 'falling' },
  'to come': null,
} as const

/** The stack's edge stands at 1; a little room beyond it shows on which side it strays [1]. */
const END = 1.08

/**
 * Describes the chart of the energy: its shares stacked across, so that their edge is straight where energy
 * is kept.
 *
 * @param shares - of the run
 * @param frame - shared by all traces
 * @param width - of the plot [px]
 * @param frozen - shares of a run laid under; null for none
 */
export function makeEnergySpec(
  shares: EnergyShares,
  frame: TraceFrame,
  width: number,
  frozen: EnergyShares | null,
): FrameSpec {
  const { inks } = frame
  const spec = makeTraceSpec(frame, width, [0, END], 'ratio', 2)
  spec.x.grid = []
  const bands = shares.bands.map(({ name, edge }) => ({ name, points: thinPoints(shares.t, edge, frame) }))
  bands.forEach(({ points }, i) => {
    const last = i === bands.length - 1
    spec.curves.push({ points, colour: inks.ink, width: last ? 2 : 1 })
  })
  for (const { edge } of frozen?.bands ?? []) {
    spec.curves.push({
      points: thinPoints(frozen!.t, edge, frame),
      colour: inks.unit,
      width: 1,
      dash: [4, 2],
    })
  }
  spec.below = (plot) => {
    const { context } = plot
    bands.forEach(({ name, points }, i) => {
      const hatch = HATCHES[name as keyof typeof HATCHES]
      if (!hatch) return
      context.save()
      clipBand(plot, points, bands[i - 1]?.points)
      drawHatch(context, plot.area, { ...hatch, width: 1, colour: inks.unit })
      context.restore()
    })
  }
  spec.above = (plot) => nameBands(plot, shares, inks)
  return spec
}

function clipBand({ context, x, y }: Plot, edge: [number, number][], before?: [number, number][]): void {
  const first = edge[0]
  const last = edge.at(-1)
  if (!first || !last) return
  const inner = before ?? [
    [0, first[1]],
    [0, last[1]],
  ]
  context.beginPath()
  for (const [share, t] of edge) context.lineTo(x.at(share), y.at(t))
  for (const [share, t] of inner.toReversed()) context.lineTo(x.at(share), y.at(t))
  context.closePath()
  context.clip()
}

/** Writes each share's name where it is widest, upright where it is too narrow to lie. */
function nameBands({ context, x, y, area }: Plot, { t, bands }: EnergyShares, inks: Inks): void {
  const style = { font: writeFont(inks.size), ink: inks.ink, halo: inks.paper } as const
  const taken: number[] = []
  bands.forEach(({ name, edge }, band) => {
    const inner = band === 0 ? null : bands[band - 1].edge
    let widest = { width: 0, at: 0, row: 0 }
    for (let row = area.top + 40; row < area.bottom - 40; row += 4) {
      const i = Math.min(t.length - 1, findFrom(t, y.valueAt(row)))
      const [from, to] = [x.at(inner ? inner[i] : 0), x.at(edge[i])]
      const isFree = taken.every((other) => Math.abs(other - row) > 60)
      if (isFree && to - from > widest.width) widest = { width: to - from, at: (from + to) / 2, row }
    }
    if (widest.width < inks.size + 2) return
    taken.push(widest.row)
    context.save()
    context.translate(widest.at, widest.row)
    context.rotate(-Math.PI / 2)
    drawHaloText(context, name, 0, 0, style)
    context.restore()
  })
}
