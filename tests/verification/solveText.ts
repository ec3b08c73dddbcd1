import type { Line } from '../../src-main/engine/line/line'
import { readRig } from '../../src-main/engine/rig/readRig'
import { makeSolve, type Solution } from '../../src-main/engine/solveRig'

/**
 * Solves a rig as its file would be: through the reader, to its end.
 *
 * @param document the rig file's content, or its text
 * @returns the cut line and the solution; throws with the reader's words where it is refused
 */
export function solveText(document: object | string): { line: Line; solution: Solution } {
  const { rig, faults } = readRig(typeof document === 'string' ? document : JSON.stringify(document))
  if (rig === null) throw new Error(faults.map(({ path, message }) => `${path}: ${message}`).join('\n'))
  const solve = makeSolve(rig)
  solve.advance(solve.steps)
  if (solve.broken) throw new Error('the numbers have stopped being finite')
  return { line: solve.line, solution: solve.finish() }
}
