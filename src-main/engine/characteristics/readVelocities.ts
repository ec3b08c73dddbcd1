import { gradedKernel } from './gradedKernel'
import type { LiveBlock, WaveRun } from './waveRun'

/**
 * Reads the velocity in the falling frame at positions of a block after its latest step k [m/s]:
 * `v = (g - f)/Z` in a delay line, `v = 2 (g - f)/(Z1 + Z2)` from the waves f and g that left a node of
 * a graded block to the right and to the left. Where a bar came apart it is that of the right-hand face.
 *
 * @param positions ascending
 * @param row takes them from index `at` on
 */
export function readVelocities(
  run: WaveRun,
  block: LiveBlock,
  positions: Int32Array,
  k: number,
  row: Float64Array,
  at: number,
): void {
  const { delay, cells, impedance } = block
  if (delay) {
    const { right, left } = delay.line
    for (let i = 0; i < positions.length; i++) {
      row[at + i] = (left[k + positions[i]] - right[k - positions[i] + cells]) / impedance[0]
    }
    return
  }
  gradedKernel.enter(run.graded)
  for (let i = 0; i < positions.length; i++) row[at + i] = readGraded(run, block, positions[i], k)
}

function readGraded(run: WaveRun, block: LiveBlock, position: number, k: number): number {
  const { left, right, cells, slot, impedance } = block
  if (position === cells) return (right.leaving[k] - right.arriving[k]) / right.impedance
  const opened = run.breaks.length > 0 && run.stretches.find((s) => s.block === block && s.start === position)
  const face = position === 0 ? left : opened ? opened.left : null
  if (face !== null) return (face.arriving[k] - face.leaving[k]) / face.impedance
  const { f, g } = gradedKernel
  const i = slot + position
  return (2 * (g[i - 1] - f[i])) / (impedance[position - 1] + impedance[position])
}
