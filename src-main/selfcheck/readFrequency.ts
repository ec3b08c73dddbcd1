/**
 * Angular frequency of a signal that holds one harmonic and no mean, by least squares over
 * `s(k + m) + s(k - m) = 2 cos(m w) s(k)`, weighted by sin^2 so that faint harmonics beside it average out.
 *
 * Sharpest where m steps are a quarter of a period; a frequency beyond twice that one is not found.
 *
 * @param signal one value per step, longer than 2 m
 * @param lag m, steps of about a quarter of a period
 * @returns w [rad per step]
 */
export function readFrequency(signal: Float64Array, lag: number): number {
  let cross = 0
  let own = 0
  for (let k = lag; k < signal.length - lag; k++) {
    const weight = Math.sin((Math.PI * (k - lag)) / (signal.length - 2 * lag)) ** 2
    cross += weight * signal[k] * (signal[k - lag] + signal[k + lag])
    own += weight * signal[k] * signal[k]
  }
  return Math.acos(cross / (2 * own)) / lag
}
