import type { PageResult } from '../../../src-main/contract/bridge'
import type { ChartTable, Column } from '../charts/chartTable'
import { findStep, type RatioRow, type StepView } from './findStep'

/**
 * The shares at every step and taper of the line, one row for each quantity.
 *
 * @param result - of the run
 */
export function makeRatiosTable(result: Pick<PageResult, 'interfaces' | 'tapers'>): ChartTable {
  const steps = [
    ...result.interfaces.map((it) => findStep({ interfaces: [it], tapers: [] }, it.x)),
    ...result.tapers.map((it) => findStep({ interfaces: [], tapers: [it] }, it.from)),
  ].filter((step): step is StepView => step !== null)
  const rows = steps
    .sort((a, b) => a.from - b.from)
    .flatMap((step) => step.rows.map((row) => ({ step, row })))
  const share = (heading: string, read: (row: RatioRow) => number | null): Column => ({
    heading,
    dimension: 'ratio',
    at: (i) => read(rows[i].row),
  })
  return {
    name: 'Reflected and transmitted at each step',
    rows: rows.length,
    columns: [
      { heading: 'step', dimension: null, at: (i) => rows[i].step.name },
      { heading: 'x', dimension: 'length', at: (i) => rows[i].step.from },
      { heading: 'share of', dimension: null, at: (i) => rows[i].row.name },
      share('from the left: reflected', ({ fromLeft }) => fromLeft.reflected),
      share('from the left: transmitted', ({ fromLeft }) => fromLeft.transmitted),
      share('from the right: transmitted', ({ fromRight }) => fromRight.transmitted),
      share('from the right: reflected', ({ fromRight }) => fromRight.reflected),
    ],
  }
}
