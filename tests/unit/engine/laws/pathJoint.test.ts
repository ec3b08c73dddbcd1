import { describe, expect, it } from 'vitest'
import { makeMass } from '../../../../src-main/engine/laws/bodies'
import { makeStraightCurve } from '../../../../src-main/engine/laws/loadingCurves'
import { makePathJoint, type JointOptions } from '../../../../src-main/engine/laws/pathJoint'
import { makePathLaw } from '../../../../src-main/engine/laws/pathLaw'
import { makeBeat, type Side } from '../../../../src-main/engine/laws/side'

const [M1, M2, V] = [2, 3, 5]
const M = (M1 * M2) / (M1 + M2)
const K = 4e7
/** Of two masses on the spring between them. */
const W = Math.sqrt(K / M)

type Method = 'characteristics' | 'elements'
const METHODS: Method[] = ['characteristics', 'elements']

/** Throws a mass on another one with a path law between; force of every step, compression positive, and what comes of it. */
function collide(
  method: Method,
  dt: number,
  steps: number,
  setup: { unloading?: number | null; gap?: number; options?: JointOptions } = {},
) {
  const beat = makeBeat(dt, 0, method)
  const force: number[] = []
  const [left, right] = [makeMass(M1, V, beat), makeMass(M2, 0, beat)]
  const watched: Side = {
    ...left,
    take(k, F, v) {
      force.push(-F)
      left.take(k, F, v)
    },
  }
  const law = makePathLaw(
    makeStraightCurve(K),
    setup.unloading ?? null,
    -(setup.gap ?? 0),
    setup.options?.pulls,
  )
  const joint = makePathJoint(watched, right, law, setup.options ?? { damping: 0, pulls: false }, beat)
  joint.advance(0, steps)
  const [V1, V2] = [left.momentum() / M1, right.momentum() / M2]
  return { force, V1, V2, joint, kinetic: left.kinetic(0) + right.kinetic(0) }
}
/** Time that the force of step k stands for: by characteristics the step's middle, with elements t_k. */
const timeOf = (method: Method, k: number, dt: number) => (method === 'elements' ? k : k + 0.5) * dt
const START = (M1 * V * V) / 2
const HALF = Math.PI / W

describe.each(METHODS)('a mass thrown on another across a spring, by %s', (method) => {
  it('F = v sqrt(K m) sin(w t), second order in the step, for half a period; then they part as elastic bodies do', () => {
    const errors = [50, 100, 200].map((count) => {
      const dt = HALF / count
      const { force, V1, V2 } = collide(method, dt, count + 20)
      expect(V1).toBeCloseTo((V * (M1 - M2)) / (M1 + M2), 2)
      expect(V2).toBeCloseTo((2 * V * M1) / (M1 + M2), 2)
      let worst = 0
      for (let k = 1; k < count - 1; k++) {
        worst = Math.max(
          worst,
          Math.abs(force[k] - V * Math.sqrt(K * M) * Math.sin(W * timeOf(method, k, dt))),
        )
      }
      for (const F of force.slice(count + 2)) expect(F).toBe(0)
      return worst / (V * Math.sqrt(K * M))
    })
    expect(errors[2]).toBeLessThan(1e-4)
    for (const ratio of [errors[0] / errors[1], errors[1] / errors[2]]) {
      expect(ratio).toBeGreaterThan(3.5)
      expect(ratio).toBeLessThan(4.5)
    }
  })

  it.each([1, 4, 25])(
    'unloading %d times as stiff gives back K/Ku of the energy: e = sqrt(K/Ku)',
    (gamma) => {
      const { V1, V2, joint, kinetic } = collide(method, HALF / 400, 900, { unloading: gamma * K })
      expect(Math.abs((V2 - V1) / V - 1 / Math.sqrt(gamma))).toBeLessThan(1e-3)
      expect(joint.strain()).toBe(0)
      expect(joint.dissipated() / ((M * V * V) / 2)).toBeCloseTo(1 - 1 / gamma, 2)
      expect((kinetic + joint.dissipated()) / START).toBeCloseTo(1, 12)
      expect((M1 * V1 + M2 * V2) / (M1 * V)).toBeCloseTo(1, 12)
    },
  )

  it('rigid unloading leaves them together', () => {
    const { V1, V2, joint } = collide(method, HALF / 400, 900, { unloading: Infinity })
    expect(Math.abs(V2 - V1) / V).toBeLessThan(0.01)
    expect(Math.abs(V1 / ((V * M1) / (M1 + M2)) - 1)).toBeLessThan(0.01)
    // What the spring held at its peak is lost.
    expect(joint.dissipated() / ((M * V * V) / 2)).toBeCloseTo(1, 3)
  })

  it('a gap is crossed at the first speed, and the same follows', () => {
    const dt = HALF / 200
    const late = 37
    const near = collide(method, dt, 260)
    // The first step of elements is half a one: contact then begins half a step later in its step than without gap.
    const share = method === 'elements' ? 1e-6 : 1e-9
    const far = collide(method, dt, 260 + late, { gap: V * dt * late })
    for (let k = 0; k < late - 1; k++) expect(far.force[k]).toBe(0)
    for (let k = 1; k < 240; k++) {
      expect(Math.abs(far.force[k + late] - near.force[k])).toBeLessThan(share * V * Math.sqrt(K * M))
    }
  })

  it("a dashpot beside the spring: F = K x + D x' of the damped swing, let go where it would pull", () => {
    const zeta = 0.2
    const D = 2 * zeta * M * W
    const dt = HALF / 400
    const wd = W * Math.sqrt(1 - zeta * zeta)
    const x = (t: number) => (V / wd) * Math.exp(-zeta * W * t) * Math.sin(wd * t)
    const rate = (t: number) =>
      V * Math.exp(-zeta * W * t) * (Math.cos(wd * t) - ((zeta * W) / wd) * Math.sin(wd * t))
    const { force, V1, V2, joint, kinetic } = collide(method, dt, 700, {
      options: { damping: D, pulls: false },
    })
    const scale = V * Math.sqrt(K * M)
    let end = 0
    for (let k = 1; k < force.length; k++) {
      const t = timeOf(method, k, dt)
      const F = K * x(t) + D * rate(t)
      if (F <= 0) {
        end = t
        break
      }
      expect(Math.abs(force[k] - F)).toBeLessThan(1e-3 * scale)
    }
    expect(end).toBeGreaterThan(HALF / 2)
    for (let k = Math.round(end / dt) + 2; k < force.length; k++) expect(force[k]).toBe(0)
    expect(Math.abs(V2 - V1 + rate(end)) / V).toBeLessThan(5e-3)
    expect((kinetic + joint.dissipated() + joint.strain()) / START).toBeCloseTo(1, 9)
  })

  it('one that pulls swings on for ever with its energy', () => {
    const dt = HALF / 50
    const { force, joint, kinetic } = collide(method, dt, 5000, { options: { damping: 0, pulls: true } })
    const scale = V * Math.sqrt(K * M)
    expect(Math.max(...force) / scale).toBeCloseTo(1, 2)
    expect(Math.min(...force) / scale).toBeCloseTo(-1, 2)
    expect((kinetic + joint.strain()) / START).toBeCloseTo(1, 10)
  })

  it('no stiffness is too high for the step: one of twenty contact times keeps energy and momentum', () => {
    const { V1, V2, joint, kinetic } = collide(method, 20 * HALF, 6)
    expect((kinetic + joint.strain()) / START).toBeCloseTo(1, 9)
    expect(M1 * V1 + M2 * V2).toBeCloseTo(M1 * V, 9)
  })
})
