import { solveBracket } from './solveBracket'

/**
 * The first roots of a smooth function above a place, found by walking in steps and bisecting.
 *
 * Roots closer than a step are missed; the walk ends with an error after 100 000 steps.
 *
 * @param f the function
 * @param from where the walk starts, itself not a root
 * @param step width of a step, well under the distance of the roots
 * @param count number of roots wanted
 * @returns the roots in ascending order, shape (count)
 */
export function findRoots(f: (x: number) => number, from: number, step: number, count: number): number[] {
  const roots: number[] = []
  let last = f(from)
  for (let i = 1; roots.length < count; i++) {
    if (i > 100_000) throw new RangeError('Too few roots')
    const [low, high] = [from + (i - 1) * step, from + i * step]
    const next = f(high)
    if (last * next <= 0 && last !== 0) roots.push(solveBracket(f, low, high))
    last = next
  }
  return roots
}
