import { CompensatedSum } from '../laws/compensatedSum'
import { elementKernel } from './elementKernel'
import { evaluateStartLoss } from './evaluateStartLoss'
import type { NodeLoad, Stepper } from './piece'

/** What a piece in the kernel is made of. */
export interface KernelPiece {
  first: number
  last: number
  nodeMass: Float64Array
  loads: NodeLoad[]
  dt: number
  /** How its plastic elements harden; null where all are elastic. */
  hardening: 'isotropic' | 'kinematic' | null
}

/**
 * Makes the stepper of a piece whose elements are linear or elastic-plastic and whose mass is
 * lumped: its loops are those of the kernel.
 */
export function makeKernelStepper(piece: KernelPiece): Stepper {
  const { first, last, nodeMass, loads, dt, hardening } = piece
  const { v, F, K, Y } = elementKernel
  // Elastic force before the latest step: the strain energy at the half step on is F F' / (2 K).
  const before = new Float64Array(last - first)
  const lost = new CompensatedSum()
  const start = { force: F.slice(first, last), v: v.slice(first, last + 1) }
  let plasticLead = 0
  let kickLeft = 0
  let kickRight = 0

  return {
    linear: hardening === null,
    get kickLeft() {
      return kickLeft
    },
    get kickRight() {
      return kickRight
    },
    admittanceLeft: Y[first],
    admittanceRight: Y[last],
    prepare(k, share) {
      kickLeft = share * Y[first] * F[first]
      kickRight = -share * Y[last] * F[last - 1]
      if (share !== 1) {
        for (let j = first + 1; j < last; j++) v[j] -= (1 - share) * Y[j] * (F[j] - F[j - 1])
      }
      for (const { slot, force } of loads) v[slot] += share * Y[slot] * force(k)
    },
    finish({ k, vLeft, vRight, keep }) {
      if (keep) for (let i = first; i < last; i++) before[i - first] = F[i]
      elementKernel.step(first, last, k, vLeft, vRight)
      if (hardening !== null) {
        elementKernel.yieldElements(first, last, hardening === 'kinematic')
        lost.add(dt * elementKernel.plasticWork)
        plasticLead = dt * elementKernel.plasticLead
      }
      if (k === 0) lost.add(evaluateStartLoss(start.force, start.v, v, first, dt))
    },
    elementForce: (slot) => F[slot],
    nodeForce: (slot) => (F[slot - 1] + F[slot]) / 2,
    keptForce: (slot) => (before[slot - first - 1] + before[slot - first]) / 2,
    kinetic(frame) {
      let sum = 0
      for (let j = first; j <= last; j++) sum += nodeMass[j - first] * (v[j] + frame) * (v[j] + frame)
      return sum / 2
    },
    strain(start) {
      let sum = 0
      for (let i = first; i < last; i++) sum += ((start ? F[i] : before[i - first]) * F[i]) / K[i]
      return (sum * dt) / 2
    },
    momentum() {
      let sum = 0
      for (let j = first; j <= last; j++) sum += nodeMass[j - first] * v[j]
      return sum
    },
    dissipated: () => lost.value - plasticLead,
  }
}
