import type { GaugePulse } from '../../contract/result'
import type { PlaceTrace } from '../records/record'

/** Share of the largest directional force at the gauge above which a pulse counts. */
const THRESHOLD = 0.01

/**
 * The pulses that pass a gauge, each direction apart.
 *
 * A pulse is a stretch in which the directional force stays above 1 % of the largest directional force
 * of either direction at that gauge and keeps its sign. It starts at the first step above and ends at
 * the first step no longer above (or of the other sign), or at the last step of the run.
 *
 * @param trace what passed the gauge
 * @param dt time step [s]
 * @returns the pulses by start, rightgoing first; `clear` where the opposite wave stays at or under the
 *   threshold all through
 */
export function findGaugePulses(
  trace: Pick<PlaceTrace, 'rightgoing' | 'leftgoing'>,
  dt: number,
): GaugePulse[] {
  const threshold = THRESHOLD * Math.max(evaluateLargest(trace.rightgoing), evaluateLargest(trace.leftgoing))
  if (threshold === 0) return []
  return [
    ...listStretches('right', trace.rightgoing, trace.leftgoing, threshold, dt),
    ...listStretches('left', trace.leftgoing, trace.rightgoing, threshold, dt),
  ].sort((a, b) => a.from - b.from)
}

function evaluateLargest(values: Float64Array): number {
  let largest = 0
  for (const value of values) largest = Math.max(largest, Math.abs(value))
  return largest
}

function listStretches(
  direction: GaugePulse['direction'],
  wave: Float64Array,
  opposite: Float64Array,
  threshold: number,
  dt: number,
): GaugePulse[] {
  const pulses: GaugePulse[] = []
  let open: GaugePulse | null = null
  for (let n = 0; n < wave.length; n++) {
    const above = Math.abs(wave[n]) > threshold
    if (open && (!above || wave[n] * open.peakForce < 0)) {
      open.to = n * dt
      open = null
    }
    if (!above) continue
    if (!open) {
      open = { direction, from: n * dt, to: (wave.length - 1) * dt, peakForce: wave[n], clear: true }
      pulses.push(open)
    }
    if (Math.abs(wave[n]) > Math.abs(open.peakForce)) open.peakForce = wave[n]
    if (Math.abs(opposite[n]) > threshold) open.clear = false
  }
  return pulses
}
