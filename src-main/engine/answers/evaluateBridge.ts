import type { Bridge } from '../../contract/rig'

/**
 * Output of a strain gauge bridge, V = excitation gain factor strain (sum of arms) / 4.
 *
 * The linear bridge formula (common practice; it leaves out the bridge's own non-linearity, about
 * factor x strain / 2 of the reading for one arm). Arms along the bar count 1 each. With a Poisson
 * ratio, half of two or four arms lie across the bar and count nu each. Four arms without a Poisson
 * ratio count 4, which only a rig whose opposite arms read the opposite strain can give.
 *
 * @param bridge the bridge
 * @param strain strain along the bar [1]
 * @returns the output [V], positive in tension
 */
export function evaluateBridge(bridge: Bridge, strain: number): number {
  const { excitation, gain, factor } = bridge
  return (excitation * gain * factor * strain * evaluateArms(bridge)) / 4
}

function evaluateArms({ arms, poisson }: Bridge): number {
  if (poisson === null || arms === 1) return arms
  return (arms / 2) * (1 + poisson)
}
