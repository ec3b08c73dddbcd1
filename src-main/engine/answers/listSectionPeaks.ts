import type { SectionPeaks, SensePeak } from '../../contract/result'
import { evaluatePlace, type Line } from '../line/line'
import type { RunRecord } from '../records/record'
import { listShoulders, type LineShoulder } from './listShoulders'

type Sense = 'tension' | 'compression'

/** Stresses that differ by less than this share are the same peak; the earlier one is named. */
const SAME = 1e-12
/** Share of the largest stress of a run under which another one is rounding and reads 0. */
const ROUNDING = 1e-12

/**
 * Largest tension and compression of every section with place, time, local stress and margin.
 *
 *     local  = the larger of |nominal peak| and Kt |nominal stress at the shoulder|, with the peak's sign
 *     margin = allowable / (n |local|) - 1
 *
 * where n is the factor of safety. The stress at a shoulder is that of the smaller section's face, and
 * counts in that section. `kt` is the factor of the shoulder whose local stress is largest. What is under
 * 1e-12 of the largest stress of the run is rounding: it reads 0 and has no margin.
 *
 * @param line the cut line
 * @param record what the run recorded; of it the envelope
 * @returns one row per section, in order along the line
 */
export function listSectionPeaks(line: Line, record: Pick<RunRecord, 'envelope'>): SectionPeaks[] {
  const shoulders = listShoulders(line)
  const rounding = ROUNDING * evaluateLargest(line, record)
  const rows: SectionPeaks[] = []
  for (let first = 0; first < line.spans.length;) {
    const { bar, section } = line.spans[first]
    let last = first
    while (line.spans[last + 1]?.bar === bar && line.spans[last + 1].section === section) last++
    const own = shoulders.filter((each) => each.bar === bar && each.smallerSection === section)
    rows.push({
      bar: line.rig.bars[bar].name,
      section,
      from: line.spans[first].from,
      to: line.spans[last].to,
      tension: evaluateSense(line, record, [first, last], own, 'tension', rounding),
      compression: evaluateSense(line, record, [first, last], own, 'compression', rounding),
    })
    first = last + 1
  }
  return rows
}

/** A stress without its sign [Pa], its place [m] and the step in which it is reached. */
interface Peak {
  size: number
  at: number
  step: number
}

function evaluateSense(
  line: Line,
  record: Pick<RunRecord, 'envelope'>,
  [first, last]: readonly [number, number],
  shoulders: LineShoulder[],
  sense: Sense,
  rounding: number,
): SensePeak {
  const nothing: Peak = { size: 0, at: line.spans[first].from, step: 0 }
  const nominal = keepOver(rounding, findNominal(line, record, first, last, sense), nothing)
  const shoulder = findShoulder(line, record, shoulders, sense)
  const corner = shoulder === null ? nothing : keepOver(rounding, shoulder.peak, nothing)
  const local = corner.size > nominal.size ? corner : nominal
  const allowable = line.spans[first].source.allowable[sense]
  const signed = (size: number) => (size === 0 ? 0 : sense === 'tension' ? size : -size)
  return {
    peak: signed(nominal.size),
    at: nominal.at,
    time: nominal.step * line.dt,
    kt: shoulder?.kt ?? null,
    local: signed(local.size),
    localAt: local.at,
    localTime: local.step * line.dt,
    allowable,
    margin:
      allowable === null || local.size === 0 ? null : allowable / (line.rig.factorOfSafety * local.size) - 1,
  }
}

function keepOver(rounding: number, peak: Peak, nothing: Peak): Peak {
  return peak.size > rounding ? peak : nothing
}

function readSteps({ envelope }: Pick<RunRecord, 'envelope'>, sense: Sense): Int32Array {
  return sense === 'tension' ? envelope.tensionStep : envelope.compressionStep
}

/** The shoulder with the largest local stress; null where none has a factor. */
function findShoulder(
  line: Line,
  record: Pick<RunRecord, 'envelope'>,
  shoulders: LineShoulder[],
  sense: Sense,
): { kt: number; peak: Peak } | null {
  let worst: { kt: number; peak: Peak } | null = null
  for (const { factor, span, position, x } of shoulders) {
    if (factor.kt === null) continue
    const index = record.envelope.start[span] + position
    const nominal = Math.abs(record.envelope[sense][index]) / line.spans[span].area[position]
    const peak = { size: factor.kt * nominal, at: x, step: readSteps(record, sense)[index] }
    if (worst === null || peak.size > worst.peak.size) worst = { kt: factor.kt, peak }
  }
  return worst
}

function findNominal(
  line: Line,
  record: Pick<RunRecord, 'envelope'>,
  first: number,
  last: number,
  sense: Sense,
): Peak {
  const force = record.envelope[sense]
  const steps = readSteps(record, sense)
  let best: Peak = { size: 0, at: line.spans[first].from, step: 0 }
  for (let i = first; i <= last; i++) {
    const span = line.spans[i]
    for (let p = 0; p <= span.cells; p++) {
      const position = record.envelope.start[i] + p
      const size = Math.abs(force[position]) / span.area[p]
      const larger = size > best.size * (1 + SAME)
      const earlier = size > 0 && size >= best.size * (1 - SAME) && steps[position] < best.step
      if (larger || earlier) best = { size, at: evaluatePlace(span, p), step: steps[position] }
    }
  }
  return best
}

/** Largest stress of either sense anywhere [Pa]. */
function evaluateLargest(line: Line, { envelope }: Pick<RunRecord, 'envelope'>): number {
  let largest = 0
  line.spans.forEach(({ cells, area }, i) => {
    for (let p = 0; p <= cells; p++) {
      const position = envelope.start[i] + p
      const force = Math.max(envelope.tension[position], -envelope.compression[position])
      largest = Math.max(largest, force / area[p])
    }
  })
  return largest
}
