import type { Port } from '../laws/barSide'
import { gradedKernel } from './gradedKernel'
import type { LiveBlock, WaveRun } from './waveRun'

/**
 * Reads the force [N] and the velocity in the falling frame [m/s] at neighbouring positions of a graded
 * block after its latest step k, from the waves f and g that left a node to the right and to the left:
 * `F = 2 (Z1 f + Z2 g)/(Z1 + Z2)`, `v = 2 (g - f)/(Z1 + Z2)`. Where a bar came apart they are those of the
 * right-hand face.
 *
 * @param first the first position
 * @param force takes those from `first` on, as many as it has room for; so does `velocity`
 */
export function readMotion(
  run: WaveRun,
  block: LiveBlock,
  first: number,
  k: number,
  force: Float64Array,
  velocity: Float64Array,
): void {
  gradedKernel.enter(run.graded)
  const { f, g } = gradedKernel
  const { left, right, cells, slot, impedance } = block
  const end = first + force.length
  for (let p = Math.max(1, first); p < Math.min(cells, end); p++) {
    const Z1 = impedance[p - 1]
    const Z2 = impedance[p]
    const a = f[slot + p]
    const b = g[slot + p - 1]
    force[p - first] = (2 * (Z1 * a + Z2 * b)) / (Z1 + Z2)
    velocity[p - first] = (2 * (b - a)) / (Z1 + Z2)
  }
  /** A face on the right of a node has its bar on the right: v = (g - f)/Z, of which g arrives. */
  const takeFace = (p: number, { arriving, leaving, impedance: Z, leavingOffset }: Port, sign: 1 | -1) => {
    if (p < first || p >= end) return
    const out = leaving[k + leavingOffset]
    force[p - first] = arriving[k] + out
    velocity[p - first] = (sign * (arriving[k] - out)) / Z
  }
  takeFace(0, left, 1)
  takeFace(cells, right, -1)
  for (const stretch of run.stretches) {
    if (stretch.block === block && stretch.start > 0) takeFace(stretch.start, stretch.left, 1)
  }
}
