import type { Gauge } from '../../contract/rig'
import type { Line } from '../line/line'
import type { MethodRun, SpanTrace } from '../march/methodRun'
import type { PlaceTrace } from './record'

/** Where a gauge lies: between positions `position` and `position + 1` of a span, `share` of the way. */
interface Spot {
  span: number
  position: number
  share: number
}

/** Distance from a position, in cells, under which a gauge lies on it. */
const SAME = 1e-9

/**
 * Finds the spot of a gauge. On a step between two sections it lies in the right-hand one.
 */
function findSpot(line: Line, gauge: Gauge): Spot {
  const bar = line.bars[gauge.bar]
  const x = bar.from + gauge.at
  let span = bar.firstSpan
  while (span < bar.lastSpan && x >= line.spans[span].to) span++
  const { from, to, cells } = line.spans[span]
  const along = Math.min(cells, Math.max(0, ((x - from) / (to - from)) * cells))
  const nearest = Math.round(along)
  if (Math.abs(along - nearest) < SAME) return { span, position: nearest, share: 0 }
  return { span, position: Math.floor(along), share: along - Math.floor(along) }
}

/** Asks for the histories that the gauges will need; call before the first step. */
export function addProbes(run: MethodRun): void {
  for (const gauge of run.line.rig.gauges) {
    const { span, position, share } = findSpot(run.line, gauge)
    run.addProbe(span, position)
    if (share > 0) run.addProbe(span, position + 1)
  }
}

/**
 * Traces a gauge over the whole run. Between two positions force and velocity are interpolated
 * linearly, which is second order in the cell for a smooth wave and spreads a sharp front over one step.
 */
export function traceGauge(run: MethodRun, gauge: Gauge): PlaceTrace {
  const { line } = run
  const { span: index, position, share } = findSpot(line, gauge)
  const span = line.spans[index]
  const here = run.readTrace(index, position)
  const there = share > 0 ? run.readTrace(index, position + 1) : here
  const s = span.sFrom + ((span.sTo - span.sFrom) * (position + share)) / span.cells
  const { material, shape } = span.source
  const area = shape.area(s)
  const Z = Math.sqrt(material.modulus * material.density) * area
  const trace = {
    x: line.bars[gauge.bar].from + gauge.at,
    area,
    impedance: Z,
    modulus: material.modulus,
    poisson: material.poisson,
  }
  const { force, velocity, strain } = share > 0 ? blend(here, there, share) : here
  const stiffness = material.modulus * area
  const count = line.steps + 1
  const rightgoing = new Float64Array(count)
  const leftgoing = new Float64Array(count)
  for (let k = 0; k < count; k++) {
    const F = force[k]
    const Zv = Z * velocity[k]
    rightgoing[k] = (F - Zv) / 2
    leftgoing[k] = (F + Zv) / 2
  }
  const fall = line.rig.gravity * line.dt
  const ground = fall === 0 ? velocity : velocity.map((v, k) => v + fall * k)
  return {
    ...trace,
    force,
    strain: strain ?? force.map((F) => F / stiffness),
    velocity: ground,
    rightgoing,
    leftgoing,
  }
}

/** The trace a share of the way between two positions. */
function blend(here: SpanTrace, there: SpanTrace, share: number): SpanTrace {
  const mix = (from: Float64Array, to: Float64Array) => from.map((a, k) => a + share * (to[k] - a))
  return {
    force: mix(here.force, there.force),
    velocity: mix(here.velocity, there.velocity),
    strain: here.strain && there.strain && mix(here.strain, there.strain),
  }
}
