/** A method under way: it marches steps in place and knows nothing of the loop around it. */
export interface Method {
  /** Marches steps from..to-1. */
  advance(from: number, to: number): void
}

/** Something that looks at the state after chosen steps. */
export interface Recorder {
  /** Steps after which it looks, ascending, shape (count). */
  steps: Int32Array
  /** Looks at the state after `steps[index]`; false where the numbers are no longer finite. */
  record(index: number): boolean
}

/** The time loop of one run. */
export interface March {
  /** Steps done so far; the run is complete at `end`. */
  readonly step: number
  readonly end: number
  /** True once the numbers have stopped being finite; the run goes no further. */
  readonly broken: boolean
  /** Marches up to step `to`, stopping to record where the recorder asks. */
  advance(to: number): void
}

/**
 * Makes the time loop: states 0..steps, that is steps + 1 closures of the equations.
 *
 * @param steps steps of the run
 */
export function makeMarch(method: Method, recorder: Recorder, steps: number): March {
  const end = steps + 1
  let step = 0
  let next = 0
  let broken = false
  return {
    get step() {
      return step
    },
    end,
    get broken() {
      return broken
    },
    advance(to) {
      while (step < Math.min(to, end) && !broken) {
        const stop = next < recorder.steps.length ? recorder.steps[next] + 1 : end
        const until = Math.min(to, end, stop)
        method.advance(step, until)
        step = until
        if (step === stop && next < recorder.steps.length) {
          broken = !recorder.record(next)
          next++
        }
      }
    },
  }
}
