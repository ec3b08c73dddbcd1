import { MOST_CELLS } from '../line/limits'

/**
 * The work arrays of the graded kernel, made once per thread: V8 then knows their addresses and
 * lengths when it compiles the loop, which makes it three times faster than arrays handed in as
 * arguments. One run at a time holds them; `enterWorkspace` swaps runs.
 *
 * f, g: waves in each cell [N]; T: transmission 2 Z2/(Z1 + Z2) at each node;
 * high, low: largest force so far at each node, widened by WIDENING; highStep, lowStep: when.
 */
const SIZE = MOST_CELLS + 2
export const f = new Float64Array(SIZE)
export const g = new Float64Array(SIZE)
export const T = new Float64Array(SIZE)
export const high = new Float64Array(SIZE)
export const low = new Float64Array(SIZE)
export const highStep = new Int32Array(SIZE)
export const lowStep = new Int32Array(SIZE)

/** A peak replaces an earlier one only where it is larger by this share, so that rounding does not move its time. */
export const WIDENING = 1 + 1e-13

const ARRAYS = [f, g, T, high, low, highStep, lowStep]

/** A run's own copy of the workspace while another run holds it. */
export interface GradedState {
  size: number
  saved: (Float64Array | Int32Array)[] | null
}

let holder: GradedState | null = null

/**
 * Makes the state of a run with the given number of slots, all zero.
 *
 * @param size cells and one more per block, summed over the run's graded blocks
 */
export function makeGradedState(size: number): GradedState {
  return { size, saved: ARRAYS.map((array) => array.slice(0, 0)) }
}

/** Brings a run's arrays into the workspace, saving those of the run that held it. */
export function enterWorkspace(state: GradedState): void {
  if (holder === state) return
  if (holder !== null) {
    const { size } = holder
    holder.saved = ARRAYS.map((array) => array.slice(0, size))
  }
  ARRAYS.forEach((array, i) => {
    array.fill(0, 0, state.size)
    array.set(state.saved![i])
  })
  state.saved = null
  holder = state
}
