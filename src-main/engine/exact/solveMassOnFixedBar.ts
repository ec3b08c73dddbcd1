import { solveBracket } from './solveBracket'

/**
 * A rigid mass M at v0 that strikes a bar of mass m whose far end is fixed, alpha = m/M. Outgoing wave
 * s(tau), tau = ct/L, s0 = rho c v0, in the interval 2n < tau < 2n + 2 with x = tau - 2n:
 *
 *     s = s0 exp(-alpha x) p_n(x)
 *     p_0 = 1, p_n' = p_(n-1)' - 2 alpha p_(n-1), p_n(0) = p_(n-1)(0) + exp(-2 alpha)[p_(n-1)(2) - p_(n-2)(2)]
 *
 * Source: de Saint-Venant and Flamant, Comptes Rendus 97 (1883); Love, Treatise, art. 281 (from memory).
 */
export interface MassOnFixedBar {
  /** Stress at the struck end over s0, compression positive; at a front the value after it. */
  stress(tau: number): number
  /** Velocity of the mass over v0 while it touches. */
  velocity(tau: number): number
  /** ct/L at which the contact ends. */
  contactEnds: number
  /** Largest stress of the struck end over s0, and its ct/L. */
  struckPeak: { stress: number; tau: number }
  /** Largest stress of the fixed end over s0, and its ct/L. */
  fixedPeak: { stress: number; tau: number }
}

const SAMPLES = 400

/**
 * The exact collision of a rigid mass with a bar that is fixed at its far end.
 *
 * @param alpha m/M, the bar's mass over the rigid one, positive [1]
 * @returns histories, the end of contact and the peaks (see `MassOnFixedBar`)
 */
export function solveMassOnFixedBar(alpha: number): MassOnFixedBar {
  const p: number[][] = [[1]]
  const within = (n: number, x: number): number => {
    if (n < 0) return 0
    while (p.length <= n) p.push(evaluateNext(p, alpha))
    return Math.exp(-alpha * x) * evaluatePolynomial(p[n], x)
  }
  const s = (tau: number) => within(Math.floor(tau / 2), tau - 2 * Math.floor(tau / 2))
  const stress = (tau: number) => s(tau) + s(tau - 2)
  const contactEnds = solveContactEnd((n, x) => within(n, x) + within(n - 1, x))
  return {
    stress,
    velocity: (tau) => s(tau) - s(tau - 2),
    contactEnds,
    struckPeak: findPeak(stress, contactEnds, 0),
    fixedPeak: findPeak((tau) => 2 * s(tau), contactEnds, 1),
  }
}

/** The next polynomial of the row, coefficients in ascending powers. */
function evaluateNext(p: number[][], alpha: number): number[] {
  const last = p[p.length - 1]
  const before = p.length > 1 ? evaluatePolynomial(p[p.length - 2], 2) : 0
  const next = [last[0] + Math.exp(-2 * alpha) * (evaluatePolynomial(last, 2) - before)]
  for (let k = 0; k < last.length; k++) next.push((last[k + 1] ?? 0) - (2 * alpha * last[k]) / (k + 1))
  return next
}

function evaluatePolynomial(coefficients: number[], x: number): number {
  return coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0)
}

/** First zero of the contact stress, looked for interval by interval up to the last instant of each. */
function solveContactEnd(stress: (n: number, x: number) => number): number {
  for (let n = 0; ; n++)
    for (let i = 1; i <= SAMPLES; i++) {
      const [low, high] = [(2 * (i - 1)) / SAMPLES, (2 * i) / SAMPLES]
      if (stress(n, high) <= 0) return 2 * n + solveBracket((x) => stress(n, x), low, high)
    }
}

/** Largest value in 0..end of a function that jumps at even tau; a maximum between samples is closed in on. */
function findPeak(f: (tau: number) => number, end: number, delay: number): { stress: number; tau: number } {
  let best = 0
  for (let i = 1; (2 * i) / SAMPLES < end; i++) if (f((2 * i) / SAMPLES) > f(best)) best = (2 * i) / SAMPLES
  for (let step = 2 / SAMPLES; step > 1e-9; step /= 2)
    for (const tau of [best - step, best + step]) if (tau >= 0 && tau < end && f(tau) > f(best)) best = tau
  return { stress: f(best), tau: best + delay }
}
