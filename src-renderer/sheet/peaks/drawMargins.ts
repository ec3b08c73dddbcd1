import type { PageResult } from '../../../src-main/contract/bridge'
import { formatMargin } from '../../format/formatMargin'
import { placeLabels, type Box, type Label } from '../../plot/placeLabels'
import type { Plot } from '../charts/frameSpec'
import { writeFont, type Inks } from '../charts/inks'
import { SIDE } from './drawBounds'
import type { Bound } from './listBounds'

/** The margin of one section in one sense. */
interface MarginLabel {
  /** What it is of, in lighter ink. */
  name: string
  figure: string
  negative: boolean
  governs: boolean
  from: number
  to: number
  /** Where it is reached [m]. */
  at: number
  sense: 'tension' | 'compression'
}

/** Room around the words of a label, and between the heights that are tried for it [px]. */
const EDGE = 4
const ROW = 5

/**
 * Writes the margin of each section, tension above and compression below zero; the governing one boxed and
 * larger, negative ones as ink blocks. What finds no room is left to the table.
 *
 * @param plot - drawn into
 * @param result - of the run
 * @param bounds - drawn in it, which no margin may cover
 * @param inks - of the drawing
 */
export function drawMargins(plot: Plot, result: PageResult, bounds: readonly Bound[], inks: Inks): void {
  const { context, x, y, area } = plot
  const labels = listLabels(result).sort(
    (a, b) => Number(b.governs) - Number(a.governs) || Number(b.negative) - Number(a.negative),
  )
  const taken: Box[] = bounds.map(({ from, to, stress }) => {
    const at = y.at(stress)
    return {
      left: x.at(from),
      right: x.at(to),
      top: at - (stress > 0 ? SIDE : 2),
      bottom: at + (stress > 0 ? 2 : SIDE),
    }
  })
  for (const label of labels) {
    const left = Math.max(area.left, x.at(label.from))
    const right = Math.min(area.right, x.at(label.to))
    if (right - left < 2) continue
    const size = label.governs ? inks.size + 3 : inks.size + 1
    const height = size + 5
    for (const name of label.name === '' ? [''] : [label.name, '']) {
      context.font = writeFont(size)
      const before = name === '' ? 0 : context.measureText(`${name} `).width
      context.font = writeFont(size, label.governs || label.negative ? 600 : 400)
      const width = before + context.measureText(label.figure).width + 2 * EDGE
      const room = label.governs || label.negative ? area : { ...area, left, right }
      const [placed] = placeLabels(
        [{ text: label.figure, width, height, places: listPlaces(label, width) }],
        room,
        taken,
      )
      if (!placed) continue
      const box = {
        left: placed.x - width / 2,
        right: placed.x + width / 2,
        top: placed.y - height / 2,
        bottom: placed.y + height / 2,
      }
      taken.push(box)
      drawLabel(context, label, name, before, box, size, inks)
      break
    }

    function listPlaces({ sense, governs, negative, at }: MarginLabel, width: number): Label['places'] {
      const middle = (left + right) / 2
      const zero = Math.min(area.bottom, Math.max(area.top, y.at(0)))
      const far = sense === 'tension' ? area.top + height / 2 + 3 : area.bottom - height / 2 - 3
      const count = Math.max(1, Math.floor(Math.abs(zero - far) / ROW))
      const rows = Array.from({ length: count }, (_none, i) => far + Math.sign(zero - far) * ROW * i)
      const inside = [middle, left + (right - left) / 4, right - (right - left) / 4]
      const beside = [1, 2, 3].flatMap((n) => [right + n * (width / 2 + EDGE), left - n * (width / 2 + EDGE)])
      // A negative margin is never left out: where its section is too narrow it stands beside it.
      const leader = x.at(at)
      const near = [leader + width / 2 + 10, leader - width / 2 - 10]
      const isNarrow = right - left < width
      const columns = governs
        ? [...near, ...beside, middle]
        : negative && isNarrow
          ? [...beside, middle]
          : inside
      if (negative) columns.push(...beside)
      return columns.flatMap((column) => rows.map((row) => ({ x: column, y: row })))
    }
  }
}

function drawLabel(
  context: CanvasRenderingContext2D,
  { figure, negative, governs }: MarginLabel,
  name: string,
  before: number,
  { left, right, top, bottom }: Box,
  size: number,
  inks: Inks,
): void {
  context.save()
  context.fillStyle = negative ? inks.ink : inks.paper
  context.globalAlpha = negative || governs ? 1 : 0.8
  context.fillRect(left, top, right - left, bottom - top)
  context.globalAlpha = 1
  if (governs) {
    context.strokeStyle = inks.ink
    context.lineWidth = 1.5
    context.strokeRect(left, top, right - left, bottom - top)
  }
  context.textAlign = 'left'
  context.textBaseline = 'middle'
  const middle = (top + bottom) / 2 + 0.5
  context.font = writeFont(size)
  context.fillStyle = negative ? inks.paper : inks.unit
  if (name !== '') context.fillText(`${name} `, left + EDGE, middle)
  context.font = writeFont(size, governs || negative ? 600 : 400)
  context.fillStyle = negative ? inks.paper : inks.ink
  context.fillText(figure, left + EDGE + before, middle)
  context.restore()
}

function listLabels({ sections, governing }: PageResult): MarginLabel[] {
  return sections.flatMap(({ bar, section, from, to, ...peaks }) => {
    const alone = sections.filter((it) => it.bar === bar).length === 1
    return (['tension', 'compression'] as const).flatMap((sense) => {
      const { margin } = peaks[sense]
      if (margin === null) return []
      const governs = governing?.bar === bar && governing.section === section && governing.sense === sense
      return [
        {
          name: alone ? bar : String(section + 1),
          figure: formatMargin(margin),
          negative: margin < 0,
          governs,
          from,
          to,
          at: peaks[sense].localAt,
          sense,
        },
      ]
    })
  })
}
