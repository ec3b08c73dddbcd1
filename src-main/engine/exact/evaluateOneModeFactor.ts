/**
 * The same factor of a single spring and mass of period T = 4L/c, 1 + |sin(pi tr/T)|/(pi tr/T).
 *
 * @param rise tr c/L, positive [1]
 * @returns dynamic load factor [1]
 */
export function evaluateOneModeFactor(rise: number): number {
  const phase = (Math.PI * rise) / 4
  return 1 + Math.abs(Math.sin(phase)) / phase
}
