import type { PageResult } from '../../../src-main/contract/bridge'
import type { StepRatios, TaperAnswer } from '../../../src-main/contract/result'

/** What becomes of a wave at a step or a taper, one row a share, from both sides. */
export interface StepView {
  name: string
  /** Where it begins and ends [m]. */
  from: number
  to: number
  isTaper: boolean
  rows: RatioRow[]
  /** Force shares that the picture draws. */
  picture: RatioPair
}

/** Shares of what arrives from the left and from the right; null where they are not known. */
export interface RatioPair {
  fromLeft: { reflected: number | null; transmitted: number }
  fromRight: { reflected: number | null; transmitted: number }
}

export interface RatioRow extends RatioPair {
  name: string
  strong: boolean
  /** Whether what is reflected has a sign. */
  signed: boolean
}

/**
 * Finds the step or taper nearest to a place, and what it does to waves from both sides.
 *
 * @param result - of the run
 * @param x - [m]
 * @returns null where the line has neither
 */
export function findStep(
  { interfaces, tapers }: Pick<PageResult, 'interfaces' | 'tapers'>,
  x: number,
): StepView | null {
  let nearest: { distance: number; make: () => StepView } | null = null
  const offer = (from: number, to: number, make: () => StepView): void => {
    const distance = Math.max(from - x, x - to, 0)
    if (!nearest || distance < nearest.distance) nearest = { distance, make }
  }
  for (const step of interfaces) offer(step.x, step.x, () => viewStep(step))
  for (const taper of tapers) offer(taper.from, taper.to, () => viewTaper(taper))
  return (nearest as { make: () => StepView } | null)?.make() ?? null
}

/** How close to 1 the way there and back through a taper without a step comes. */
const SMOOTH = 1e-9

function viewStep({ name, x, fromLeft, fromRight }: PageResult['interfaces'][number]): StepView {
  const row = (label: string, quantity: 'Energy' | 'Stress' | 'Force', strong = false): RatioRow => ({
    name: label,
    strong,
    signed: quantity !== 'Energy',
    fromLeft: readShares(fromLeft, quantity),
    fromRight: readShares(fromRight, quantity),
  })
  const force = row('force', 'Force', true)
  return {
    name,
    from: x,
    to: x,
    isTaper: false,
    rows: [row('energy', 'Energy'), row('stress', 'Stress'), force],
    picture: force,
  }
}

function readShares(
  ratios: StepRatios,
  quantity: 'Energy' | 'Stress' | 'Force',
): { reflected: number; transmitted: number } {
  return { reflected: ratios[`reflected${quantity}`], transmitted: ratios[`transmitted${quantity}`] }
}

/**
 * A taper gives its answers from the left. With R what a long pulse reflects there, the impedances before
 * and after stand as (1 - R) to (1 + R); from the right a long pulse reflects -R, and of any pulse passes
 * what passes from the left times Z_before / Z_after = (1 - R) / (1 + R).
 */
function viewTaper({ name, from, to, shortPulse, longPulse }: TaperAnswer): StepView {
  const R = longPulse.reflectedForce
  const back = (1 - R) / (1 + R)
  const long: RatioPair = {
    fromLeft: { reflected: R, transmitted: longPulse.transmittedForce },
    fromRight: { reflected: -R, transmitted: longPulse.transmittedForce * back },
  }
  const short: RatioPair = {
    fromLeft: { reflected: shortPulse.reflectedForce, transmitted: shortPulse.transmittedForce },
    fromRight: {
      // Without a step in it or at its ends a taper lets a short pulse pass by T there and 1 / T back, and
      // reflects none of it; where a step is, what it reflects to the right is not among the answers.
      reflected: Math.abs(shortPulse.transmittedForce ** 2 * back - 1) < SMOOTH ? 0 : null,
      transmitted: shortPulse.transmittedForce * back,
    },
  }
  const energy = { reflected: R * R, transmitted: 1 - R * R }
  return {
    name,
    from,
    to,
    isTaper: true,
    rows: [
      { name: 'energy', strong: false, signed: false, fromLeft: energy, fromRight: energy },
      { name: 'long force', strong: true, signed: true, ...long },
      { name: 'short force', strong: true, signed: true, ...short },
    ],
    picture: long,
  }
}
