/** A piece's mass matrix: lumped, or with lateral inertia tridiagonal. */
export interface MassSolver {
  /** Solves `M a = r` in place, r of shape (nodes) [N] to a [m/s^2]. */
  solve(r: Float64Array): void
  /** Acceleration of an end node by a unit force on it [1/kg]. */
  compliance(end: 'left' | 'right'): number
  /** Adds the velocity that impulses [N s] on the end nodes give to all nodes. */
  addEnds(v: Float64Array, first: number, left: number, right: number): void
  /** `v M v / 2` with the frame's velocity added to v [J]. */
  kinetic(v: Float64Array, first: number, frame: number): number
}

/**
 * Makes the solver of a piece. With lateral inertia (Rayleigh-Love) each element adds
 * `m [1 -1; -1 1]`, m = rho nu^2 Ip / h; the system is solved by elimination (Thomas).
 * The two ends are taken not to feel each other within a step: the matrix forgets a force within
 * some ten elements, so a piece needs more than that.
 *
 * @param lumped mass of each node [kg], shape (nodes)
 * @param lateral m of each element [kg], shape (nodes - 1); null without lateral inertia
 */
export function makeMassSolver(lumped: Float64Array, lateral: Float64Array | null): MassSolver {
  const nodes = lumped.length
  const diagonal = lumped.slice()
  const beside = new Float64Array(nodes - 1)
  if (lateral !== null) {
    for (let i = 0; i < nodes - 1; i++) {
      diagonal[i] += lateral[i]
      diagonal[i + 1] += lateral[i]
      beside[i] = -lateral[i]
    }
  }
  // Elimination: a_j = (r_j - beside_(j-1) a_(j-1)) / pivot_j, then back.
  const pivot = diagonal.slice()
  for (let j = 1; j < nodes; j++) pivot[j] -= (beside[j - 1] * beside[j - 1]) / pivot[j - 1]

  function solve(r: Float64Array): void {
    for (let j = 1; j < nodes; j++) r[j] -= (beside[j - 1] / pivot[j - 1]) * r[j - 1]
    r[nodes - 1] /= pivot[nodes - 1]
    for (let j = nodes - 2; j >= 0; j--) r[j] = (r[j] - beside[j] * r[j + 1]) / pivot[j]
  }

  function answer(node: number): Float64Array {
    const r = new Float64Array(nodes)
    r[node] = 1
    solve(r)
    return r
  }
  const byLeft = answer(0)
  const byRight = answer(nodes - 1)

  return {
    solve,
    compliance: (end) => (end === 'left' ? byLeft[0] : byRight[nodes - 1]),
    addEnds(v, first, left, right) {
      for (let j = 0; j < nodes; j++) v[first + j] += left * byLeft[j] + right * byRight[j]
    },
    kinetic(v, first, frame) {
      let sum = 0
      for (let j = 0; j < nodes; j++) {
        const speed = v[first + j] + frame
        sum += lumped[j] * speed * speed
        if (lateral !== null && j + 1 < nodes) {
          const stretch = v[first + j + 1] - v[first + j]
          sum += lateral[j] * stretch * stretch
        }
      }
      return sum / 2
    },
  }
}
