import type { BarState, EndTable, JointTable, Result } from '../../contract/result'
import { makeTable, type Table } from './table'

/**
 * Lists the joints between the bars.
 *
 * @param joints - from the left, SI
 * @returns peak force, impulse, contact and loss of each
 */
export function makeJointsTable(joints: JointTable[]): Table {
  return makeTable<JointTable>(
    [
      { heading: 'joint', measures: 'text', value: (joint) => joint.name },
      { heading: 'kind', measures: 'text', value: (joint) => joint.kind },
      { heading: 'peak force', measures: 'force', value: (joint) => joint.peakForce },
      { heading: 'impulse', measures: 'momentum', value: (joint) => joint.impulse },
      { heading: 'first closed', measures: 'time', value: (joint) => joint.closedFrom },
      { heading: 'time closed', measures: 'time', value: (joint) => joint.contactTime },
      { heading: 'energy lost', measures: 'energy', value: (joint) => joint.energyLost },
    ],
    joints,
  )
}

/**
 * Lists what the two ends of the line have done.
 *
 * @param ends - SI
 * @returns the left end, then the right end; the velocity is that of a rigid mass after the run
 */
export function makeEndsTable(ends: Result['ends']): Table {
  const rows: { name: string; end: EndTable }[] = [
    { name: 'left', end: ends.left },
    { name: 'right', end: ends.right },
  ]
  return makeTable<(typeof rows)[number]>(
    [
      { heading: 'end', measures: 'text', value: (row) => row.name },
      { heading: 'peak force', measures: 'force', value: ({ end }) => end.peakForce },
      { heading: 'impulse on the line', measures: 'momentum', value: ({ end }) => end.impulse },
      { heading: 'work on the line', measures: 'energy', value: ({ end }) => end.work },
      { heading: 'time with force', measures: 'time', value: ({ end }) => end.contactTime },
      { heading: 'mass there moves at', measures: 'velocity', value: ({ end }) => end.bodyVelocity },
    ],
    rows,
  )
}

/**
 * Lists the state of the bars at the end of the run.
 *
 * @param bars - from the left, SI
 * @returns momentum, mean velocity and energies of each
 */
export function makeBarStatesTable(bars: BarState[]): Table {
  return makeTable<BarState>(
    [
      { heading: 'bar', measures: 'text', value: (bar) => bar.name },
      { heading: 'momentum', measures: 'momentum', value: (bar) => bar.momentum },
      { heading: 'mean velocity', measures: 'velocity', value: (bar) => bar.velocity },
      { heading: 'kinetic energy', measures: 'energy', value: (bar) => bar.kinetic },
      { heading: 'strain energy', measures: 'energy', value: (bar) => bar.strain },
    ],
    bars,
  )
}
