/** Least and largest value of what was looked at last; made once, so that a pixel allocates nothing. */
export const seen = new Float64Array(2)
