import type { Recorder } from './march'

/**
 * Lets two recorders look at one run, each after its own steps.
 *
 * @param first looks first where both look after the same step
 */
export function joinRecorders(first: Recorder, second: Recorder): Recorder {
  if (second.steps.length === 0) return first
  const steps = Int32Array.from(new Set([...first.steps, ...second.steps])).sort()
  let [i, j] = [0, 0]
  return {
    steps,
    record(index) {
      const k = steps[index]
      const finite = first.steps[i] !== k || first.record(i++)
      return (second.steps[j] !== k || second.record(j++)) && finite
    },
  }
}
