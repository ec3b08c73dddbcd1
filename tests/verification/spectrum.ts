import { findWorst } from './findWorst'

/** Nuttall's four-term window, sidelobes under -93 dB, main lobe 4 bins to each side. */
function makeWindow(count: number): Float64Array {
  const [a0, a1, a2, a3] = [0.355768, 0.487396, 0.144232, 0.012604]
  return Float64Array.from({ length: count }, (_, i) => {
    const phase = (2 * Math.PI * i) / count
    return a0 - a1 * Math.cos(phase) + a2 * Math.cos(2 * phase) - a3 * Math.cos(3 * phase)
  })
}

/** Amplitude, up to a common factor, of a windowed signal at an angular frequency [rad per step]. */
function evaluateAmplitude(signal: Float64Array, omega: number): number {
  // The rotation is renewed every 1024 steps, so that its rounding does not grow.
  let re = 0
  let im = 0
  const [dc, ds] = [Math.cos(omega), Math.sin(omega)]
  for (let from = 0; from < signal.length; from += 1024) {
    let c = Math.cos(omega * from)
    let s = Math.sin(omega * from)
    const to = Math.min(signal.length, from + 1024)
    for (let k = from; k < to; k++) {
      re += signal[k] * c
      im += signal[k] * s
      const next = c * dc - s * ds
      s = s * dc + c * ds
      c = next
    }
  }
  return Math.hypot(re, im)
}

function applyWindow(signal: ArrayLike<number>): Float64Array {
  let mean = 0
  const window = makeWindow(signal.length)
  let weight = 0
  for (let k = 0; k < signal.length; k++) {
    mean += window[k] * signal[k]
    weight += window[k]
  }
  mean /= weight
  return window.map((w, k) => (w * (signal[k] - mean)) / weight)
}

/**
 * Half the amplitude of the vibration at an angular frequency in a long signal, its mean taken off.
 *
 * @param signal one value per step
 * @param omega [rad per step]
 */
export function evaluateSpectrum(signal: ArrayLike<number>, omega: number): number {
  return evaluateAmplitude(applyWindow(signal), omega)
}

/** Peaks under this share of the signal's largest value are sidelobes of the window. */
const FAINT = 1e-4

/**
 * The lowest angular frequencies in a long vibration, each closed in on at a peak of its windowed spectrum.
 *
 * Two neighbours must be 8 bins apart, and the lowest 4 bins from zero, a bin being 2 pi over the steps.
 *
 * @param signal one value per step
 * @param count number of frequencies
 * @returns [rad per step], shape (count), or fewer where the spectrum has fewer peaks
 */
export function solveFrequencies(signal: ArrayLike<number>, count: number): number[] {
  const windowed = applyWindow(signal)
  const faint = FAINT * findWorst(signal)
  const bin = (2 * Math.PI) / signal.length
  const found: number[] = []
  let [before, here] = [evaluateAmplitude(windowed, 0), evaluateAmplitude(windowed, bin)]
  for (let i = 2; found.length < count && i * bin < Math.PI; i++) {
    const next = evaluateAmplitude(windowed, i * bin)
    if (here > before && here >= next && here > faint)
      found.push(findTop((at) => evaluateAmplitude(windowed, at), (i - 2) * bin, i * bin))
    before = here
    here = next
  }
  return found
}

/** Place of the maximum between two ends, by golden section and a parabola through its last points. */
function findTop(f: (x: number) => number, low: number, high: number): number {
  const golden = (Math.sqrt(5) - 1) / 2
  let [a, b] = [low, high]
  let [x, y] = [b - golden * (b - a), a + golden * (b - a)]
  let [fx, fy] = [f(x), f(y)]
  for (let i = 0; i < 12; i++) {
    if (fx > fy) {
      ;[b, y, fy] = [y, x, fx]
      x = b - golden * (b - a)
      fx = f(x)
    } else {
      ;[a, x, fx] = [x, y, fy]
      y = a + golden * (b - a)
      fy = f(y)
    }
  }
  const middle = (a + b) / 2
  const h = (high - low) / 200
  const [p, q, r] = [f(middle - h), f(middle), f(middle + h)]
  return middle + (h * (p - r)) / (2 * (p - 2 * q + r))
}
