import type { Recorder } from '../../march/march'
import type { MethodRun } from '../../march/methodRun'
import { makeSpanPlace, type SpanPlace } from './spanPlace'

/** Columns of samples at most, over all spans. */
const COLUMNS = 1024
/** Samples in time at most. */
const ROWS = 1024
/** Positions read over the run at most, so that sampling a long run stays cheap beside marching it. */
const MOST_READS = 20_000_000

/** Largest and smallest value in each sample, shape (rows, columns). */
export interface Samples {
  high: Float32Array
  low: Float32Array
}

/** A span that is known after sampled steps only: runs of neighbouring positions are its columns. */
export interface SampledSpan {
  span: number
  columns: number
  /** [N] */
  force: Samples
  /** In the falling frame [m/s]. */
  velocity: Samples
  /** At the middle of each column. */
  places: SpanPlace[]
}

/** Samples of the spans whose waves the method does not keep, taken while it runs. */
export interface FieldSamples extends Recorder {
  spans: SampledSpan[]
  /** Steps from one sample to the next. */
  stride: number
}

/**
 * Makes the samples of a run; none where the method keeps the waves of every span. A column that
 * gathers several positions keeps their extremes; between two samples in time nothing is known.
 */
export function makeFieldSamples(run: MethodRun): FieldSamples {
  const { line } = run
  const indices = line.spans.map((_, i) => i).filter((i) => run.readWaves(i) === null)
  const cells = indices.reduce((sum, i) => sum + line.spans[i].cells, 0)
  const count = line.steps + 1
  const rowsWanted = Math.min(ROWS, Math.max(16, Math.floor(MOST_READS / Math.max(1, cells))))
  const stride = chooseStride(count, rowsWanted)
  const steps = indices.length === 0 ? new Int32Array() : listSteps(count, stride)

  const spans = indices.map((span): SampledSpan => {
    const positions = line.spans[span].cells + 1
    const share = Math.ceil((COLUMNS * positions) / Math.max(1, cells))
    const columns = Math.max(2, Math.min(positions, share))
    const makeSamples = () => ({
      high: new Float32Array(steps.length * columns),
      low: new Float32Array(steps.length * columns),
    })
    const places = Array.from({ length: columns }, (_, i) =>
      makeSpanPlace(line.spans[span], Math.floor(((i + 0.5) * positions) / columns)),
    )
    return { span, columns, force: makeSamples(), velocity: makeSamples(), places }
  })
  const rows = spans.map(({ span }) => ({
    force: new Float64Array(line.spans[span].cells + 1),
    velocity: new Float64Array(line.spans[span].cells + 1),
  }))

  return {
    spans,
    stride,
    steps,
    record(index) {
      spans.forEach(({ span, columns, force, velocity }, i) => {
        run.readMotion(span, steps[index], rows[i].force, rows[i].velocity)
        gather(rows[i].force, force, index * columns, columns)
        gather(rows[i].velocity, velocity, index * columns, columns)
      })
      return true
    },
  }
}

/** Column that a position lies in, the middle of column i being i. */
export function findColumn(p: number, cells: number, columns: number): number {
  return Math.min(columns - 1, Math.max(0, ((p + 0.5) * columns) / (cells + 1) - 0.5))
}

/** Row that a step lies in, sample i being taken at i; before the first it is less than 0. */
export function findRow(k: number, stride: number): number {
  return (k + 1) / stride - 1
}

/** An even stride lets a method march in pairs of steps. */
function chooseStride(count: number, rows: number): number {
  const stride = Math.ceil(count / rows)
  return stride > 1 && stride % 2 === 1 ? stride + 1 : stride
}

/** The last step of each stride, and the last of all. */
function listSteps(count: number, stride: number): Int32Array {
  return Int32Array.from(
    { length: Math.ceil(count / stride) },
    (_, i) => Math.min((i + 1) * stride, count) - 1,
  )
}

/** Gathers the extremes of a row of positions into columns. */
function gather(row: Float64Array, { high, low }: Samples, at: number, columns: number): void {
  const positions = row.length
  if (positions === columns) {
    high.set(row, at)
    low.set(row, at)
    return
  }
  for (let i = 0; i < columns; i++) {
    const from = Math.floor((i * positions) / columns)
    const to = Math.floor(((i + 1) * positions) / columns)
    let top = row[from]
    let bottom = row[from]
    for (let p = from + 1; p < to; p++) {
      if (row[p] > top) top = row[p]
      if (row[p] < bottom) bottom = row[p]
    }
    high[at + i] = top
    low[at + i] = bottom
  }
}
