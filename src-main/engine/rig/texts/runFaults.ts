import { LIMITS } from '../limits'
import { showNumber, showValue } from '../showValue'
import type { FaultText } from './faultShape'

/** Why ends, joints, pulses, records and the run are refused. */
export const runFaults = {
  bothMotionAndForce: (given: readonly string[]): FaultText => ({
    code: 'both-motion-and-force',
    message: `this asks for ${given.join(' and ')}; at one point either a motion or a force may be prescribed, never both`,
  }),
  bondedGap: (): FaultText => ({
    code: 'conflict',
    message: 'a bonded joint has no gap; leave the gap out, or make the joint "contact"',
  }),
  oneOf: (names: readonly string[], given: number): FaultText =>
    given === 0
      ? { code: 'missing', message: `is missing; give one of ${names.join(', ')}` }
      : { code: 'conflict', message: `${names.join(' and ')} are given at once; keep one of them` },
  emptySupport: (): FaultText => ({
    code: 'missing',
    message:
      'a support needs a stiffness, a damping or a mass that is more than zero; for none of them write "free"',
  }),
  displacementJump: (how: string): FaultText => ({
    code: 'conflict',
    message: `a displacement cannot jump: ${how}; give it a finite rise`,
  }),
  notAscending: (what: string, row: number): FaultText => ({
    code: 'out-of-range',
    message: `${what} must rise from row to row; row ${row} does not come after the one before it`,
  }),
  riseOverDuration: (): FaultText => ({
    code: 'conflict',
    message: 'rise and fall together are longer than the duration',
  }),

  recordPath: (path: string, why: string): FaultText => ({
    code: 'record-path',
    message: `the record ${showValue(path)} is refused: ${why}; a record is named by a path inside the rig's folder, such as "records/hit.csv"`,
  }),
  recordRefused: (why: string): FaultText => ({ code: 'record-refused', message: why }),

  tooManyCells: (cells: number, advice: string): FaultText => ({
    code: 'too-many-cells',
    message: `the line would need about ${Math.round(cells)} cells; at most ${LIMITS.cells} are computed: ${advice}`,
  }),
  tooManySteps: (steps: number, advice: string): FaultText => ({
    code: 'too-many-steps',
    message: `the run would need about ${Math.round(steps)} steps; at most ${LIMITS.steps} are computed: ${advice}`,
  }),
  tooMuchMemory: (bytes: number, advice: string): FaultText => ({
    code: 'too-much-memory',
    message: `the run would hold about ${showNumber(bytes / 1024 ** 3)} GB; at most ${LIMITS.memory / 1024 ** 3} GB are taken: ${advice}`,
  }),
}
