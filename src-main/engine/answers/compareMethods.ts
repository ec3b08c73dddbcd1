import type { Comparison } from '../../contract/result'
import { evaluatePlace, type Line } from '../line/line'
import type { PlaceTrace, RunRecord } from '../records/record'

/** Difference of the envelopes up to which the methods count as one. */
const AGREE = 0.01

/** Difference under which the methods are equal but for rounding. */
const ROUNDING = 1e-12

/** What one method made of a rig. */
export interface MethodRecord {
  line: Line
  record: Pick<RunRecord, 'envelope' | 'gauges'>
}

/**
 * Compares what the two methods made of one rig: the stress envelopes position by position, and the
 * gauges' stresses at the times of the first, the second's taken between its own times.
 *
 * @param waves by characteristics
 * @param elements with elements, on the same cells
 */
export function compareMethods(waves: MethodRecord, elements: MethodRecord): Comparison {
  const envelope = compareEnvelopes(waves, elements)
  return {
    ...envelope,
    gauges: waves.line.rig.gauges.map(({ name }, i) => ({
      name,
      ...compareTraces(waves, elements, waves.record.gauges[i], elements.record.gauges[i]),
    })),
    verdict: judge(waves.line, envelope.envelope),
  }
}

function compareEnvelopes(
  waves: MethodRecord,
  elements: MethodRecord,
): Pick<Comparison, 'envelope' | 'envelopeAt' | 'envelopeSense'> {
  const one = waves.record.envelope
  const other = elements.record.envelope
  let scale = 0
  let largest = 0
  let envelopeAt = 0
  let envelopeSense: Comparison['envelopeSense'] = 'tension'
  waves.line.spans.forEach((span, s) => {
    for (let p = 0; p <= span.cells; p++) {
      const i = one.start[s] + p
      for (const sense of ['tension', 'compression'] as const) {
        const stress = one[sense][i] / span.area[p]
        const difference = Math.abs(other[sense][i] / span.area[p] - stress)
        scale = Math.max(scale, Math.abs(stress))
        if (difference <= largest) continue
        largest = difference
        envelopeAt = evaluatePlace(span, p)
        envelopeSense = sense
      }
    }
  })
  return { envelope: scale > 0 ? largest / scale : 0, envelopeAt, envelopeSense }
}

function compareTraces(
  waves: MethodRecord,
  elements: MethodRecord,
  one: PlaceTrace,
  other: PlaceTrace,
): { largest: number; rootMeanSquare: number } {
  const pace = waves.line.dt / elements.line.dt
  let scale = 0
  let largest = 0
  let sum = 0
  one.force.forEach((force, k) => {
    const at = Math.min(k * pace, other.force.length - 1)
    const before = Math.floor(at)
    const after = Math.min(before + 1, other.force.length - 1)
    const there = other.force[before] + (at - before) * (other.force[after] - other.force[before])
    const difference = Math.abs(there - force)
    scale = Math.max(scale, Math.abs(force))
    largest = Math.max(largest, difference)
    sum += difference * difference
  })
  if (scale === 0) return { largest: 0, rootMeanSquare: 0 }
  return { largest: largest / scale, rootMeanSquare: Math.sqrt(sum / one.force.length) / scale }
}

function judge(line: Line, envelope: number): string {
  const share = `${envelope < ROUNDING ? 0 : Number((100 * envelope).toPrecision(2))} %`
  const { run, bars } = line.rig
  const materials = bars.flatMap((bar) => bar.sections.map((section) => section.material))
  const plastic = materials.some((one) => one.yield !== null && one.hardening !== null)
  const further = run.finiteStrain || run.lateralInertia || materials.some((one) => (one.viscosity ?? 0) > 0)
  if (plastic || further) {
    return (
      `The envelopes differ by up to ${share} of the largest stress. The elements follow the laws that the ` +
      'rig asks for beyond small elastic strain, the characteristics do not: trust the elements where these ' +
      'laws matter, and read the difference as what they change.'
    )
  }
  if (envelope <= AGREE) {
    return `The two methods agree within ${share} of the largest stress: trust either.`
  }
  return (
    `The envelopes differ by up to ${share} of the largest stress. Both solve the same linear equations: trust ` +
    'the characteristics, which carry sharp fronts exactly, and expect elements to ring or to round off where ' +
    'a front is shorter than a few cells. If the difference does not fall with a finer cell, trust neither.'
  )
}
