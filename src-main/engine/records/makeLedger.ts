import type { MethodRun } from '../march/methodRun'
import type { EnergyLedger } from './record'

/** Energy and momentum of a whole run at one moment. */
interface Balance {
  kinetic: number
  strain: number
  dissipated: number
  work: number
  momentum: number
  impulse: number
  /** Size of the momenta at play, signs apart. */
  scale: number
}

/** Keeps the energy and momentum ledgers of a run at the sampled steps. */
export interface Ledger {
  /** Takes stock after step `steps[index]`; false where a number is not finite. */
  record(index: number): boolean
  finish(): EnergyLedger
}

/**
 * Makes the ledgers: stored energy from the waves of every cell, work and impulse from what the
 * surroundings gave, losses from what each joint took: the work done on it less what it stores. Nothing is
 * inferred from the balance of the whole, so that the closure is a check.
 *
 * @param steps sampled steps, ascending
 */
export function makeLedger(run: MethodRun, steps: Int32Array): Ledger {
  const count = steps.length
  const kinetic = new Float64Array(count)
  const strain = new Float64Array(count)
  const dissipated = new Float64Array(count)
  const work = new Float64Array(count)
  const start = takeStock(run, -1, null)
  const mass = sumMass(run)
  let worstEnergy = 0
  let largestEnergy = start.kinetic + start.strain
  let worstMomentum = 0
  let largestMomentum = Math.abs(start.momentum)

  return {
    record(index) {
      const now = takeStock(run, steps[index], { momentum: start.momentum, mass })
      kinetic[index] = now.kinetic
      strain[index] = now.strain
      dissipated[index] = now.dissipated
      work[index] = now.work
      const stored = now.kinetic + now.strain
      const imbalance = stored + now.dissipated - now.work - start.kinetic - start.strain
      worstEnergy = Math.max(worstEnergy, Math.abs(imbalance))
      largestEnergy = Math.max(largestEnergy, stored, Math.abs(now.work), now.dissipated)
      worstMomentum = Math.max(worstMomentum, Math.abs(now.momentum - now.impulse - start.momentum))
      largestMomentum = Math.max(largestMomentum, now.scale)
      return Number.isFinite(imbalance) && Number.isFinite(now.momentum)
    },
    finish: () => ({
      step: steps,
      kinetic,
      strain,
      dissipated,
      work,
      closure: largestEnergy > 0 ? worstEnergy / largestEnergy : 0,
      momentumClosure: largestMomentum > 0 ? worstMomentum / largestMomentum : 0,
    }),
  }
}

/** Mass that falls with gravity: the bars' cells and the bodies at the ends [kg]. */
function sumMass(run: MethodRun): number {
  const bars = run.line.bars.reduce((sum, _, bar) => sum + run.sumBar(bar, -1, 0).mass, 0)
  return run.bodies.reduce((sum, body) => sum + body.mass, bars)
}

/**
 * Takes stock after step k. Gravity's work is the sum over the steps of `gravity dt P`, P being the
 * momentum in the frame of the ground halfway between two steps.
 */
function takeStock(run: MethodRun, k: number, start: { momentum: number; mass: number } | null): Balance {
  const { dt, rig } = run.line
  const frame = start === null ? 0 : rig.gravity * dt * k
  const stock = { kinetic: 0, strain: 0, dissipated: 0, work: 0, momentum: 0, impulse: 0, scale: 0 }
  for (let bar = 0; bar < run.line.bars.length; bar++) {
    const state = run.sumBar(bar, k, frame)
    stock.kinetic += state.kinetic
    stock.strain += state.strain
    stock.dissipated += state.dissipated
    stock.momentum += state.momentum
    stock.scale += Math.sqrt(2 * state.kinetic * state.mass)
  }
  for (const body of run.bodies) {
    stock.kinetic += body.kinetic(frame)
    stock.strain += body.strain()
    stock.dissipated += body.dissipated()
    stock.momentum += body.momentum()
    stock.scale += Math.sqrt(2 * body.kinetic(frame) * body.mass)
  }
  for (const law of run.laws.values()) {
    stock.strain += law.strain()
    stock.dissipated += law.dissipated()
  }
  for (const outside of [run.outside.left, run.outside.right, ...run.outside.loads]) {
    stock.work += outside.work
    stock.impulse += outside.impulse
    stock.scale += Math.abs(outside.impulse)
    if (start !== null && rig.gravity !== 0) stock.work += rig.gravity * dt * outside.earlierImpulses
  }
  if (start !== null) stock.work += frame * start.momentum + (start.mass * frame * frame) / 2
  return stock
}
