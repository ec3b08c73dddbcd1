import type { Rig } from '../../src-main/contract/rig'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'

/** Area along s of the line whose every cell differs; must match areaAt in reference.c. */
const GRADED_AREA = (s: number) => 1e-4 * (1 + 0.3 * s + 0.1 * Math.sin(40 * s))

/** A half-sine push of 20 us at the left end; the right end is fixed; four gauges; bar of 1 m, c = 5000 m/s. */
function makeBenchmarkRig(areas: (number | ((s: number) => number))[], cells: number, steps: number): Rig {
  const width = 0.1 / 5000
  const push = (t: number) => (t < width ? 1000 * Math.sin((Math.PI * t) / width) : 0)
  const sections = areas.map((area) => makeSection(1 / areas.length, area))
  const timeStep = 1 / cells / 5000
  return makeRig(
    [makeBar('bar', sections)],
    { duration: steps * timeStep, timeStep },
    {
      leftEnd: { kind: 'force', pulse: makePulse(push) },
      rightEnd: { kind: 'fixed' },
      gauges: [1, 2, 3, 4].map((i) => ({ name: `G${i}`, bar: 0, at: i / 5, bridge: null })),
    },
  )
}

export function makeGradedRig(cells: number, steps: number): Rig {
  return makeBenchmarkRig([GRADED_AREA], cells, steps)
}

export function makeSteppedRig(sections: number, cells: number, steps: number): Rig {
  const areas = Array.from({ length: sections }, (_, i) => 1e-4 * (1 + 0.25 * (i % 3)))
  return makeBenchmarkRig(areas, cells, steps)
}

/** The graded rig with a material that yields at a third of the pulse's stress. */
export function makePlasticRig(cells: number, steps: number): Rig {
  const rig = makeGradedRig(cells, steps)
  for (const section of rig.bars[0].sections) {
    section.material = { ...section.material, yield: 3e6, hardening: 20e9 }
  }
  return rig
}

/** A stepped line whose waves leave at a matched end, so that it decays to nothing. */
export function makeDecayingSteppedRig(sections: number, cells: number, steps: number): Rig {
  return { ...makeSteppedRig(sections, cells, steps), rightEnd: { kind: 'matched' } }
}

/** A line whose waves leave at a matched end, so that it decays to nothing. */
export function makeDecayingRig(cells: number, steps: number): Rig {
  return { ...makeGradedRig(cells, steps), rightEnd: { kind: 'matched' } }
}
