/**
 * The cycles to failure at a stress amplitude.
 *
 *     amplitude = strength (2 N)^exponent,   N = 0.5 (amplitude / strength)^(1 / exponent)
 *
 * for fully reversed stress within the range in which the line was measured; no endurance limit.
 * Source: Basquin (1910), in the form with reversals 2 N (from memory).
 *
 * @param strength fatigue strength coefficient [Pa], positive: the amplitude that breaks in one reversal
 * @param exponent fatigue strength exponent [1], negative, such as -0.09
 * @param amplitude half the stress range [Pa], zero or positive
 * @returns cycles N [1]; Infinity at amplitude 0
 */
export function evaluateBasquin(strength: number, exponent: number, amplitude: number): number {
  return 0.5 * (amplitude / strength) ** (1 / exponent)
}
