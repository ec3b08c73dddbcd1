/** Share of the largest force over which a closing is sudden. */
const SUDDEN = 0.02
/** Share of the largest force under which there is none. */
const FORCELESS = 1e-9

/**
 * The steps at which a contact suddenly begins to press. A gap may close within a step, so that the first
 * step has only a part of the force: that of the next is taken.
 *
 * @param force at the contact at every step, tension positive [N]
 * @param peak largest force there [N]
 * @returns steps and forces
 */
export function listClosings(force: Float64Array, peak: number): { step: number; force: number }[] {
  const closings: { step: number; force: number }[] = []
  for (let k = 1; k + 1 < force.length; k++) {
    const wasOpen = Math.abs(force[k - 1]) <= FORCELESS * peak
    const isClosed = Math.abs(force[k]) > FORCELESS * peak
    if (wasOpen && isClosed && Math.abs(force[k + 1]) > SUDDEN * peak)
      closings.push({ step: k, force: force[k + 1] })
  }
  return closings
}
