import type { End, PointLoad } from '../../../contract/rig'

/**
 * What an end or the loads of a node prescribe at every step: a force [N] or a velocity [m/s].
 *
 * A displacement acts by its velocity over the step, [u(t + dt/2) - u(t - dt/2)]/dt.
 *
 * @param source an end with a pulse, or point loads, which add up
 * @param dt time step [s]
 * @param steps steps of the run
 * @returns shape (steps + 1); null where nothing is prescribed
 */
export function evaluatePulseSteps(
  source: End | PointLoad[],
  dt: number,
  steps: number,
): Float64Array | null {
  const value = evaluateAt(source, dt)
  return value === null ? null : Float64Array.from({ length: steps + 1 }, (_, k) => value(k))
}

function evaluateAt(source: End | PointLoad[], dt: number): ((k: number) => number) | null {
  if (Array.isArray(source)) {
    if (source.length === 0) return null
    return (k) => source.reduce((sum, { pulse }) => sum + pulse.value(k * dt), 0)
  }
  if (source.kind === 'force' || source.kind === 'velocity') return (k) => source.pulse.value(k * dt)
  if (source.kind !== 'displacement') return null
  const u = (t: number) => (t <= 0 ? 0 : source.pulse.value(t))
  return (k) => (u((k + 0.5) * dt) - u((k - 0.5) * dt)) / dt
}
