import type { Figure, FigureWord } from '../charts/figure'
import type { FrameSpec } from '../charts/frameSpec'
import type { Ruler } from '../field/useRulers'

/** Room above for the title, and below for the ruler [px]. */
const TOP = 48
const BOTTOM = 32
const EDGE = 12

/**
 * Makes a picture of the peaks that stands by itself: with title and a ruler of x.
 *
 * @param title - of the rig
 * @param spec - the chart, as on the sheet
 * @param ruler - of x
 * @param words - what stands under its name
 */
export function makePeaksFigure(
  title: string,
  spec: FrameSpec,
  ruler: Ruler,
  words: { head: string[] },
): Figure {
  const { inks, x, pads, width, height } = spec
  const plot = width - pads.left - pads.right
  const under = TOP + height + inks.size + 5
  const list: FigureWord[] = [
    { text: title, x: EDGE, y: 20, strong: true, size: inks.size + 3 },
    { text: `Largest tension and compression, ${words.head.join(' ')}`, x: EDGE, y: 38, quiet: true },
    { text: `x, ${ruler.unit}`, x: EDGE + width - pads.right + 8, y: under, quiet: true },
  ]
  for (const tick of ruler.ticks.major) {
    const at = EDGE + pads.left + ((tick * ruler.size - x.from) / (x.to - x.from)) * plot
    list.push({ text: ruler.writeTick(tick), x: at, y: under, align: 'center', quiet: true })
  }
  return {
    title: `${title}: peaks`,
    width: width + 2 * EDGE,
    height: TOP + height + BOTTOM,
    parts: [{ spec, left: EDGE, top: TOP }],
    words: list,
    inks,
  }
}
