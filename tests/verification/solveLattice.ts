import type { End, Rig } from '../../src-main/contract/rig'

/** Forces and velocities on both faces of every node, one row per step. */
export interface Lattice {
  /** Shape (steps + 1) of (nodes) [N] [m/s]. */
  forceLeft: number[][]
  forceRight: number[][]
  velocityLeft: number[][]
  velocityRight: number[][]
}

interface Faces {
  forceLeft: number[]
  forceRight: number[]
  velocityLeft: number[]
  velocityRight: number[]
}

/**
 * Solves a line of uniform sections node by node in force and velocity, apart from the engine: along the two
 * characteristics that meet at a node, `F - Z v` keeps the value it had at its left neighbour one step before
 * and `F + Z v` that of its right neighbour. No waves, no delay lines, every cell at every step.
 *
 * Knows ends free, fixed, matched, force and velocity; joints bonded and contact.
 *
 * @param rig travel times whole multiples of its time step; velocities and preloads even in each bar
 */
export function solveLattice(rig: Rig): Lattice {
  const dt = rig.run.timeStep!
  const steps = Math.round(rig.run.duration / dt)
  /** Impedance of each cell, and the joint at each node that is one. */
  const Z: number[] = []
  const joints = new Map<number, { gap: number; contact: boolean }>()
  const start: Faces = { forceLeft: [], forceRight: [], velocityLeft: [], velocityRight: [] }
  const put = (side: 'Left' | 'Right', node: number, force: number, velocity: number) => {
    start[`force${side}`][node] = force
    start[`velocity${side}`][node] = velocity
  }
  rig.bars.forEach((bar, b) => {
    if (b > 0) {
      const joint = rig.joints[b - 1]
      const gap = joint.kind === 'contact' ? joint.gap : 0
      joints.set(Z.length, { gap, contact: joint.kind === 'contact' })
    }
    for (const { length, material, shape } of bar.sections) {
      const speed = Math.sqrt(material.modulus / material.density)
      for (let i = Math.round(length / speed / dt); i > 0; i--) {
        put('Right', Z.length, bar.preload, bar.uniformVelocity!)
        Z.push(material.density * speed * shape.area(0))
        put('Left', Z.length, bar.preload, bar.uniformVelocity!)
      }
    }
  })
  const nodes = Z.length
  // Beyond the ends a matched bar goes on as it stands.
  put('Left', 0, start.forceRight[0], start.velocityRight[0])
  put('Right', nodes, start.forceLeft[nodes], start.velocityLeft[nodes])

  const lattice: Lattice = { forceLeft: [], forceRight: [], velocityLeft: [], velocityRight: [] }
  let now = start
  for (let k = 0; k <= steps; k++) {
    const next: Faces = { forceLeft: [], forceRight: [], velocityLeft: [], velocityRight: [] }
    const keep = (node: number, force: number, left: number, right: number) => {
      next.forceLeft[node] = next.forceRight[node] = force
      next.velocityLeft[node] = left
      next.velocityRight[node] = right
    }
    /** F - Z v that comes along the cell at the left of a node. */
    const fromLeft = (node: number) => now.forceRight[node - 1] - Z[node - 1] * now.velocityRight[node - 1]
    /** F + Z v that comes along the cell at the right of a node. */
    const fromRight = (node: number) => now.forceLeft[node + 1] + Z[node] * now.velocityLeft[node + 1]

    const [leftForce, leftVelocity] = closeEnd(rig.leftEnd, -1, Z[0], fromRight(0), start, 0, k * dt)
    keep(0, leftForce, leftVelocity, leftVelocity)
    for (let node = 1; node < nodes; node++) {
      const [Z1, Z2, a, b] = [Z[node - 1], Z[node], fromLeft(node), fromRight(node)]
      const joint = joints.get(node)
      if (!joint?.contact) {
        const velocity = (b - a) / (Z1 + Z2)
        keep(node, a + Z1 * velocity, velocity, velocity)
      } else if (joint.gap + dt * (b / Z2 + a / Z1) >= 0) {
        keep(node, 0, -a / Z1, b / Z2)
        joint.gap += dt * (b / Z2 + a / Z1)
      } else {
        // What is left of the gap goes within the step: dt (v_left - v_right) = gap.
        const velocity = (b - a + (Z2 * joint.gap) / dt) / (Z1 + Z2)
        keep(node, a + Z1 * velocity, velocity, velocity - joint.gap / dt)
        joint.gap = 0
      }
    }
    const last = closeEnd(rig.rightEnd, 1, Z[nodes - 1], fromLeft(nodes), start, nodes, k * dt)
    keep(nodes, last[0], last[1], last[1])
    lattice.forceLeft.push(next.forceLeft)
    lattice.forceRight.push(next.forceRight)
    lattice.velocityLeft.push(next.velocityLeft)
    lattice.velocityRight.push(next.velocityRight)
    now = next
  }
  return lattice
}

/** Force and velocity at an end where `F + s Z v` arrives, s = +1 at the left end and -1 at the right one. */
function closeEnd(
  end: End,
  n: 1 | -1,
  Z: number,
  arriving: number,
  start: Faces,
  node: number,
  t: number,
): [number, number] {
  const s = -n
  switch (end.kind) {
    case 'free':
      return [0, (s * arriving) / Z]
    case 'fixed':
      return [arriving, 0]
    case 'force': {
      const force = n * end.pulse.value(t)
      return [force, (s * (arriving - force)) / Z]
    }
    case 'velocity': {
      const velocity = end.pulse.value(t)
      return [arriving - s * Z * velocity, velocity]
    }
    case 'matched': {
      const [F, v] = n === 1 ? [start.forceRight, start.velocityRight] : [start.forceLeft, start.velocityLeft]
      const outside = F[node] - s * Z * v[node]
      return [(arriving + outside) / 2, (s * (arriving - outside)) / (2 * Z)]
    }
    default:
      throw new Error(`the lattice knows no ${end.kind} end`)
  }
}
