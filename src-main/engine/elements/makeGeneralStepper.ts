import { CompensatedSum } from '../laws/compensatedSum'
import { elementKernel } from './elementKernel'
import type { ElementMaterial } from './elementMaterial'
import { evaluateStartLoss } from './evaluateStartLoss'
import { LINEAR_BULK, QUADRATIC_BULK } from './makeElementLine'
import { makeMassSolver } from './massSolver'
import type { NodeLoad, Stepper } from './piece'

/** What a piece with any of the further laws is made of; element arrays have shape (elements). */
export interface GeneralPiece {
  first: number
  last: number
  nodeMass: Float64Array
  /** Lateral inertia rho nu^2 Ip / h of each element [kg]; null without it. */
  lateral: Float64Array | null
  loads: NodeLoad[]
  dt: number
  /** [m] */
  length: Float64Array
  /** [m^2] */
  area: Float64Array
  /** [kg/m^3] */
  density: Float64Array
  material: ElementMaterial[]
  finiteStrain: boolean
  bulkViscosity: boolean
}

/**
 * Makes the stepper of a piece with finite strain, viscosity, lateral inertia or bulk viscosity, its
 * elements elastic or elastic-plastic.
 *
 * Strain is `du/dX`, or with finite strain the logarithmic one, ln(1 + du/dX); the law gives the
 * stress of that strain and the nominal stress is `P = tau / (1 + du/dX)` (Hencky: the stress
 * conjugate to the logarithmic strain is the Kirchhoff stress). Viscous stress is `eta de/dt` and
 * bulk viscosity `rho h (b1 c + b2^2 h |de/dt|) de/dt`, its quadratic part in compression only; both
 * from the velocities of half a step before.
 */
