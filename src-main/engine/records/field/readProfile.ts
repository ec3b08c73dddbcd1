import type { Profile, ProfileRequest } from '../../../contract/bridge'
import type { Line } from '../../line/line'
import type { FieldSpan } from './fieldSpan'
import { findColumn, findRow } from './sampleField'
import { makeSpanPlace } from './spanPlace'

/** Force [N] and velocity in the falling frame [m/s] at a place. */
interface Motion {
  force: number
  velocity: number
}

/**
 * Reads the quantities along the line at one time, at the middles of equal columns.
 *
 * @param field the line's spans in order, and the steps from one sample to the next
 * @param t [s]; outside the run every value is NaN
 * @param part of the line [m]; outside the line every value is NaN, and a face belongs to what is left of it
 */
export function readProfile(
  field: { line: Line; spans: readonly FieldSpan[]; stride: number },
  t: number,
  columns: number,
  part: ProfileRequest['part'] = { fromX: 0, toX: field.line.length },
): Profile {
  const { line, spans, stride } = field
  const empty = () => new Float64Array(columns).fill(NaN)
  const profile: Profile = {
    x: empty(),
    stress: empty(),
    force: empty(),
    velocity: empty(),
    energy: empty(),
    strain: empty(),
    rightgoing: empty(),
    leftgoing: empty(),
  }
  const k = t / line.dt
  let index = 0
  for (let i = 0; i < columns; i++) {
    const x = part.fromX + ((i + 0.5) * (part.toX - part.fromX)) / columns
    profile.x[i] = x
    if (!(k >= 0 && k <= line.steps && x >= 0 && x <= line.length)) continue
    while (index < line.spans.length - 1 && x > line.spans[index].to) index++
    const span = line.spans[index]
    const p = Math.min(span.cells, ((x - span.from) / (span.to - span.from)) * span.cells)
    const { area, impedance: Z, modulus } = makeSpanPlace(span, Math.round(p))
    const { force, velocity } = readMotion(spans[index], p, k, Z, stride, span.cells)
    profile.force[i] = force
    profile.stress[i] = force / area
    profile.strain[i] = force / (area * modulus)
    const ground = velocity + line.rig.gravity * line.dt * k
    profile.velocity[i] = ground
    profile.energy[i] = (force * force + Z * ground * (Z * ground)) / (2 * modulus * area * area)
    profile.rightgoing[i] = (force - Z * velocity) / 2
    profile.leftgoing[i] = (force + Z * velocity) / 2
  }
  return profile
}

/** The values at the nearest position and step, or those of the nearest sample that are largest in size. */
function readMotion(span: FieldSpan, p: number, k: number, Z: number, stride: number, cells: number): Motion {
  if ('waves' in span) {
    const [step, position] = [Math.round(k), Math.round(p)]
    const f = span.waves.right.wave[step - position + cells]
    const g = span.waves.left.wave[step + position]
    return { force: f + g, velocity: (g - f) / Z }
  }
  const { columns, force, velocity } = span.sampled
  const last = force.high.length / columns - 1
  const row = Math.min(last, Math.max(0, Math.round(findRow(k, stride))))
  const i = row * columns + Math.round(findColumn(p, cells, columns))
  const larger = (high: number, low: number) => (high >= -low ? high : low)
  return {
    force: larger(force.high[i], force.low[i]),
    velocity: larger(velocity.high[i], velocity.low[i]),
  }
}
