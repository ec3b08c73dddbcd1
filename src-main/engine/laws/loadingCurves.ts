import type { LoadingCurve } from './pathLaw'

/**
 * A straight curve, `F = K closing`.
 *
 * @param stiffness K [N/m]
 */
export function makeStraightCurve(stiffness: number): LoadingCurve {
  return {
    force: (closing) => stiffness * closing,
    work: (closing) => (stiffness * closing * closing) / 2,
  }
}

/**
 * A curve of straight stretches through given points, going on with its last slope. A first point at
 * zero closing may carry a force: the curve then rises at once.
 *
 * @param closing ascending from zero, shape (count >= 2) [m]
 * @param force not falling, shape (count) [N]
 */
export function makeTableCurve(closing: readonly number[], force: readonly number[]): LoadingCurve {
  const works = [0]
  for (let i = 1; i < closing.length; i++) {
    works.push(works[i - 1] + ((force[i] + force[i - 1]) / 2) * (closing[i] - closing[i - 1]))
  }
  const find = (x: number) => {
    let i = 1
    while (i < closing.length - 1 && x > closing[i]) i++
    return i
  }
  const slope = (i: number) => (force[i] - force[i - 1]) / (closing[i] - closing[i - 1])
  return {
    force(x) {
      const i = find(x)
      return force[i - 1] + slope(i) * (x - closing[i - 1])
    },
    work(x) {
      const i = find(x)
      const past = x - closing[i - 1]
      return works[i - 1] + force[i - 1] * past + (slope(i) * past * past) / 2
    },
  }
}

/**
 * A power curve, `F = scale closing^exponent`.
 *
 * @param exponent above zero
 */
export function makePowerCurve(scale: number, exponent: number): LoadingCurve {
  return {
    force: (closing) => scale * Math.pow(closing, exponent),
    work: (closing) => (scale * Math.pow(closing, exponent + 1)) / (exponent + 1),
  }
}
