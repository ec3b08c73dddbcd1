import type { GaugeTable } from '../../contract/result'
import type { Line } from '../line/line'
import type { PlaceTrace } from '../records/record'
import { evaluateBridge } from './evaluateBridge'
import { evaluateTrueStress } from './evaluateTrueStress'
import { findGaugePulses } from './findGaugePulses'

/**
 * Makes the table of each gauge: stress `F/A`, with finite strain also over
 * the deformed area, strain, the two directional waves, bridge
 * volts and the pulses that pass.
 *
 * @param traces in the order of the rig's gauges
 */
export function tabulateGauges(line: Line, traces: readonly PlaceTrace[]): GaugeTable[] {
  const { finiteStrain } = line.rig.run
  return line.rig.gauges.map(({ name, bridge }, i) => {
    const trace = traces[i]
    const force = Array.from(trace.force)
    const strain = Array.from(trace.strain)
    const stress = force.map((F) => F / trace.area)
    const nu = trace.poisson
    return {
      name,
      x: trace.x,
      t: force.map((_, k) => k * line.dt),
      stress,
      trueStress:
        finiteStrain && nu !== null ? stress.map((P, k) => evaluateTrueStress(P, 1 + strain[k], nu)) : [],
      strain,
      force,
      velocity: Array.from(trace.velocity),
      rightgoingForce: Array.from(trace.rightgoing),
      leftgoingForce: Array.from(trace.leftgoing),
      bridge: bridge === null ? [] : strain.map((e) => evaluateBridge(bridge, e)),
      pulses: findGaugePulses(trace, line.dt),
    }
  })
}
