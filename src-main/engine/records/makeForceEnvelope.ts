import { readEnvelope } from '../characteristics/readWaves'
import type { WaveRun } from '../characteristics/waveRun'
import type { ForceEnvelope } from './record'

/** Gathers the force envelope of a run by span; the two faces of a step share its force. */
export function makeForceEnvelope(run: WaveRun): ForceEnvelope {
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
  for (const block of run.blocks) {
    const { high, low, highStep, lowStep } = readEnvelope(run, block)
    for (let span = block.firstSpan; span <= block.lastSpan; span++) {
      const from = block.spanStart[span - block.firstSpan]
      const to = from + spans[span].cells + 1
      envelope.tension.set(high.subarray(from, to), start[span])
      envelope.tensionStep.set(highStep.subarray(from, to), start[span])
      envelope.compression.set(low.subarray(from, to), start[span])
      envelope.compressionStep.set(lowStep.subarray(from, to), start[span])
    }
  }
  return envelope
}
