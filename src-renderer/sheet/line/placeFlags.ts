import type { LineDrawing } from '../../../src-main/contract/lineDrawing'
import { measureText } from '../../format/measureText'
import { listSections } from './listParts'
import type { LineScale } from './makeLineScale'

/** A gauge's flag as it is drawn. */
export interface Flag {
  path: string
  name: string
  /** Along the line [m] and [px]. */
  place: number
  x: number
  /** Top of the bar there [px]. */
  edge: number
  lean: -1 | 1
  /** Width that it may take, and that it takes [px]. */
  room: number
  width: number
}

/**
 * Places the flags of gauges: to the right, to the left where the next gauge or the edge leaves no room.
 *
 * @param line - with its gauges
 * @param scale - of the drawing
 * @param size - of the type [px]
 * @returns the flags in sight, from the left
 */
export function placeFlags(line: LineDrawing, scale: LineScale, size: number): Flag[] {
  const gauges = line.gauges
    .map(({ path, name, x }) => ({ path, name, place: x, x: scale.x(x) }))
    .filter(({ x }) => x >= scale.left - 0.5 && x <= scale.right + 0.5)
    .sort((a, b) => a.x - b.x)
  let taken = scale.left
  return gauges.map((gauge, i) => {
    const wanted = measureText(gauge.name, size, true) + 14
    const rightRoom = (gauges[i + 1]?.x ?? scale.right) - gauge.x - 4
    const leftRoom = gauge.x - taken - 4
    const lean = rightRoom >= wanted || rightRoom >= leftRoom ? 1 : -1
    const room = lean === 1 ? rightRoom : leftRoom
    const width = Math.min(wanted, Math.max(room, 24))
    taken = lean === 1 ? gauge.x + width : gauge.x
    return { ...gauge, edge: scale.centre - scale.half(findDiameterAt(line, gauge.place)), lean, room, width }
  })
}

function findDiameterAt(line: LineDrawing, x: number): number {
  const found = listSections(line).find(({ section }) => x >= section.from && x <= section.to)
  if (!found) return 0
  const { outline } = found.section
  const next = Math.max(
    1,
    outline.findIndex(([at]) => at >= x),
  )
  const [x0, d0] = outline[next - 1]
  const [x1, d1] = outline[next] ?? outline[next - 1]
  return x1 === x0 ? d0 : d0 + ((d1 - d0) * (x - x0)) / (x1 - x0)
}
