import type { MethodRun } from '../march/methodRun'
import type { EndRecord, NodeTrace } from './record'

/**
 * Traces both sides of a node that has a law of its own over the whole run, in the frame of the
 * ground. Outside an end both sides read the bar's face.
 *
 * @param index of the line's node
 * @returns null at a node without a law
 */
export function traceNode(run: MethodRun, index: number): NodeTrace | null {
  const trace = run.readNode(index)
  const { gravity, dt } = run.beat
  if (trace === null || gravity === 0) return trace
  const add = (velocity: Float64Array) => velocity.map((v, k) => v + gravity * dt * k)
  return { ...trace, velocityLeft: add(trace.velocityLeft), velocityRight: add(trace.velocityRight) }
}

/**
 * Sums what the surroundings did to the bar at an end: impulse `n F dt`, work `n F v dt`.
 *
 * @param n +1 at the right end, -1 at the left end
 * @param dt [s]
 */
export function sumEnd(trace: NodeTrace, n: 1 | -1, dt: number): Omit<EndRecord, 'bodyVelocity'> {
  let impulse = 0
  let work = 0
  trace.reaction.forEach((F, k) => {
    impulse += n * F * dt
    work += n * F * trace.velocityLeft[k] * dt
  })
  return { impulse: impulse + 0, work: work + 0 }
}
