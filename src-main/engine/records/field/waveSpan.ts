import type { SpanWaves } from '../../march/methodRun'
import { makeWavePyramid, type WavePyramid } from './wavePyramid'

/** A uniform span whose waves are known at every step: `f = right[k - p + cells]`, `g = left[k + p]`. */
export interface WaveSpan {
  cells: number
  steps: number
  right: WavePyramid
  left: WavePyramid
}

export function makeWaveSpan(waves: SpanWaves, cells: number, steps: number): WaveSpan {
  return { cells, steps, right: makeWavePyramid(waves.right), left: makeWavePyramid(waves.left) }
}