export function makeGeneralStepper(piece: GeneralPiece): Stepper {
  const { first, last, nodeMass, lateral, loads, dt, length, area, density, material } = piece
  const { v, F } = elementKernel
  const count = last - first
  const solver = makeMassSolver(nodeMass, lateral)
  const strain = new Float64Array(count)
  const plasticStrain = new Float64Array(count)
  const back = new Float64Array(count)
  const radius = Float64Array.from(material, (one) => one.yield)
  // Of the latest step: elastic force and total force before it, viscous force, strain change,
  // plastic strain change.
  const before = new Float64Array(count)
  const total = new Float64Array(count)
  const viscous = new Float64Array(count)
  const change = new Float64Array(count)
  const flow = new Float64Array(count)
  const kick = new Float64Array(count + 1)
  const old = new Float64Array(count + 1)
  const lost = new CompensatedSum()
  let lead = 0
  const kelvin = material.some((one) => one.viscosity > 0) || piece.bulkViscosity

  for (let i = 0; i < count; i++) {
    // Initial forces come as linear ones; find the strain that carries them.
    strain[i] = findStrain(F[first + i] / area[i], material[i].modulus, piece.finiteStrain)
  }

  function evaluateViscous(i: number): number {
    const rate = (v[first + i + 1] - v[first + i]) / length[i]
    let stress = material[i].viscosity * rate
    if (piece.bulkViscosity) {
      const c = Math.sqrt(material[i].modulus / density[i])
      stress += density[i] * length[i] * LINEAR_BULK * c * rate
      if (rate < 0) stress -= density[i] * (QUADRATIC_BULK * length[i] * rate) ** 2
    }
    return stress * area[i]
  }

  /** Nominal elastic-plastic force of element i at its strain, with the return to the yield surface. */
  function evaluateForce(i: number): { force: number; plastic: number } {
    const one = material[i]
    const stretch = 1 + strain[i]
    const measure = piece.finiteStrain ? Math.log(stretch) : strain[i]
    let stress = one.modulus * (measure - plasticStrain[i])
    const past = stress - back[i]
    const over = Math.abs(past) - radius[i]
    let plastic = 0
    if (over > 0) {
      plastic = (Math.sign(past) * over) / (one.modulus + one.plasticModulus)
      stress -= one.modulus * plastic
      plasticStrain[i] += plastic
      if (one.kinematic) back[i] += one.plasticModulus * plastic
      else radius[i] += one.plasticModulus * Math.abs(plastic)
    }
    return { force: (piece.finiteStrain ? stress / stretch : stress) * area[i], plastic }
  }

  /** Elastic energy of element i at a strain of which a part is plastic [J]. */
  function evaluateEnergy(i: number, at: number, plastic: number): number {
    const measure = (piece.finiteStrain ? Math.log(1 + at) : at) - plastic
    return (material[i].modulus * measure * measure * area[i] * length[i]) / 2
  }

  return {
    linear: !piece.finiteStrain && material.every((one) => one.yield === Infinity),
    get kickLeft() {
      return kick[0]
    },
    get kickRight() {
      return kick[count]
    },
    admittanceLeft: dt * solver.compliance('left'),
    admittanceRight: dt * solver.compliance('right'),
    prepare(k, share) {
      for (let i = 0; i < count; i++) {
        viscous[i] = kelvin ? evaluateViscous(i) : 0
        total[i] = F[first + i] + viscous[i]
      }
      kick[0] = total[0]
      for (let j = 1; j < count; j++) kick[j] = total[j] - total[j - 1]
      kick[count] = -total[count - 1]
      for (const load of loads) kick[load.slot - first] += load.force(k)
      solver.solve(kick)
      for (let j = 0; j <= count; j++) kick[j] *= share * dt
    },
    finish({ k, share, vLeft, vRight, forceLeft, forceRight }) {
      for (let j = 0; j <= count; j++) {
        old[j] = v[first + j]
        v[first + j] += kick[j]
      }
      solver.addEnds(v, first, share * dt * -forceLeft, share * dt * forceRight)
      v[first] = vLeft
      v[last] = vRight
      lead = 0
      for (let i = 0; i < count; i++) {
        before[i] = F[first + i]
        const j = first + i
        change[i] = (dt * (v[j + 1] - v[j])) / length[i]
        strain[i] += change[i]
        const { force, plastic } = evaluateForce(i)
        F[j] = force
        flow[i] = plastic
        const volume = area[i] * length[i]
        if (plastic !== 0) {
          // Work on the plastic strain is that of the Kirchhoff stress.
          const now = (force / area[i]) * (piece.finiteStrain ? 1 + strain[i] : 1)
          const then = (before[i] / area[i]) * (piece.finiteStrain ? 1 + strain[i] - change[i] : 1)
          lost.add(0.5 * (now + then) * plastic * volume)
          lead += 0.5 * now * plastic * volume
        }
        if (kelvin) {
          const working = (v[j + 1] - v[j] + old[i + 1] - old[i]) / 2
          lost.add(share * dt * viscous[i] * working)
        }
      }
      if (k === 0) lost.add(evaluateStartLoss(before, old, v, first, dt))
      takeExtremes(k)
    },
    elementForce: (slot) => total[slot - first],
    nodeForce: (slot) => nodeForce(slot - first),
    keptForce: (slot) => nodeForce(slot - first),
    kinetic: (frame) => solver.kinetic(v, first, frame),
    strain(start) {
      let sum = 0
      for (let i = 0; i < count; i++) {
        if (start) sum += evaluateEnergy(i, strain[i], plasticStrain[i])
        else {
          const then = strain[i] - change[i]
          const stretch = piece.finiteStrain ? 1 + then : 1
          const elastic = before[i] * (change[i] - stretch * flow[i]) * length[i]
          sum += evaluateEnergy(i, then, plasticStrain[i] - flow[i]) + 0.5 * elastic
        }
      }
      return sum
    },
    momentum() {
      let sum = 0
      for (let j = 0; j <= count; j++) sum += nodeMass[j] * v[first + j]
      return sum
    },
    dissipated: () => lost.value - lead,
  }

  function nodeForce(node: number): number {
    return (total[node - 1] + total[node]) / 2
  }

  /** Takes the nodal forces of the step into the envelope. */
  function takeExtremes(k: number): void {
    for (let j = 1; j < count; j++) elementKernel.widen(first + j, nodeForce(j), k)
  }
}

/** Strain at which an elastic element carries a nominal stress [Pa] (Newton's method for Hencky). */
function findStrain(stress: number, modulus: number, finite: boolean): number {
  let strain = stress / modulus
  if (!finite) return strain
  for (let turn = 0; turn < 50; turn++) {
    const stretch = 1 + strain
    const residual = (modulus * Math.log(stretch)) / stretch - stress
    const slope = (modulus * (1 - Math.log(stretch))) / (stretch * stretch)
    strain -= residual / slope
  }
  return strain
}
