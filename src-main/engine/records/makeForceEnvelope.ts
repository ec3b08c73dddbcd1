import type { MethodRun } from '../march/methodRun'
import type { ForceEnvelope } from './record'

/** Gathers the force envelope of a run by span; the two faces of a step share its force. */
export function makeForceEnvelope(run: MethodRun): ForceEnvelope {
  const { spans } = run.line
  const start = new Int32Array(spans.length + 1)
  spans.forEach((span, i) => (start[i + 1] = start[i] + span.cells + 1))
  const total = start[spans.length]
  const envelope: ForceEnvelope = {
    start,
    tension: new Float64Array(total),
    tensionStep: new Int32Array(total),
    compression: new Float64Array(total),
    compressionStep: new Int32Array(total),
  }
  spans.forEach((_, i) => {
    const { high, low, highStep, lowStep } = run.readExtremes(i)
    envelope.tension.set(high, start[i])
    envelope.tensionStep.set(highStep, start[i])
    envelope.compression.set(low, start[i])
    envelope.compressionStep.set(lowStep, start[i])
  })
  return envelope
}
