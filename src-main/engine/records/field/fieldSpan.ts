import type { SampledSpan } from './sampleField'
import type { WaveSpan } from './waveSpan'

/** A span of the field, either with the waves of the whole run or with samples of it. */
export type FieldSpan = { waves: WaveSpan } | { sampled: SampledSpan }
