import type { TransferMatrix } from './transferMatrix'

/**
 * The matrix of two stretches one after the other.
 *
 * @param first the stretch on the left
 * @param second the one on its right
 * @returns that of both together
 */
export function evaluateChain(first: TransferMatrix, second: TransferMatrix): TransferMatrix {
  return {
    a: second.a * first.a - second.b * first.c,
    b: second.a * first.b + second.b * first.d,
    c: second.c * first.a + second.d * first.c,
    d: second.d * first.d - second.c * first.b,
  }
}
