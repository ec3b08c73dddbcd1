import { expect } from 'vitest'

/** For what the method computes exactly: a few hundred roundings of numbers of this size. */
export const EXACT = 1e-11

/**
 * Holds a computed number against one found by hand.
 * @param tolerance largest difference as a share of the number found by hand
 */
export function expectClose(computed: number, byHand: number, tolerance = EXACT): void {
  expect(Math.abs(computed - byHand) / Math.abs(byHand), `${computed} for ${byHand}`).toBeLessThan(tolerance)
}

/** Holds the README of a sample to a number found by hand: it shows it with four digits and this unit. */
export function expectShown(readme: string, byHand: number, unit = ''): void {
  expect(readme).toContain(`${byHand.toPrecision(4)} ${unit}`.trim())
}
