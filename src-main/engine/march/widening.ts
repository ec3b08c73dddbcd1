/**
 * A recorded peak is widened by this share, and gives way only to a larger one: rounding does not
 * move its time.
 */
export const WIDENING = 1 + 1e-13
