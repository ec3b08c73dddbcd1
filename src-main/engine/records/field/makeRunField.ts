import type { Profile, ProfileRequest } from '../../../contract/bridge'
import type { Recorder } from '../../march/march'
import type { MethodRun } from '../../march/methodRun'
import { drawSamples } from './drawSamples'
import { drawWaves } from './drawWaves'
import type { FieldSpan } from './fieldSpan'
import { type FieldWindow, listStrips, makeTile } from './pixels'
import { readProfile } from './readProfile'
import { makeFieldSamples } from './sampleField'
import { makeSpanPlace } from './spanPlace'
import { makeWaveSpan } from './waveSpan'

/** The field of a run, to be looked into at any place and time once the run has ended. */
export interface RunField extends Recorder {
  /** Signed extremes per pixel, shape (rows, columns, 2); NaN where no bar is and outside the run. */
  readTile(window: FieldWindow): Float32Array
  /** Quantities along the line, or along a part of it, at time t [s], at the middles of equal columns. */
  readProfile(t: number, columns: number, part?: ProfileRequest['part']): Profile
}

/**
 * Makes the field of a run; call before its first step. Where the method keeps the waves of a span
 * any position and step is two look-ups, exact; elsewhere the field is sampled while the run goes on.
 */
export function makeRunField(run: MethodRun): RunField {
  const { line } = run
  const samples = makeFieldSamples(run)
  const fall = line.rig.gravity * line.dt
  const end = line.steps * line.dt
  let spans: FieldSpan[] | null = null

  /** Pyramids are made from the waves as they stand, so not before the run has ended. */
  const readSpans = () =>
    (spans ??= line.spans.map((span, i) => {
      const waves = run.readWaves(i)
      if (waves !== null) return { waves: makeWaveSpan(waves, span.cells, line.steps) }
      return { sampled: samples.spans.find((one) => one.span === i)! }
    }))

  return {
    steps: samples.steps,
    record: (index) => samples.record(index),
    readTile(window) {
      const tile = makeTile(window)
      const x = { from: window.fromX, to: window.toX, count: window.columns }
      const t = { from: window.fromT, to: window.toT, count: window.rows }
      const rows = listStrips(t, { from: 0, to: end }, 1 / line.dt)
      readSpans().forEach((kept, i) => {
        const span = line.spans[i]
        const columns = listStrips(x, span, span.cells / (span.to - span.from))
        if (columns.length === 0 || rows.length === 0) return
        if ('waves' in kept) drawWaves(tile, kept.waves, makeSpanPlace(span, 0), columns, rows, fall)
        else drawSamples(tile, kept.sampled, span.cells, columns, rows, samples.stride, fall)
      })
      return tile.values
    },
    readProfile: (t, columns, part) =>
      readProfile({ line, spans: readSpans(), stride: samples.stride }, t, columns, part),
  }
}
