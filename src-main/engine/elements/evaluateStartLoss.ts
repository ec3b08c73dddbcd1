/**
 * Energy that a jump in the initial state loses to the first half step: a front sharper than an
 * element holds `dt/4 sum F (dv - dv')` less than the state it starts from, dv and dv' being the
 * differences of velocity over each element before and after the half step. First order in dt, zero
 * for a state at rest without stress.
 *
 * @param force of each element at the start [N], shape (elements)
 * @param before node velocities at the start [m/s], shape (elements + 1)
 * @param v node velocities after the half step, from `first` on
 * @param dt [s]
 * @returns [J]
 */
export function evaluateStartLoss(
  force: Float64Array,
  before: Float64Array,
  v: Float64Array,
  first: number,
  dt: number,
): number {
  let sum = 0
  for (let i = 0; i < force.length; i++) {
    const change = v[first + i + 1] - v[first + i] - (before[i + 1] - before[i])
    sum -= force[i] * change
  }
  return (dt * sum) / 4
}
