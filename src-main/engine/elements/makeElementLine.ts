import type { Material, RunSettings } from '../../contract/rig'
import type { Line } from '../line/line'

/** Share of the elastic limit kept where finite compression makes the material stiffer: enough for a stretch of about 0.75. */
const FINITE_STRAIN_SHARE = 0.5

/** Linear bulk viscosity of an explicit run, as a share of rho c h (common practice). */
export const LINEAR_BULK = 0.06
/** Largest jump of velocity over one element for which the quadratic part is kept stable, as a share of c. */
const LARGEST_JUMP = 0.1
/** Quadratic bulk viscosity (common practice). */
export const QUADRATIC_BULK = 1.2

/**
 * Makes the line of a run with elements: the same cells, one element each, with the time step that
 * central difference allows, `dt = h/c (sqrt(1 + xi^2) - xi)` for the element with the least, xi
 * being the damping ratio of its highest mode.
 *
 * @param line the line cut for characteristics
 */
export function makeElementLine(line: Line): Line {
  const { run } = line.rig
  const limits = line.spans.map((span) => {
    const h = (span.to - span.from) / span.cells
    const xi = evaluateDamping(span.source.material, run, h, span.speed)
    return (h / span.speed) * (Math.sqrt(1 + xi * xi) - xi)
  })
  const dt = Math.min(...limits) * (run.finiteStrain ? FINITE_STRAIN_SHARE : 1)
  return { ...line, dt, steps: Math.max(1, Math.ceil(run.duration / dt - 1e-9)), rounding: [] }
}

/** Damping ratio of an element's highest mode, omega = 2 c / h. */
function evaluateDamping(material: Material, run: RunSettings, h: number, c: number): number {
  const viscous = ((material.viscosity ?? 0) * c) / (material.modulus * h)
  return viscous + (run.bulkViscosity ? LINEAR_BULK + QUADRATIC_BULK ** 2 * LARGEST_JUMP : 0)
}
