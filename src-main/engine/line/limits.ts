/** Cells of a line at most. */
export const MOST_CELLS = 200_000
/** Steps of a run at most. */
export const MOST_STEPS = 5_000_000
