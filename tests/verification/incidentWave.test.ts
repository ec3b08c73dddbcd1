import { describe, expect, it } from 'vitest'
import { INCIDENT_WAVE } from '../../src-main/engine/exact/published/examples'
import { expectNear } from './expectNear'
import { solveText } from './solveText'

/** Nine printed digits. */
const PRINTED = 1e-8
const ROUNDING = 1e-12

describe(`solved from a rig file, ${INCIDENT_WAVE.label}: ${INCIDENT_WAVE.source}`, () => {
  const { solution } = solveText({
    format: 'barwright-rig/1',
    title: 'Striker on an incident bar',
    materials: {
      steel: {
        density: '8000 kg/m^3',
        modulus: '200 GPa',
        poisson: 0.3,
        allowable: { tension: '1000 MPa', compression: '1000 MPa' },
      },
    },
    leftEnd: { kind: 'free' },
    bars: [
      {
        name: 'striker',
        material: 'steel',
        velocity: '20 m/s',
        sections: [{ length: '0.30 m', diameter: '20 mm' }],
      },
      { name: 'incident', material: 'steel', sections: [{ length: '2 m', diameter: '20 mm' }] },
    ],
    rightEnd: { kind: 'matched' },
    gauges: [
      {
        name: 'G1',
        bar: 'incident',
        at: '1 m',
        bridge: { factor: 2, arms: 2, excitation: '5 V', gain: 100 },
      },
    ],
    run: { duration: '540 us', cell: '5 mm' },
  })
  const [[strain, stress, force, duration, length, energy]] = INCIDENT_WAVE.rows
  const [gauge] = solution.gauges

  it('the gauge reads one rectangular pulse of the published strain, stress and force', () => {
    const during = gauge.t.flatMap((t, k) => (t > 199.5e-6 && t < 319.5e-6 ? [k] : []))
    const outside = gauge.t.flatMap((t, k) => (t > 199.5e-6 && t < 319.5e-6 ? [] : [k]))
    expect(during).toHaveLength(120)
    for (const k of during.filter((_, i) => i % 10 === 0 || i === 119)) {
      expectNear(gauge.strain[k] / -strain, 1, ROUNDING)
      expectNear(gauge.stress[k] / -stress, 1, ROUNDING)
      expectNear(gauge.force[k] / -force, 1, PRINTED)
      expectNear(gauge.velocity[k], 10, 10 * ROUNDING)
    }
    expect(Math.max(...outside.map((k) => Math.abs(gauge.strain[k])))).toBeLessThan(strain * ROUNDING)
  })

  it('its energy is that of the striker, which stops', () => {
    const dt = solution.run.timeStep
    const area = Math.PI * 0.01 ** 2
    const carried = gauge.rightgoingForce.reduce((sum, F) => sum + (F * F * dt) / (4e7 * area), 0)
    expectNear(carried / energy, 1, PRINTED)
    expectNear(solution.energy.kinetic[0] + solution.energy.strain[0], energy, energy * PRINTED)
    expectNear(solution.bars[0].velocity, 0, 20 * ROUNDING)
    expectNear(solution.ends.right.work / -energy, 1, PRINTED)
    expect(solution.energy.closure).toBeLessThan(ROUNDING)
    expect(solution.momentum.closure).toBeLessThan(ROUNDING)
  })

  it('the answers name the pulse: 0.6 m, 120 us, one way, clear', () => {
    expectNear(solution.striker!.pulseDuration! / duration, 1, ROUNDING)
    expectNear(solution.striker!.pulseLength! / length, 1, ROUNDING)
    expect(gauge.pulses).toHaveLength(1)
    const [pulse] = gauge.pulses
    expect(pulse).toMatchObject({ direction: 'right', clear: true })
    expectNear(pulse.peakForce / -force, 1, PRINTED)
    expectNear((pulse.to - pulse.from) / duration, 1, ROUNDING)
  })

  it('the largest speed that keeps 1000 MPa is 2 sigma/(rho c) = 50 m/s', () => {
    expectNear(solution.striker!.safeSpeed! / 50, 1, ROUNDING)
  })
})
