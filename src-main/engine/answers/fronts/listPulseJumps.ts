/** Share of the largest value over which a change within one step is a jump. */
const JUMP = 0.5

/**
 * The sudden changes of a prescribed history after its first step, and its onset where that is smooth.
 *
 * @param values what is prescribed at every step
 * @returns steps with their change; a smooth onset counts with the largest value. The change at step 0
 *   belongs to the start of the run and is left out.
 */
export function listPulseJumps(values: Float64Array): { step: number; change: number }[] {
  const peak = values.reduce((largest, value) => (Math.abs(value) > Math.abs(largest) ? value : largest), 0)
  if (peak === 0) return []
  const isJump = (change: number) => Math.abs(change) > JUMP * Math.abs(peak)
  const jumps: { step: number; change: number }[] = []
  const onset = values.findIndex((value) => Math.abs(value) > 1e-9 * Math.abs(peak))
  if (!isJump(values[onset])) jumps.push({ step: Math.max(0, onset - 1), change: peak })
  for (let k = 1; k < values.length; k++) {
    const change = values[k] - values[k - 1]
    if (isJump(change)) jumps.push({ step: k, change })
  }
  return jumps
}
