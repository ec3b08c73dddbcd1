/** A shoulder with a fillet: the two widths across it and the radius in its corner, all [m]. */
export interface Shoulder {
  /** Diameter, or width of a flat bar, on the larger side. */
  larger: number
  /** Diameter, or width, on the smaller side. */
  smaller: number
  radius: number
  form: 'round' | 'flat'
}

export interface ShoulderFactor {
  /** Theoretical factor on the nominal stress of the smaller side [1]; null where the fit does not reach. */
  kt: number | null
  inRange: boolean
  /** Why there is no factor; empty where there is one. */
  reason: string
}

type Row = [constant: number, root: number, linear: number]

/** C1..C4 = constant + root sqrt(h/r) + linear h/r. */
const COEFFICIENTS: Record<Shoulder['form'], { low: Row[]; high: Row[] }> = {
  round: {
    low: [
      [0.926, 1.157, -0.099],
      [0.012, -3.036, 0.961],
      [-0.302, 3.977, -1.744],
      [0.365, -2.098, 0.878],
    ],
    high: [
      [1.2, 0.86, -0.022],
      [-1.805, -0.346, -0.038],
      [2.198, -0.486, 0.165],
      [-0.593, -0.028, -0.106],
    ],
  },
  flat: {
    low: [
      [1.006, 1.008, -0.044],
      [-0.115, -0.584, 0.315],
      [0.245, -1.006, -0.257],
      [-0.135, 0.582, -0.017],
    ],
    high: [
      [1.02, 1.009, -0.048],
      [-0.065, -0.165, -0.007],
      [-3.459, 1.266, -0.016],
      [3.505, -2.109, 0.069],
    ],
  },
}

const ROUNDING = 1e-9

/**
 * The theoretical stress concentration of a shoulder fillet in axial loading, a static elastic factor.
 *
 *     h = (D - d)/2,  q = h/r,  Kt = C1 + C2 (2h/D) + C3 (2h/D)^2 + C4 (2h/D)^3
 *
 * with two sets of C, for 0.1 <= q <= 2 and 2 <= q <= 20; q = 2 belongs to the low set, also when
 * rounding of D, d and r puts it up to 1e-9 above. Never below 1. Source: Pilkey, Peterson's Stress
 * Concentration Factors (charts of shoulder fillets in tension; chart numbers from memory).
 *
 * @param shoulder the two widths and the radius
 * @returns the factor, or null with the reason
 */
export function evaluateShoulderFactor(shoulder: Shoulder): ShoulderFactor {
  const { larger: D, smaller: d, radius: r, form } = shoulder
  const h = (D - d) / 2
  if (!(h > 0)) return refuse('there is no shoulder: both sides are equally wide')
  if (!(r > 0)) return refuse('the corner is sharp (radius 0)')
  const q = h / r
  if (q < 0.1 * (1 - ROUNDING))
    return refuse(`the radius is large for the step: h/r = ${q.toPrecision(3)}, the fit starts at 0.1`)
  if (q > 20 * (1 + ROUNDING))
    return refuse(`the radius is small for the step: h/r = ${q.toPrecision(3)}, the fit ends at 20`)
  const rows = COEFFICIENTS[form][q <= 2 * (1 + ROUNDING) ? 'low' : 'high']
  const [C1, C2, C3, C4] = rows.map(([constant, root, linear]) => constant + root * Math.sqrt(q) + linear * q)
  const w = (2 * h) / D
  return { kt: Math.max(1, C1 + w * (C2 + w * (C3 + w * C4))), inRange: true, reason: '' }
}

function refuse(reason: string): ShoulderFactor {
  return { kt: null, inRange: false, reason }
}
