/** Share of the largest force over which a closing is sudden. */
const SUDDEN = 0.02

/**
 * The steps at which a contact suddenly begins to press. A gap may close within a step, so that the first
 * step has only a part of the force: that of the next is taken.
 *
 * @param force at the contact at every step, tension positive [N]
 * @param forceless force up to which it is open, over the rounding of the run [N]
 * @returns steps and forces
 */
export function listClosings(force: Float64Array, forceless: number): { step: number; force: number }[] {
  const peak = force.reduce((largest, F) => Math.max(largest, -F), 0)
  const closings: { step: number; force: number }[] = []
  for (let k = 1; k + 1 < force.length; k++) {
    const closes = -force[k - 1] <= forceless && -force[k] > forceless
    if (closes && -force[k + 1] > SUDDEN * peak) closings.push({ step: k, force: force[k + 1] })
  }
  return closings
}
