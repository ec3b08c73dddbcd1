/**
 * Observed orders of convergence between successive grids, log(e1/e2)/log(ratio).
 *
 * @param errors on each grid, coarse to fine
 * @param ratio of the cells of two grids that follow each other
 * @returns one order fewer than grids
 */
export function evaluateOrders(errors: readonly number[], ratio = 2): number[] {
  return errors.slice(1).map((error, i) => Math.log(errors[i] / error) / Math.log(ratio))
}
