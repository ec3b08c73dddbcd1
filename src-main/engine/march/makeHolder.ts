/** A run's own copy of a kernel's arrays while another run holds them. */
export interface HeldState {
  /** Slots in use. */
  size: number
  saved: (Float64Array | Int32Array)[]
}

/**
 * Lets several runs use the arrays of one kernel in turn.
 *
 * @param arrays all of one length
 * @returns brings a run's state into the arrays, saving that of the run that held them
 */
export function makeHolder(arrays: (Float64Array | Int32Array)[]): (state: HeldState) => void {
  let holder: HeldState | null = null
  return (state) => {
    if (holder === state) return
    const room = arrays[0].length
    if (state.size > room) throw new Error(`a line of ${state.size} cells is over the kernel's ${room}`)
    const last = holder
    if (last !== null) last.saved = arrays.map((array) => array.slice(0, last.size))
    arrays.forEach((array, i) => {
      array.fill(0, 0, state.size)
      if (state.saved.length > 0) array.set(state.saved[i])
    })
    state.saved = []
    holder = state
  }
}
