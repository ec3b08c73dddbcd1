/**
 * Turns a number in a unit into SI, rounded once: a unit that is a decimal fraction divides, so that
 * `5 us` is the number 5e-6 and not its neighbour.
 * @param number in the unit
 * @param factor SI value of one unit
 */
export function scaleByUnit(number: number, factor: number): number {
  const inverse = Math.round(1 / factor)
  return inverse > 1 && 1 / inverse === factor ? number / inverse : number * factor
}
