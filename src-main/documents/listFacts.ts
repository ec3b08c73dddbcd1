import type { Result } from '../contract/result'
import { formatNumber } from './format/formatNumber'
import { formatQuantity } from './format/formatQuantity'

/** Name and value of one fact, as text for people. */
export type Fact = [name: string, value: string]

/**
 * Lists the facts of a run.
 *
 * @param result - SI
 * @returns method, duration, steps, cells and what the whole number of cells leaves over
 */
export function listRunFacts({ run, method, rig, software }: Result): Fact[] {
  const worst = run.travelTimeRounding.reduce((most, { error }) => Math.max(most, Math.abs(error)), 0)
  return [
    ['method', method],
    ['duration', formatQuantity(run.duration, 'time')],
    ['time step', formatQuantity(run.timeStep, 'time')],
    ['steps', String(run.steps)],
    ['cells', String(run.cells)],
    ['largest rounding of a travel time', `${formatNumber(worst * 100)} %`],
    ['time spent in the solve', formatQuantity(run.solveTime, 'time')],
    ['software', `${software.name} ${software.version}`],
    ['sha256 of the rig file', rig.sha256],
  ]
}

/**
 * Lists what proves a run: how far energy and momentum are from being kept.
 *
 * @param result - SI
 * @returns the relative closures and the energies at the end
 */
export function listClosures({ energy, momentum }: Result): Fact[] {
  const last = energy.t.length - 1
  const facts: Fact[] = [
    ['energy closure (relative)', formatNumber(energy.closure)],
    ['momentum closure (relative)', formatNumber(momentum.closure)],
  ]
  if (last < 0) return facts
  return [
    ...facts,
    ['kinetic energy at the end', formatQuantity(energy.kinetic[last], 'energy')],
    ['strain energy at the end', formatQuantity(energy.strain[last], 'energy')],
    ['dissipated', formatQuantity(energy.dissipated[last], 'energy')],
    ['work of the surroundings', formatQuantity(energy.work[last], 'energy')],
  ]
}

/**
 * Lists what is known of the striker.
 *
 * @param striker - SI; null where not exactly one thing moves at the start
 * @returns speed, pulse and highest safe speed
 */
export function listStrikerFacts(striker: Result['striker']): Fact[] {
  if (striker === null) return [['striker', 'none: not exactly one thing moves evenly at the start']]
  return [
    ['striker', striker.name],
    ['speed', formatQuantity(striker.speed, 'velocity')],
    ['length of its pulse', formatQuantity(striker.pulseLength, 'length')],
    ['duration of its pulse', formatQuantity(striker.pulseDuration, 'time')],
    [
      'speed at which the governing margin is zero',
      striker.safeSpeed === null ? 'not known for this rig' : formatQuantity(striker.safeSpeed, 'velocity'),
    ],
  ]
}
