import type { Bar, PointLoad, Rig, Section } from '../../contract/rig'
import { chooseTimeStep, countCells } from './chooseTimeStep'
import { integrateArea } from './integrateArea'
import type { Line, LineNode, Span } from './line'

/**
 * Cuts a rig into cells of one common travel time.
 *
 * A section of travel time tau = L/c gets round(tau/dt) cells, at least one; what the rounding
 * leaves over is reported per section. Each cell has the impedance Z = rho c A at its middle,
 * which for a taper is second order in dt.
 *
 * @param rig a checked rig, SI
 */
export function makeLine(rig: Rig): Line {
  const dt = evaluateTimeStep(rig)
  const line: Line = {
    rig,
    dt,
    steps: Math.max(1, Math.ceil(rig.run.duration / dt - 1e-9)),
    length: 0,
    bars: [],
    spans: [],
    nodes: [{ kind: 'left-end', x: 0, joint: -1, loads: [] }],
    rounding: [],
  }
  rig.bars.forEach((bar, index) => addBar(line, bar, index))
  const last = line.nodes[line.nodes.length - 1]
  last.kind = 'right-end'
  last.joint = -1
  return line
}

function evaluateTimeStep(rig: Rig): number {
  if (rig.run.timeStep !== null) return rig.run.timeStep
  const sections = rig.bars.flatMap((bar) => bar.sections)
  const fastest = Math.max(...sections.map(evaluateSpeed))
  return chooseTimeStep(
    sections.map((section) => section.length / evaluateSpeed(section)),
    rig.run.cell! / fastest,
  )
}

/** c = sqrt(E/rho) [m/s]. */
function evaluateSpeed(section: Section): number {
  return Math.sqrt(section.material.modulus / section.material.density)
}

function addBar(line: Line, bar: Bar, index: number): void {
  const from = line.length
  const firstSpan = line.spans.length
  const loads = line.rig.loads.filter((load) => load.bar === index)
  let mass = 0
  let travelTime = 0
  let start = 0
  bar.sections.forEach((section, s) => {
    const tau = section.length / evaluateSpeed(section)
    const inside = loads.filter((load) => isInside(load, start, section, s === bar.sections.length - 1))
    const cells = Math.max(countCells(tau, line.dt), inside.length > 0 ? 2 : 1)
    line.rounding.push({ bar: index, section: s, error: (cells * line.dt - tau) / tau })
    addSection(line, index, s, section, from + start, cells, inside, start)
    mass += section.material.density * integrateArea(section)
    travelTime += tau
    start += section.length
  })
  line.length = from + start
  line.spans[line.spans.length - 1].to = line.length
  const last = line.nodes[line.nodes.length - 1]
  last.x = line.length
  last.kind = 'joint'
  last.joint = index
  line.bars.push({
    name: bar.name,
    from,
    to: line.length,
    mass,
    travelTime,
    firstSpan,
    lastSpan: line.spans.length - 1,
  })
}

function isInside(load: PointLoad, start: number, section: Section, last: boolean): boolean {
  return load.at >= start && (load.at < start + section.length || last)
}

/** Adds a section as one span, or as several that meet where a load acts (at the nearest cell inside). */
function addSection(
  line: Line,
  bar: number,
  index: number,
  section: Section,
  from: number,
  cells: number,
  loads: PointLoad[],
  start: number,
): void {
  const cuts = new Map<number, PointLoad[]>()
  for (const load of loads) {
    const at = Math.round(((load.at - start) / section.length) * cells)
    const cell = Math.min(cells - 1, Math.max(1, at))
    cuts.set(cell, [...(cuts.get(cell) ?? []), load])
  }
  const stops = [0, ...[...cuts.keys()].sort((a, b) => a - b), cells]
  for (let i = 0; i + 1 < stops.length; i++) {
    const span = makeSpan(bar, index, section, from, cells, stops[i], stops[i + 1])
    line.spans.push(span)
    const node: LineNode = { kind: 'step', x: span.to, joint: -1, loads: cuts.get(stops[i + 1]) ?? [] }
    line.nodes.push(node)
  }
}

function makeSpan(
  bar: number,
  index: number,
  section: Section,
  from: number,
  sectionCells: number,
  firstCell: number,
  lastCell: number,
): Span {
  const { shape, material, length } = section
  const cells = lastCell - firstCell
  const rhoC = Math.sqrt(material.modulus * material.density)
  const area = new Float64Array(cells + 1)
  const impedance = new Float64Array(cells)
  for (let p = 0; p <= cells; p++) area[p] = shape.area((firstCell + p) / sectionCells)
  for (let i = 0; i < cells; i++) {
    impedance[i] = rhoC * (shape.uniform ? area[0] : shape.area((firstCell + i + 0.5) / sectionCells))
  }
  return {
    bar,
    section: index,
    source: section,
    from: from + (length * firstCell) / sectionCells,
    to: from + (length * lastCell) / sectionCells,
    sFrom: firstCell / sectionCells,
    sTo: lastCell / sectionCells,
    cells,
    uniform: shape.uniform,
    speed: evaluateSpeed(section),
    impedance,
    area,
  }
}
