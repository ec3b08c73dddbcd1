import type { Line } from '../../../../../src-main/engine/line/line'
import type { ForceEnvelope } from '../../../../../src-main/engine/records/record'
import { makePlainLine, STEEL, type PlainRig } from '../makePlainLine'

/** A fatigue line with easy numbers: amplitude = 1 GPa (2 N)^-0.1, so half the strength lasts 512 cycles. */
export const ROUND_FATIGUE = { strength: 1e9, exponent: -0.1 }

/** Steel with that line. */
export const TIRING = { ...STEEL, fatigue: ROUND_FATIGUE }

/** Area of 20 mm diameter, so that forces can be given as stresses there. */
export const SMALL = (Math.PI / 4) * 0.02 ** 2

/** A shaft of four cells of 20 mm and four of 40 mm diameter, with a fillet between them. */
export function makeShaft(options: Partial<PlainRig['bars'][number]['sections'][number]> = {}): Line {
  return makePlainLine({
    duration: 100e-6,
    bars: [
      {
        name: 'shaft',
        sections: [
          { length: 0.02, diameter: 0.02, fillet: 0.002, material: TIRING, ...options },
          { length: 0.02, diameter: 0.04, material: TIRING },
        ],
      },
    ],
  })
}

/** An envelope that holds these stresses at every place [Pa]. */
export function makeStressEnvelope(
  line: Line,
  stress: (span: number, p: number) => [tension: number, compression: number],
): ForceEnvelope {
  const start = new Int32Array(line.spans.length + 1)
  line.spans.forEach((span, i) => (start[i + 1] = start[i] + span.cells + 1))
  const count = start[line.spans.length]
  const made = {
    start,
    tension: new Float64Array(count),
    tensionStep: new Int32Array(count),
    compression: new Float64Array(count),
    compressionStep: new Int32Array(count),
  }
  line.spans.forEach((span, i) =>
    span.area.forEach((area, p) => {
      const [tension, compression] = stress(i, p)
      made.tension[start[i] + p] = tension * area
      made.compression[start[i] + p] = compression * area
    }),
  )
  return made
}
