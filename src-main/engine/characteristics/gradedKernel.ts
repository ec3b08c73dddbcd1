import { MOST_CELLS } from '../line/limits'
import { makeHolder } from '../march/makeHolder'
import { WIDENING } from '../march/widening'

/**
 * The kernel that marches graded blocks, with its work arrays. It is made once: V8 compiles the
 * loops of a closure made once with the addresses and lengths of its arrays built in, which is
 * three times faster than arrays handed in as arguments. One run at a time holds the arrays.
 *
 * f, g: waves in each cell [N]; T: transmission 2 Z2/(Z1 + Z2) at each node (slot i is the node at
 * the left of cell i); high, low: largest force so far at each node; highStep, lowStep: when.
 */
function makeGradedKernel() {
  // Room for the finest step that the line may choose and a slot per block.
  const SIZE = 2 * MOST_CELLS
  const f = new Float64Array(SIZE)
  const g = new Float64Array(SIZE)
  const T = new Float64Array(SIZE)
  const high = new Float64Array(SIZE)
  const low = new Float64Array(SIZE)
  const highStep = new Int32Array(SIZE)
  const lowStep = new Int32Array(SIZE)
  let toLeft = 0
  let toRight = 0

  function widen(slot: number, F: number, k: number): void {
    if (F > high[slot]) {
      high[slot] = F * WIDENING
      highStep[slot] = k
    } else if (F < low[slot]) {
      low[slot] = F * WIDENING
      lowStep[slot] = k
    }
  }

  return {
    f,
    g,
    T,
    high,
    low,
    highStep,
    lowStep,
    widen,

    /** Brings a run's arrays into the kernel, saving those of the run that held it. */
    enter: makeHolder([f, g, T, high, low, highStep, lowStep]),

    /**
     * Scatters at every inner node of a block and shifts by one cell, in place, with the force
     * envelope in the same loop: `F = 2 g + T (f - g)`, `f' = F - g`, `g' = F - f`. The first
     * cell's f and the last cell's g are then for the nodes at its faces to set.
     *
     * @param first slot of its first cell
     * @param last slot of its last cell
     * @param k the step
     */
    step(first: number, last: number, k: number): void {
      let arriving = f[first]
      for (let i = first + 1; i <= last; i++) {
        const fIn = arriving
        const gIn = g[i]
        const F = 2 * gIn + T[i] * (fIn - gIn)
        arriving = f[i]
        f[i] = F - gIn
        g[i - 1] = F - fIn
        if (F > high[i]) {
          high[i] = F * WIDENING
          highStep[i] = k
        } else if (F < low[i]) {
          low[i] = F * WIDENING
          lowStep[i] = k
        }
      }
    },

    /**
     * Two steps in one pass over a block of two cells or more: node i at step k together with node
     * i - 1 at step k + 1, which halves the traffic with memory. Leaves what arrives at its faces
     * at step k + 1 in `pairToLeft` and `pairToRight`.
     *
     * @param fLeft wave that entered at its left face at step k [N]
     * @param gRight wave that entered at its right face at step k [N]
     */
    stepPair(first: number, last: number, k: number, fLeft: number, gRight: number): void {
      // a: waves that left nodes i - 1 and i - 2 rightwards at step k.
      let a2 = fLeft
      let i = first + 1
      const gFirst = g[i]
      const fFirst = f[first]
      const F1 = 2 * gFirst + T[i] * (fFirst - gFirst)
      let arriving = f[i]
      let a1 = F1 - gFirst
      let T1 = T[i]
      toLeft = F1 - fFirst
      widen(i, F1, k)
      for (i = first + 2; i <= last; i++) {
        const j = i - 1
        const fIn = arriving
        const gIn = g[i]
        const Ti = T[i]
        const F = 2 * gIn + Ti * (fIn - gIn)
        const b = F - fIn
        const G = 2 * b + T1 * (a2 - b)
        arriving = f[i]
        f[j] = G - b
        g[j - 1] = G - a2
        a2 = a1
        a1 = F - gIn
        T1 = Ti
        if (F > high[i]) {
          high[i] = F * WIDENING
          highStep[i] = k
        } else if (F < low[i]) {
          low[i] = F * WIDENING
          lowStep[i] = k
        }
        if (G > high[j]) {
          high[j] = G * WIDENING
          highStep[j] = k + 1
        } else if (G < low[j]) {
          low[j] = G * WIDENING
          lowStep[j] = k + 1
        }
      }
      const G = 2 * gRight + T1 * (a2 - gRight)
      f[last] = G - gRight
      g[last - 1] = G - a2
      widen(last, G, k + 1)
      toRight = a1
    },

    get pairToLeft() {
      return toLeft
    },
    get pairToRight() {
      return toRight
    },

    /** Sets waves under 1e-200 N to zero in cells first..last: subnormal numbers are slow. */
    flush(first: number, last: number): void {
      for (let i = first; i <= last; i++) {
        if (f[i] < 1e-200 && f[i] > -1e-200) f[i] = 0
        if (g[i] < 1e-200 && g[i] > -1e-200) g[i] = 0
      }
    },
  }
}

/** The one graded kernel of this thread. */
export const gradedKernel = makeGradedKernel()
