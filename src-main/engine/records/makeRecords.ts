import type { Recorder } from '../march/march'
import type { MethodRun } from '../march/methodRun'
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
 * Makes the records of a run; call before its first step.
 *
 * @param full keep the field at every position and step
 */
export function makeRecords(run: MethodRun, full: boolean): Records {
  const { line } = run
  const steps = listSampleSteps(line.steps, full)
  const columns = listFieldColumns(line, full)
  const readForces = run.makeForceReader(columns)
  const ledger = makeLedger(run, steps)
  const rows: Float64Array[] = []
  const values = new Float64Array(steps.length * columns.length)
  addProbes(run)

  return {
    steps,
    record(index) {
      const k = steps[index]
      const row = values.subarray(index * columns.length, (index + 1) * columns.length)
      readForces(k, row)
      for (let i = 0; i < row.length; i++) row[i] /= columns[i].area
      rows.push(row)
      return ledger.record(index)
    },
    finish() {
      if (rows.length < steps.length) throw new Error('the run is not at its end')
      return {
        envelope: makeForceEnvelope(run),
        node: (index) => traceNode(run, index),
        gauges: line.rig.gauges.map((gauge) => traceGauge(run, gauge)),
        energy: ledger.finish(),
        field: { step: steps, x: Float64Array.from(columns, (column) => column.x), stress: rows },
        bars: line.bars.map((_, bar) => sumBar(run, bar)),
        jointLoss: line.bars.slice(0, -1).map((bar) => run.laws.get(bar.lastSpan + 1)!.dissipated()),
        ends: {
          left: { ...sumEnd(traceNode(run, 0)!, -1, line.dt), bodyVelocity: readBody(run, 'left') },
          right: {
            ...sumEnd(traceNode(run, line.spans.length)!, 1, line.dt),
            bodyVelocity: readBody(run, 'right'),
          },
        },
      }
    },
  }
}

/** Velocity of the body at an end, which is the first or the last of the line's [m/s]; null without a mass. */
function readBody(run: MethodRun, side: 'left' | 'right'): number | null {
  const { rig, dt, steps } = run.line
  const end = side === 'left' ? rig.leftEnd : rig.rightEnd
  if (end.kind !== 'mass' && end.kind !== 'support') return null
  const body = side === 'left' ? run.bodies[0] : run.bodies[run.bodies.length - 1]
  return body.mass > 0 ? body.momentum() / body.mass + rig.gravity * dt * steps : null
}

function sumBar(run: MethodRun, bar: number): BarRecord {
  const { steps, dt, rig } = run.line
  const frame = rig.gravity * dt * steps
  const { momentum, mass, kinetic, strain } = run.sumBar(bar, steps, frame)
  return { momentum: momentum + frame * mass, mass, kinetic, strain }
}
