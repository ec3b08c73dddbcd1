import type { Caution } from '../../../contract/result'
import { evaluatePlace, type Line, type Span } from '../../line/line'
import type { FieldRecord, RunRecord } from '../../records/record'
import { describeQuantity } from './describeQuantity'
import { joinPlaces } from './joinPlaces'

/**
 * A caution for bars whose compression is over the Euler load for longer than bending needs to grow.
 *
 *     Euler load, pinned ends:  P_E = pi^2 E I/L^2, L the bar's length
 *     growth of a bend by e in: 1/sqrt(k^2 (P - E I k^2)/(rho A)), k^2 = the larger of P/(2 E I) and (pi/L)^2
 *
 * A rough bound: straight bar, its least E I, the largest force anywhere, the longest time that one place
 * is compressed to more than half the peak, read off the field. A pulse much shorter than the growth time
 * passes before the bar can bend. Source: Lindberg and Florence, Dynamic Pulse Buckling (1987) (from memory).
 *
 * @param line the cut line
 * @param record of the run; its envelope and its field
 */
export function listBucklingCautions(line: Line, record: Pick<RunRecord, 'envelope' | 'field'>): Caution[] {
  const found = line.bars.flatMap((bar, b) => {
    const force = findLargestCompression(line, record, b)
    const length = bar.to - bar.from
    const { EI, perLength } = findWeakest(line.spans.slice(bar.firstSpan, bar.lastSpan + 1))
    const euler = (Math.PI ** 2 * EI) / length ** 2
    if (force.size <= euler) return []
    const square = Math.max(force.size / (2 * EI), (Math.PI / length) ** 2)
    const growth = 1 / Math.sqrt((square * (force.size - EI * square)) / perLength)
    const lasting = evaluateLongest(record.field, line.dt, force.x, -force.stress / 2)
    return lasting > growth ? [{ name: bar.name, force: force.size, euler, growth, lasting }] : []
  })
  if (found.length === 0) return []
  const worst = found.reduce((one, other) =>
    other.lasting / other.growth > one.lasting / one.growth ? other : one,
  )
  return [
    {
      code: 'buckling',
      message:
        `${worst.name} may buckle: ${describeQuantity(worst.force, 'force')} of compression is over its Euler load of ` +
        `${describeQuantity(worst.euler, 'force')} (pinned ends) and lasts about ${describeQuantity(worst.lasting, 'time')}, ` +
        `longer than the ${describeQuantity(worst.growth, 'time')} in which a small bend grows by 2.7. Guide the bar or shorten it.`,
      where: joinPlaces(found.map(({ name }) => name)),
    },
  ]
}

/** The largest compression of a bar as a positive force, with its place and stress. */
function findLargestCompression(
  line: Line,
  record: Pick<RunRecord, 'envelope'>,
  bar: number,
): { size: number; stress: number; x: number } {
  let largest = { size: 0, stress: 0, x: 0 }
  for (let i = line.bars[bar].firstSpan; i <= line.bars[bar].lastSpan; i++) {
    const span = line.spans[i]
    for (let p = 0; p <= span.cells; p++) {
      const size = -record.envelope.compression[record.envelope.start[i] + p]
      if (size > largest.size * (1 + 1e-9))
        largest = { size, stress: size / span.area[p], x: evaluatePlace(span, p) }
    }
  }
  return largest
}

/** The least bending stiffness [N m^2] of a bar's faces and the mass per length there [kg/m]. */
function findWeakest(spans: Span[]): { EI: number; perLength: number } {
  const faces = spans.flatMap(({ source: { shape, material }, sFrom, sTo }) =>
    [sFrom, sTo].map((s) => ({
      EI: material.modulus * (Math.PI / 64) * (shape.diameter(s) ** 4 - shape.bore(s) ** 4),
      perLength: material.density * shape.area(s),
    })),
  )
  return faces.reduce((one, other) => (other.EI < one.EI ? other : one))
}

/** Longest time [s] in one go that the field's nearest place spends under a stress. */
function evaluateLongest(field: FieldRecord, dt: number, x: number, under: number): number {
  let column = 0
  for (let i = 1; i < field.x.length; i++)
    if (Math.abs(field.x[i] - x) < Math.abs(field.x[column] - x)) column = i
  let longest = 0
  let since: number | null = null
  for (let row = 0; row < field.step.length; row++) {
    if (field.stress[row][column] >= under) since = null
    else {
      since ??= field.step[row]
      longest = Math.max(longest, (field.step[row] - since) * dt)
    }
  }
  return longest
}
