import { expect } from 'vitest'

/**
 * Expects a number within a share of a scale, and says what was found.
 *
 * @param found the number, finite
 * @param right what it should be
 * @param tolerance largest distance
 */
export function expectNear(found: number, right: number, tolerance: number, what = ''): void {
  const miss = Math.abs(found - right)
  expect(miss <= tolerance, `${what} ${found} for ${right}: ${miss} away, allowed ${tolerance}`.trim()).toBe(
    true,
  )
}
