import { MOST_CELLS } from '../line/limits'
import { makeHolder } from '../march/makeHolder'
import { WIDENING } from '../march/widening'

/**
 * The kernel that marches elements by central difference, with its work arrays. Made once, so that
 * V8 builds their addresses into its loops: see `gradedKernel`.
 *
 * Slot j is node j of a piece, and the element between node j and node j + 1.
 * v: velocity half a step on [m/s]; F: elastic force at the step [N]; K: stiffness [N/m] times dt;
 * Y: dt over the node's mass [s/kg]; R, X, P: yield force [N], back force [N] and plastic
 * modulus times dt [N/s] of each element; high, low, highStep, lowStep: extremes of the node's force.
 */
function makeElementKernel() {
  const SIZE = 2 * MOST_CELLS
  const v = new Float64Array(SIZE)
  const F = new Float64Array(SIZE)
  const K = new Float64Array(SIZE)
  const Y = new Float64Array(SIZE)
  const R = new Float64Array(SIZE)
  const X = new Float64Array(SIZE)
  const P = new Float64Array(SIZE)
  const high = new Float64Array(SIZE)
  const low = new Float64Array(SIZE)
  const highStep = new Int32Array(SIZE)
  const lowStep = new Int32Array(SIZE)
  let work = 0
  let lead = 0

  function widen(slot: number, force: number, k: number): void {
    if (force > high[slot]) {
      high[slot] = force * WIDENING
      highStep[slot] = k
    } else if (force < low[slot]) {
      low[slot] = force * WIDENING
      lowStep[slot] = k
    }
  }

  return {
    v,
    F,
    K,
    Y,
    R,
    X,
    P,
    high,
    low,
    highStep,
    lowStep,
    widen,

    /** Plastic work of the latest plastic step over dt, `(F + F') / 2 x plastic elongation` [J/s]. */
    get plasticWork() {
      return work
    },
    /** Its second half, `F' / 2 x plastic elongation`, which belongs to the half step to come. */
    get plasticLead() {
      return lead
    },

    /** Brings a run's arrays into the kernel, saving those of the run that held it. */
    enter: makeHolder([v, F, K, Y, R, X, P, high, low, highStep, lowStep]),

    /**
     * One step of a piece in one pass: `v += dt/M (F_j - F_(j-1))` at inner nodes, then
     * `F += K dt (v_(j+1) - v_j)`, with the envelope of the nodal force `(F_(j-1) + F_j)/2`.
     *
     * Two nodes a turn: the loop is then too long for V8 to build into its callers, where it would
     * lose sight of where the arrays are.
     *
     * @param first slot of its first node
     * @param last slot of its last node
     * @param k the step
     * @param vFirst new velocity of the first node, found by its law [m/s]
     * @param vLast new velocity of the last node
     */
    step(first: number, last: number, k: number, vFirst: number, vLast: number): void {
      let before = F[first]
      let vBefore = vFirst
      v[first] = vFirst
      let j = first + 1
      for (; j + 1 < last; j += 2) {
        const here = F[j]
        const vHere = v[j] + Y[j] * (here - before)
        const node = 0.5 * (before + here)
        const i = j + 1
        const next = F[i]
        const vNext = v[i] + Y[i] * (next - here)
        const nextNode = 0.5 * (here + next)
        v[j] = vHere
        v[i] = vNext
        F[j - 1] = before + K[j - 1] * (vHere - vBefore)
        F[j] = here + K[j] * (vNext - vHere)
        before = next
        vBefore = vNext
        if (node > high[j]) {
          high[j] = node * WIDENING
          highStep[j] = k
        } else if (node < low[j]) {
          low[j] = node * WIDENING
          lowStep[j] = k
        }
        if (nextNode > high[i]) {
          high[i] = nextNode * WIDENING
          highStep[i] = k
        } else if (nextNode < low[i]) {
          low[i] = nextNode * WIDENING
          lowStep[i] = k
        }
      }
      if (j < last) {
        const here = F[j]
        const vHere = v[j] + Y[j] * (here - before)
        v[j] = vHere
        F[j - 1] = before + K[j - 1] * (vHere - vBefore)
        widen(j, 0.5 * (before + here), k)
        before = here
        vBefore = vHere
      }
      v[last] = vLast
      F[last - 1] = before + K[last - 1] * (vLast - vBefore)
    },

    /**
     * Brings the elements of a piece back to their yield surface `|F - X| = R` after a step that took
     * them as elastic. Isotropic hardening moves R, kinematic hardening moves X.
     *
     * @param kinematic which of the two
     */
    yieldElements(first: number, last: number, kinematic: boolean): void {
      let done = 0
      let ahead = 0
      for (let i = first; i < last; i++) {
        const trial = F[i]
        const past = trial - X[i]
        const over = (past < 0 ? -past : past) - R[i]
        if (over > 0) {
          // Plastic elongation over dt: dt is a factor of K and of P and falls out.
          const share = past < 0 ? -over / (K[i] + P[i]) : over / (K[i] + P[i])
          const force = trial - K[i] * share
          const before = trial - K[i] * (v[i + 1] - v[i])
          F[i] = force
          if (kinematic) X[i] += P[i] * share
          else R[i] += P[i] * (past < 0 ? -share : share)
          done += 0.5 * share * (before + force)
          ahead += 0.5 * share * force
        }
      }
      work = done
      lead = ahead
    },
  }
}

/** The one element kernel of this thread. */
export const elementKernel = makeElementKernel()
