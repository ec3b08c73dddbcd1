import { readForce, sumBlock } from '../characteristics/readWaves'
import type { WaveRun } from '../characteristics/waveRun'
import type { Recorder } from '../march/march'
import { listFieldColumns, listSampleSteps } from './fieldColumns'
import { makeForceEnvelope } from './makeForceEnvelope'
import { makeLedger } from './makeLedger'
import type { BarRecord, RunRecord } from './record'
import { sumEnd, traceNode } from './traceNode'
import { addProbes, traceGauge } from './tracePlaces'

/** A recorder that hands over all it has once the run is done. */
export interface Records extends Recorder {
  finish(): RunRecord
}

/**
 * Makes the records of a run by characteristics; call before its first step.
 *
 * @param full keep the field at every position and step
 */
export function makeRecords(run: WaveRun, full: boolean): Records {
  const { line } = run
  const steps = listSampleSteps(line.steps, full)
  const columns = listFieldColumns(line, full)
  const seats = columns.map(({ span, position }) => {
    const block = run.blocks.find((one) => span >= one.firstSpan && span <= one.lastSpan)!
    return { block, position: block.spanStart[span - block.firstSpan] + position }
  })
  const ledger = makeLedger(run, steps)
  const rows: Float64Array[] = []
  addProbes(run)

  return {
    steps,
    record(index) {
      const k = steps[index]
      const row = new Float64Array(columns.length)
      for (let i = 0; i < row.length; i++) {
        row[i] = readForce(seats[i].block, seats[i].position, k) / columns[i].area
      }
      rows.push(row)
      return ledger.record(index)
    },
    finish() {
      const lawAt = (index: number) => run.nodes.find((node) => node.index === index)!.law
      return {
        envelope: makeForceEnvelope(run),
        node: (index) => traceNode(run, index),
        gauges: line.rig.gauges.map((gauge) => traceGauge(run, gauge)),
        energy: ledger.finish(),
        field: { step: steps, x: Float64Array.from(columns, (column) => column.x), stress: rows },
        bars: line.bars.map((_, bar) => sumBar(run, bar)),
        jointLoss: line.bars.slice(0, -1).map((bar) => lawAt(bar.lastSpan + 1).dissipated()),
        ends: {
          left: sumEnd(traceNode(run, 0)!, -1, line.dt),
          right: sumEnd(traceNode(run, line.spans.length)!, 1, line.dt),
        },
      }
    },
  }
}

function sumBar(run: WaveRun, bar: number): BarRecord {
  const { steps, dt, rig } = run.line
  const frame = rig.gravity * dt * steps
  const record = { momentum: 0, mass: 0, kinetic: 0, strain: 0 }
  for (const block of run.blocks) {
    if (block.bar !== bar) continue
    const state = sumBlock(run, block, steps, frame)
    record.momentum += state.momentum + frame * state.mass
    record.mass += state.mass
    record.kinetic += state.kinetic
    record.strain += state.strain
  }
  return record
}
