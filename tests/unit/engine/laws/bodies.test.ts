import { describe, expect, it } from 'vitest'
import { makeMass, makeMatched, makeMotion, makeSupport } from '../../../../src-main/engine/laws/bodies'
import { makeBond } from '../../../../src-main/engine/laws/bonded'
import { CompensatedSum } from '../../../../src-main/engine/laws/compensatedSum'
import { Outside } from '../../../../src-main/engine/laws/outside'
import { makeBeat } from '../../../../src-main/engine/laws/side'
import { makePlainSide } from './makePlainSide'

const DT = 1e-6
const beat = makeBeat(DT, 0, 'characteristics')
/** A bar of 1/Y kg/s left of the node, into which nothing comes. */
const Y = 2.5e-5
const still = () => makePlainSide(() => 0, Y, 1)

describe('a rigid mass', () => {
  it('on a bar without end slows as (1 - a)/(1 + a) each step, a = Z dt/2M: the midpoint rule', () => {
    const mass = 0.3
    const body = makeMass(mass, 7, beat)
    const bar = still()
    makeBond(bar, body, beat).advance(0, 50)
    const a = DT / Y / (2 * mass)
    for (let k = 0; k < 50; k++) {
      const [before, after] = [7 * ((1 - a) / (1 + a)) ** k, 7 * ((1 - a) / (1 + a)) ** (k + 1)]
      expect(bar.velocities[k] / ((before + after) / 2)).toBeCloseTo(1, 12)
    }
    // To second order that is exp(-Z t/M).
    const exact = 7 * Math.exp((-50 * DT) / Y / mass)
    expect(Math.abs(body.momentum() / mass / exact - 1)).toBeLessThan(((50 * a) / 3) * a * a * 4)
  })

  it('gains exactly the work of its force, and its momentum is the impulse', () => {
    const body = makeMass(0.3, 2, beat)
    const bar = makePlainSide((k) => 5 * Math.sin(k / 4), Y, 1)
    makeBond(bar, body, beat).advance(0, 100)
    let [work, impulse] = [0, 0]
    bar.forces.forEach((F, k) => {
      // Tension pulls a mass right of the node to the left.
      work -= F * bar.velocities[k] * DT
      impulse -= F * DT
    })
    expect(body.kinetic(0)).toBeCloseTo((0.3 * 4) / 2 + work, 12)
    expect(body.momentum()).toBeCloseTo(0.3 * 2 + impulse, 12)
    expect([body.strain(), body.dissipated()]).toEqual([0, 0])
    expect(body.kinetic(3)).toBeCloseTo((0.3 * (body.momentum() / 0.3 + 3) ** 2) / 2, 12)
  })
})

describe('a support', () => {
  it('alone is a spring: F = -K u at the mean of the step, and all its energy is kept', () => {
    const K = 4e7
    const outside = new Outside(beat)
    const body = makeSupport({ stiffness: K, damping: 0, mass: 0 }, beat, outside)
    const bar = makePlainSide((k) => (k < 10 ? 3 : 0), Y, 1)
    makeBond(bar, body, beat).advance(0, 200)
    let u = 0
    bar.velocities.forEach((v, k) => {
      expect(bar.forces[k]).toBeCloseTo(-K * (u + (v * DT) / 2), 7)
      u += v * DT
    })
    expect(body.strain()).toBeCloseTo((K * u * u) / 2, 12)
    expect(body.dissipated()).toBe(0)
    // The ground pushes the bar back with the force that presses it.
    const impulse = bar.forces.reduce((sum, F) => sum + F * DT, 0)
    expect(outside.impulse).toBeCloseTo(impulse, 14)
    // The ground does not move, so that it does no work.
    expect(outside.work).toBe(0)
  })

  it('with damping takes D v^2, with a mass keeps M V^2/2: together all that the bar puts in', () => {
    const [K, D, mass] = [2e7, 3e3, 0.2]
    const body = makeSupport({ stiffness: K, damping: D, mass }, beat, new Outside(beat))
    const bar = makePlainSide((k) => 4 * Math.sin(k / 9), Y, 1)
    makeBond(bar, body, beat).advance(0, 150)
    const work = bar.forces.reduce((sum, F, k) => sum + F * bar.velocities[k] * DT, 0)
    const damped = bar.velocities.reduce((sum, v) => sum + D * v * v * DT, 0)
    expect(body.dissipated()).toBeCloseTo(damped, 12)
    // The bar stands left: the tension does the work F v on it, and -F v on the support.
    expect(body.kinetic(0) + body.strain() + body.dissipated()).toBeCloseTo(-work, 12)
  })
})

describe('a prescribed motion', () => {
  it.each([1, -1] as const)(
    'moves as told whatever the force, and books its force and work; hand %d',
    (hand) => {
      const outside = new Outside(beat)
      const mover = makeMotion((k) => k / 10, hand, beat, outside)
      const bar = makePlainSide(() => 1, Y, hand === 1 ? -1 : 1)
      const law = hand === 1 ? makeBond(mover, bar, beat) : makeBond(bar, mover, beat)
      law.advance(0, 5)
      bar.velocities.forEach((v, k) => expect(v).toBeCloseTo(k / 10, 12))
      bar.forces.forEach((F, k) => expect(F).toBeCloseTo(-hand * (k / 10 - 1) * (1 / Y), 6))
      const impulse = bar.forces.reduce((sum, F) => sum - hand * F * DT, 0)
      const work = bar.forces.reduce((sum, F, k) => sum - hand * F * (k / 10) * DT, 0)
      expect(outside.impulse).toBeCloseTo(impulse, 15)
      expect(outside.work).toBeCloseTo(work, 15)
    },
  )
})

describe('a matched end', () => {
  it('takes in what comes and sends on for ever what stood in it at the start', () => {
    const Z = 1 / Y
    const incoming = [200, 0, -50]
    const outside = new Outside(beat)
    // A bar whose wave f arrives moves freely at -2 f/Z.
    const bar = makePlainSide((k) => (-2 * incoming[k]) / Z, Y, 1)
    const beyond = makeMatched(Z, 30, 0, -1, beat, outside)
    makeBond(bar, beyond, beat).advance(0, 3)
    bar.forces.forEach((F, k) => expect(F).toBeCloseTo(incoming[k] + 30, 9))
    // What leaves is F - f: the constant wave from beyond, nothing of what came.
    const impulse = bar.forces.reduce((sum, F) => sum + F * DT, 0)
    expect(outside.impulse).toBeCloseTo(impulse, 15)
  })
})

describe('what is booked outside', () => {
  it('counts impulse and work, gravity moving the point of the force', () => {
    const falling = makeBeat(0.1, 10, 'characteristics')
    const outside = new Outside(falling)
    outside.add(0, 5, 2)
    outside.add(1, -1, 3)
    expect(outside.impulse).toBeCloseTo(0.1 * 4, 14)
    expect(outside.work).toBeCloseTo(0.1 * (5 * 2 - 1 * (3 + 1)), 14)
    // Before the latest step 0.5 N s had been given.
    expect(outside.earlierImpulses).toBeCloseTo(0.5, 14)
  })
})

describe('a compensated sum', () => {
  it('keeps terms that a plain sum would lose', () => {
    const sum = new CompensatedSum()
    sum.add(1e16)
    for (let i = 0; i < 1000; i++) sum.add(1)
    sum.add(-1e16)
    expect(sum.value).toBe(1000)
    const tenths = new CompensatedSum()
    for (let i = 0; i < 1_000_000; i++) tenths.add(0.1)
    expect(tenths.value).toBeCloseTo(100_000, 10)
  })
})
