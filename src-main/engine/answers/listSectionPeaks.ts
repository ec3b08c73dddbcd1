import type { SectionPeaks, SensePeak } from '../../contract/result'
import { evaluatePlace, type Line } from '../line/line'
import type { RunRecord } from '../records/record'
import { listShoulders, type LineShoulder } from './listShoulders'

type Sense = 'tension' | 'compression'

/** Stresses that differ by less than this share are the same peak; the earlier one is named. */
const SAME = 1e-12

/**
 * Largest tension and compression of every section with place, time, local stress and margin.
 *
 *     local  = the larger of |nominal peak| and Kt |nominal stress at the shoulder|, with the peak's sign
 *     margin = allowable / (n |local|) - 1
 *
 * where n is the factor of safety. The stress at a shoulder is that of the smaller section's face, and
 * counts in that section. `kt` is the factor of the shoulder whose local stress is largest.
 *
 * @param line the cut line
 * @param record what the run recorded; of it the envelope
 * @returns one row per section, in order along the line
 */
export function listSectionPeaks(line: Line, record: Pick<RunRecord, 'envelope'>): SectionPeaks[] {
  const shoulders = listShoulders(line)
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
      tension: evaluateSense(line, record, first, last, own, 'tension'),
      compression: evaluateSense(line, record, first, last, own, 'compression'),
    })
    first = last + 1
  }
  return rows
}

function evaluateSense(
  line: Line,
  record: Pick<RunRecord, 'envelope'>,
  first: number,
  last: number,
  shoulders: LineShoulder[],
  sense: Sense,
): SensePeak {
  const nominal = findNominal(line, record, first, last, sense)
  const sign = sense === 'tension' ? 1 : -1
  let shoulderLocal = -1
  let kt: number | null = null
  for (const shoulder of shoulders) {
    if (shoulder.factor.kt === null) continue
    const position = record.envelope.start[shoulder.span] + shoulder.position
    const area = line.spans[shoulder.span].area[shoulder.position]
    const here = (shoulder.factor.kt * Math.abs(record.envelope[sense][position])) / area
    if (here <= shoulderLocal) continue
    shoulderLocal = here
    kt = shoulder.factor.kt
  }
  const local = Math.max(nominal.size, shoulderLocal)
  const allowable = line.spans[first].source.allowable[sense]
  return {
    peak: nominal.size === 0 ? 0 : sign * nominal.size,
    at: nominal.at,
    time: nominal.step * line.dt,
    kt,
    local: local === 0 ? 0 : sign * local,
    allowable,
    margin: allowable === null || local === 0 ? null : allowable / (line.rig.factorOfSafety * local) - 1,
  }
}

function findNominal(
  line: Line,
  record: Pick<RunRecord, 'envelope'>,
  first: number,
  last: number,
  sense: Sense,
): { size: number; at: number; step: number } {
  const force = record.envelope[sense]
  const steps = sense === 'tension' ? record.envelope.tensionStep : record.envelope.compressionStep
  let best = { size: 0, at: line.spans[first].from, step: 0 }
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
