import { evaluatePlace, type Line } from './line'

/** Distance between the points of the difference formula, as a share of the bar's length. */
const SPACING = 1e-3

/**
 * Evaluates the force and the velocity that stand in the line at the start: `F = preload` or
 * `F = E A du/dx`.
 *
 * @param line the cut line
 * @param span index of the span
 * @param p position in it, 0..cells; at a face the area is that of this span
 * @returns force, tension positive [N]; velocity [m/s]
 */
export function evaluateInitial(line: Line, span: number, p: number): { force: number; velocity: number } {
  const { bar: index, area, source } = line.spans[span]
  const bar = line.rig.bars[index]
  const place = line.bars[index]
  const length = place.to - place.from
  const x = evaluatePlace(line.spans[span], p) - place.from
  const velocity = bar.uniformVelocity ?? bar.velocity(x, x / length)
  if (bar.displacement === null) return { force: bar.preload, velocity }
  const strain = differentiate((at) => bar.displacement!(at, at / length), x, length)
  return { force: source.material.modulus * area[p] * strain, velocity }
}

/** Derivative by the polynomial through five points around x that stay within 0..length; error of order h^4. */
function differentiate(u: (x: number) => number, x: number, length: number): number {
  const h = SPACING * length
  const centre = Math.min(length - 2 * h, Math.max(2 * h, x))
  const points = [-2, -1, 0, 1, 2].map((i) => centre + i * h)
  let slope = 0
  for (let i = 0; i < 5; i++) {
    let weight = 0
    for (let j = 0; j < 5; j++) {
      if (j === i) continue
      let product = 1 / (points[i] - points[j])
      for (let m = 0; m < 5; m++) {
        if (m !== i && m !== j) product *= (x - points[m]) / (points[i] - points[m])
      }
      weight += product
    }
    slope += weight * u(points[i])
  }
  return slope
}
