import { formatQuantity } from '../../format/formatQuantity'
import type { UnitSystem } from '../../format/units'
import type { Figure, FigureWord } from '../charts/figure'
import type { FrameSpec } from '../charts/frameSpec'
import type { Ruler } from '../field/useRulers'
import type { TraceItem } from './traceItem'

/** Room around the traces: the title and their heads above, the ruler of time at the left [px]. */
const TOP = 88
const LEFT = 52
const EDGE = 12

/**
 * Puts traces together as a picture that stands by itself: with title, heads and a ruler of time.
 *
 * @param title - of the rig
 * @param columns - the traces, as laid on the sheet
 * @param moment - at which their values are written [s]; null for none
 * @param ruler - of time
 * @param units - the reader's
 */
export function makeTracesFigure(
  title: string,
  columns: readonly { item: TraceItem; left: number; width: number; spec: FrameSpec }[],
  moment: number | null,
  ruler: Ruler,
  units: UnitSystem,
): Figure {
  const { spec } = columns[0]
  const { inks, y } = spec
  const start = columns[0].left
  const end = columns.at(-1)!
  const words: FigureWord[] = [{ text: title, x: EDGE, y: 20, strong: true, size: inks.size + 3 }]
  const column = inks.size + 5
  for (const { item, left, width: room } of columns) {
    const x = LEFT + left - start
    words.push({ text: `${item.name} ${item.where}`, x, y: TOP - 2 * column - 8, strong: true, room })
    const value = formatQuantity(moment === null ? null : item.at(moment), item.dimension, units)
    words.push({ text: `${value.text} ${value.unit}`, x, y: TOP - column - 8, room })
    words.push({
      text: item.note.text,
      x,
      y: TOP - 8,
      strong: item.note.alarm,
      quiet: !item.note.alarm,
      room,
    })
  }
  const plot = spec.height - spec.pads.bottom
  const at = (t: number): number => TOP + plot - ((t - y.from) / (y.to - y.from)) * plot
  for (const tick of ruler.ticks.major) {
    const x = LEFT - 8
    words.push({
      text: ruler.writeTick(tick),
      x,
      y: at(tick * ruler.size) + inks.size / 3,
      align: 'right',
      quiet: true,
    })
  }
  words.push({ text: `t, ${ruler.unit}`, x: LEFT - 8, y: TOP - 8, align: 'right', quiet: true })
  if (moment !== null) {
    const now = formatQuantity(moment, 'time', units)
    words.push({
      text: `values at t ${now.text} ${now.unit}`,
      x: LEFT,
      y: TOP + spec.height + 16,
      quiet: true,
    })
  }
  return {
    title: `${title}: ${columns.map(({ item }) => item.name).join(', ')}`,
    width: LEFT + end.left + end.width - start + EDGE,
    height: TOP + spec.height + 28,
    parts: columns.map(({ spec: part, left }) => ({
      spec: part,
      left: LEFT + left - start - part.pads.left,
      top: TOP,
    })),
    words,
    inks,
  }
}
