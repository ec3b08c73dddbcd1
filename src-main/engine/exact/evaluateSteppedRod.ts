/**
 * Natural frequencies kL of a rod of two equal lengths of one material, section 1 fixed and section 2
 * free: tan^2(kL/2) = A1/A2, exact.
 *
 * @param ratio A2/A1 [1]
 * @param count number of modes
 * @returns kL in ascending order, shape (count) [1]
 */
export function evaluateSteppedRod(ratio: number, count: number): number[] {
  const first = Math.atan(Math.sqrt(1 / ratio))
  return Array.from({ length: count }, (_, i) =>
    i % 2 === 0 ? 2 * first + i * Math.PI : (i + 1) * Math.PI - 2 * first,
  )
}
