/** How far over its strength a place must be to open, so that rounding alone never opens one. */
const OVER = 1 + 1e-9
/** Cells beside a fresh face that its relief needs a step or two to reach. */
const NEAR = 2

/**
 * Finds the places that come apart in a row of nodes: of each run of neighbours over their strength
 * the one farthest over it. Nodes next to a fresh face wait while its relief reaches them.
 *
 * @param count inner nodes are 1..count-1; 0 and count are faces
 * @param load tension at an inner node over its strength
 * @param age steps since the face left (0) or right (count) of the row was opened; null for an old one
 * @returns positions, ascending
 */
export function findOpenings(
  count: number,
  load: (node: number) => number,
  age: { left: number | null; right: number | null },
): number[] {
  const waits = (distance: number, steps: number | null) =>
    steps !== null && distance <= NEAR && Math.abs(distance - steps) <= 1
  const found: number[] = []
  let worst = OVER
  let running = false
  for (let node = 1; node < count; node++) {
    const ratio = load(node)
    const over = ratio > OVER && !waits(node, age.left) && !waits(count - node, age.right)
    if (over && (!running || ratio > worst)) {
      if (running) found.pop()
      found.push(node)
      worst = ratio
    }
    running = over
  }
  return found
}
