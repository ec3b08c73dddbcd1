import type { Comparison, JointTable, Result } from '../contract/result'
import { formatNumber } from './format/formatNumber'
import { formatQuantity } from './format/formatQuantity'
import { formatShare } from './format/formatShare'

/** Name and value of one fact, as text for people. */
export type Fact = [name: string, value: string]

/**
 * Lists the facts of a run.
 *
 * @param result - SI
 * @returns method, duration, steps, cells and what the whole number of cells leaves over
 */
export function listRunFacts({ run, method, comparison, rig, software }: Result): Fact[] {
  const worst = run.travelTimeRounding.reduce((most, { error }) => Math.max(most, Math.abs(error)), 0)
  return [
    ['method', comparison === null ? method : `${method}, compared with elements`],
    ['duration', formatQuantity(run.duration, 'time')],
    ['time step', formatQuantity(run.timeStep, 'time')],
    ['steps', String(run.steps)],
    ['cells', String(run.cells)],
    ['largest rounding of a travel time', formatShare(worst)],
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
export function listClosures({ energy, momentum, joints }: Result): Fact[] {
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
    ...listLosses(joints, energy.dissipated[last]),
    ['work of the surroundings', formatQuantity(energy.work[last], 'energy')],
  ]
}

/**
 * Lists how far the envelopes of the two methods are apart.
 *
 * @param comparison - shares of the largest stress
 * @returns the largest difference and where it is
 */
export function listComparison(comparison: Comparison): Fact[] {
  const { envelope, envelopeAt, envelopeSense } = comparison
  return [
    ['largest difference of the envelopes', `${formatShare(envelope)} of the largest stress`],
    ['where', `${formatQuantity(envelopeAt, 'length')}, ${envelopeSense}`],
  ]
}

/** Share of the energy lost under which a part of it is rounding. */
const ROUNDING = 1e-9

/** Which joints the dissipated energy was lost in, and what is left of it. */
function listLosses(joints: JointTable[], dissipated: number): Fact[] {
  const lossy = joints.filter(({ energyLost }) => energyLost > ROUNDING * dissipated)
  const rest = dissipated - lossy.reduce((sum, { energyLost }) => sum + energyLost, 0)
  const facts = lossy.map(({ name, kind, energyLost }): Fact => {
    const why = LOSSES[kind] ?? kind
    return [`  of it at ${name}`, `${formatQuantity(energyLost, 'energy')}, ${why}`]
  })
  if (rest <= ROUNDING * dissipated) return facts
  return [...facts, ['  of it in the bars and at the ends', formatQuantity(rest, 'energy')]]
}

const LOSSES: Readonly<Record<string, string>> = {
  contact: 'a contact that closes inside a step: falls with the cell, no physics',
  cushion: 'a cushion: its damping and its unloading',
  specimen: 'a specimen: its work of deformation',
}

/**
 * Lists what is known of the striker.
 *
 * @param striker - SI; null where not exactly one bar or mass moves at the start
 * @returns speed, pulse and highest safe speed
 */
export function listStrikerFacts(striker: Result['striker']): Fact[] {
  if (striker === null) return [['striker', 'none: no bar and no mass moves alone at the start']]
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
