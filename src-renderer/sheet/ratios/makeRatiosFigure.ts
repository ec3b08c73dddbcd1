import type { Figure, FigureWord } from '../charts/figure'
import type { Inks } from '../charts/inks'
import { drawWaves } from './drawWaves'
import type { StepView } from './findStep'
import { writeShare } from './writeShare'

const WIDTH = 320
const NAMES = 88
const EDGE = 12
const COLUMN = (WIDTH - NAMES - EDGE) / 4

/**
 * Makes a picture of what a step does to waves, with its numbers.
 *
 * @param title - of the rig
 * @param step - shown
 * @param inks - of the drawing
 */
export function makeRatiosFigure(title: string, step: StepView, inks: Inks): Figure {
  const line = inks.size + 7
  const words: FigureWord[] = [
    { text: title, x: EDGE, y: 20, strong: true, size: inks.size + 3 },
    { text: step.name, x: EDGE, y: 42, strong: true },
  ]
  step.rows.forEach(({ name, strong, signed, fromLeft, fromRight }, row) => {
    const y = 42 + line * (row + 1)
    words.push({ text: name, x: EDGE, y, quiet: true })
    const shares = [fromLeft.reflected, fromLeft.transmitted, fromRight.transmitted, fromRight.reflected]
    shares.forEach((share, i) => {
      const text = writeShare(share, signed && (i === 0 || i === 3))
      words.push({ text, x: NAMES + (i + 1) * COLUMN, y, strong, align: 'right' })
    })
  })
  const top = 42 + line * (step.rows.length + 0.6)
  const box = { left: NAMES, top, width: WIDTH - NAMES - EDGE, height: 72 }
  for (const [text, share] of [
    ['from the left', 0.25],
    ['from the right', 0.75],
  ] as const) {
    words.push({
      text,
      x: box.left + share * box.width,
      y: top + box.height + line,
      align: 'center',
      quiet: true,
    })
  }
  return {
    title: `${title}: ${step.name}`,
    width: WIDTH,
    height: top + box.height + line + EDGE,
    parts: [],
    words,
    draw: (context) => drawWaves(context, step.picture, step.isTaper, box, inks),
    inks,
  }
}
