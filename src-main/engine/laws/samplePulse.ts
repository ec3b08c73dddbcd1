import type { Pulse } from '../../contract/rig'
import { averagePulse } from './averagePulse'
import type { Beat } from './side'

/**
 * A prescribed force as the steps take it. By characteristics step k stands for t_k and takes the value
 * there. With elements it stands for the time from t_(k-1) to t_(k+1), or from 0 in the first step,
 * and takes the mean.
 */
export function sampleForce(pulse: Pulse, beat: Beat): (k: number) => number {
  const { dt, alpha } = beat
  if (alpha === 1) return (k) => pulse.value(k * dt)
  return (k) => averagePulse(pulse, Math.max(0, k - 1) * dt, (k + 1) * dt)
}

/**
 * A prescribed velocity as the steps take it: its value at t_k by characteristics, its mean from t_k
 * to t_(k+1) with elements, so that the end is where it should be at each t_k.
 */
export function sampleMotion(pulse: Pulse, beat: Beat): (k: number) => number {
  const { dt, alpha } = beat
  if (alpha === 1) return (k) => pulse.value(k * dt)
  return (k) => averagePulse(pulse, k * dt, (k + 1) * dt)
}
