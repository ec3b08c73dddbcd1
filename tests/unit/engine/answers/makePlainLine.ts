import type {
  Bar,
  End,
  Joint,
  Material,
  PointLoad,
  Rig,
  Section,
  SectionShape,
} from '../../../../src-main/contract/rig'
import type { Line, LineNode, Span } from '../../../../src-main/engine/line/line'

/** Steel that gives round numbers: c = 5000 m/s. */
export const STEEL: Material = {
  name: 'steel',
  density: 8000,
  modulus: 200e9,
  poisson: 0.3,
  allowable: { tension: 400e6, compression: 500e6 },
  yield: null,
  hardening: null,
  hardeningRule: 'isotropic',
  viscosity: null,
  spall: null,
  fatigue: null,
  source: '',
}

export interface PlainSection {
  length: number
  /** One diameter, or those at both faces of a cone [m]. */
  diameter?: number | [number, number]
  bore?: number
  /** In place of the diameter: the area along s [m^2]. */
  area?: (s: number) => number
  kind?: SectionShape['kind']
  fillet?: number
  material?: Material
  name?: string
  cells?: number
  allowable?: Section['allowable']
}

export interface PlainBar {
  name?: string
  velocity?: number
  preload?: number
  sections: PlainSection[]
}

export interface PlainRig {
  bars: PlainBar[]
  joints?: Joint[]
  leftEnd?: End
  rightEnd?: End
  loads?: PointLoad[]
  dt?: number
  duration?: number
  factorOfSafety?: number
}

function makeShape(plain: PlainSection): SectionShape {
  const { diameter, area, bore = 0 } = plain
  if (area !== undefined) {
    const uniform = area(0) === area(0.3) && area(0) === area(1)
    const circle = (s: number) => Math.sqrt((4 * area(s)) / Math.PI)
    return {
      kind: plain.kind ?? 'area',
      uniform,
      round: plain.kind !== undefined,
      area,
      diameter: circle,
      bore: () => 0,
    }
  }
  const [from, to] = Array.isArray(diameter) ? diameter : [diameter!, diameter!]
  const width = (s: number) => (s === 1 ? to : from + (to - from) * s)
  return {
    kind: plain.kind ?? (from !== to ? 'cone' : bore > 0 ? 'tube' : 'cylinder'),
    uniform: from === to,
    round: true,
    area: (s) => (Math.PI / 4) * (width(s) ** 2 - bore ** 2),
    diameter: width,
    bore: () => bore,
  }
}

function makeBar(plain: PlainBar, index: number): Bar {
  return {
    name: plain.name ?? `bar ${index + 1}`,
    sections: plain.sections.map((each) => ({
      name: each.name ?? '',
      length: each.length,
      material: each.material ?? STEEL,
      shape: makeShape(each),
      fillet: each.fillet ?? null,
      allowable: each.allowable ?? (each.material ?? STEEL).allowable,
    })),
    velocity: () => plain.velocity ?? 0,
    uniformVelocity: plain.velocity ?? 0,
    displacement: null,
    preload: plain.preload ?? 0,
  }
}

/** A checked rig of plain parts, free at both ends unless told otherwise. */
export function makePlainRig(plain: PlainRig): Rig {
  return {
    title: 'plain',
    notes: '',
    bars: plain.bars.map(makeBar),
    joints: plain.joints ?? plain.bars.slice(1).map(() => ({ kind: 'contact', gap: 0 })),
    leftEnd: plain.leftEnd ?? { kind: 'free' },
    rightEnd: plain.rightEnd ?? { kind: 'free' },
    loads: plain.loads ?? [],
    gravity: 0,
    gauges: [],
    factorOfSafety: plain.factorOfSafety ?? 1,
    run: {
      duration: plain.duration ?? 1e-3,
      cell: null,
      timeStep: plain.dt ?? 1e-6,
      method: 'characteristics',
      finiteStrain: false,
      lateralInertia: false,
      bulkViscosity: false,
      spall: false,
    },
  }
}

/** A line cut by hand, one span per section, so that the answers are tested apart from the cutting. */
export function makePlainLine(plain: PlainRig): Line {
  const rig = makePlainRig(plain)
  const dt = plain.dt ?? 1e-6
  const spans: Span[] = []
  const nodes: LineNode[] = []
  const bars: Line['bars'] = []
  const rounding: Line['rounding'] = []
  let x = 0
  rig.bars.forEach((bar, b) => {
    const firstSpan = spans.length
    const from = x
    let mass = 0
    let travelTime = 0
    bar.sections.forEach((source, section) => {
      const speed = Math.sqrt(source.material.modulus / source.material.density)
      const tau = source.length / speed
      const cells = Math.max(1, Math.round(tau / dt))
      const kind = spans.length === 0 ? 'left-end' : section === 0 ? 'joint' : 'step'
      nodes.push({ kind, x, joint: kind === 'joint' ? b - 1 : -1, loads: [] })
      const area = Float64Array.from({ length: cells + 1 }, (_, p) => source.shape.area(p / cells))
      const perArea = source.material.density * speed
      const impedance = Float64Array.from(
        { length: cells },
        (_, p) => perArea * source.shape.area((p + 0.5) / cells),
      )
      const to = x + source.length
      const { uniform } = source.shape
      spans.push({
        bar: b,
        section,
        source,
        from: x,
        to,
        sFrom: 0,
        sTo: 1,
        cells,
        uniform,
        speed,
        impedance,
        area,
      })
      rounding.push({ bar: b, section, error: (cells * dt - tau) / tau })
      mass += impedance.reduce((sum, Z) => sum + Z * dt, 0)
      travelTime += tau
      x = to
    })
    bars.push({ name: bar.name, from, to: x, mass, travelTime, firstSpan, lastSpan: spans.length - 1 })
  })
  nodes.push({ kind: 'right-end', x, joint: -1, loads: [] })
  return {
    rig,
    dt,
    steps: Math.round((plain.duration ?? 1e-3) / dt),
    length: x,
    bars,
    spans,
    nodes,
    rounding,
  }
}
