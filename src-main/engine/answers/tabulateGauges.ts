import type { GaugeTable } from '../../contract/result'
import type { Line } from '../line/line'
import type { PlaceTrace } from '../records/record'
import { evaluateBridge } from './evaluateBridge'
import { findGaugePulses } from './findGaugePulses'

/**
 * Makes the table of each gauge: stress `F/A`, strain, the two directional waves, bridge
 * volts and the pulses that pass.
 *
 * @param traces in the order of the rig's gauges
 */
export function tabulateGauges(line: Line, traces: readonly PlaceTrace[]): GaugeTable[] {
  return line.rig.gauges.map(({ name, bridge }, i) => {
    const trace = traces[i]
    const force = Array.from(trace.force)
    const strain = Array.from(trace.strain)
    return {
      name,
      x: trace.x,
      t: force.map((_, k) => k * line.dt),
      stress: force.map((F) => F / trace.area),
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
