import { showLength, showNumber } from '../showValue'
import type { FaultText } from './faultShape'

/** Why a method cannot do what the rig asks of it. */
export const methodFaults = {
  needsElements: (what: string): FaultText => ({
    code: 'conflict',
    message: `${what} is computed with elements alone, but the method is "characteristics"; make the method "elements" or "both", or leave this out`,
  }),
  spallNeedsCharacteristics: (method: string): FaultText => ({
    code: 'conflict',
    message: `elements cannot come apart, but the method is ${JSON.stringify(method)}; make it "characteristics", or leave spall out`,
  }),
  spallWithoutStrength: (): FaultText => ({
    code: 'conflict',
    message:
      'no material of the line has a "spall" stress, so nothing could come apart; give one to a material, or leave this out',
  }),
  lateralNeedsPoisson: (): FaultText => ({
    code: 'missing',
    message:
      'is missing; lateral inertia needs the Poisson ratio of every material in the line: give a plain number, such as 0.3, or leave run.lateralInertia out',
  }),
  lateralNeedsRound: (): FaultText => ({
    code: 'conflict',
    message:
      'lateral inertia needs round sections; give a diameter in place of the area, or leave run.lateralInertia out',
  }),
  lateralNeedsCells: (bar: string, cells: number, least: number, advice: string): FaultText => ({
    code: 'conflict',
    message: `lateral inertia needs at least ${least} cells in every bar, but bar ${JSON.stringify(bar)} would have about ${Math.round(cells)}: give ${advice}`,
  }),
  lateralNeedsLength: (length: number, least: number): FaultText => ({
    code: 'conflict',
    message: `the bar is ${showLength(length)} long; lateral inertia is computed for a bar of at least ${showLength(least)} here, so that its two ends do not feel each other at once: make it longer or thinner, or leave run.lateralInertia out`,
  }),
  hardeningWithoutYield: (): FaultText => ({
    code: 'missing',
    message: 'is missing; hardening begins at the yield stress: give one, or leave hardening out',
  }),

  notFalling: (what: string, row: number): FaultText => ({
    code: 'out-of-range',
    message: `${what} must not fall from row to row; row ${row} lies under the one before it`,
  }),
  curveAllZero: (what: string): FaultText => ({
    code: 'out-of-range',
    message: `all ${what} of the curve are zero, so it would carry nothing; the last row must lie above zero`,
  }),
  tensionAcrossGap: (): FaultText => ({
    code: 'conflict',
    message: 'a cushion that also pulls is fixed to both bars and has no gap; leave the gap or "tension" out',
  }),
  tensionAndUnloading: (): FaultText => ({
    code: 'conflict',
    message:
      'a cushion that also pulls opens as it closes, and has no unloading stiffness of its own; leave "unloading" or "tension" out',
  }),
  unloadingTooSoft: (unloading: number, steepest: number): FaultText => ({
    code: 'out-of-range',
    message: `${showNumber(unloading)} N/m is softer than the loading, which rises by up to ${showNumber(steepest)} N/m: it would give back more than it took; give at least that much`,
  }),
}
