import { describe, expect, it } from 'vitest'
import { integrateArea } from '../../../../src-main/engine/line/integrateArea'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { EXAMPLE_RIG } from '../rig/exampleRig'
import { makeSection } from '../testRig'

/** Relative, as the rule promises. */
const PROMISED = 2e-13

function expectVolume(found: number, right: number) {
  expect(Math.abs(found / right - 1)).toBeLessThan(PROMISED)
}

describe('the volume of a section', () => {
  const L = 0.37
  it.each([
    ['uniform', 2e-3, 2e-3],
    ['cone', (s: number) => 1e-3 * (1 + 2 * s) ** 2, (1e-3 * (1 + 3 + 9)) / 3],
    ['exponential', (s: number) => 1e-3 * 9 ** s, (1e-3 * 8) / Math.log(9)],
    ['area-linear', (s: number) => 1e-3 * (3 - 2 * s), 2e-3],
    ['wave', (s: number) => 1e-3 * (1 + 0.5 * Math.sin(2 * Math.PI * 3 * s)), 1e-3],
    ['hook', (s: number) => 1e-3 * (0.2 + Math.sqrt(s)), 1e-3 * (0.2 + 2 / 3)],
  ] as const)('%s', (_name, area, mean) => {
    const found = integrateArea(makeSection(L, area))
    // The slope of the hook has no end at s = 0: there the rule stops at its deepest cut, at 1e-10.
    if (_name === 'hook') expect(Math.abs(found / (mean * L) - 1)).toBeLessThan(1e-10)
    else expectVolume(found, mean * L)
  })

  it('of the forms of a rig file: cylinder, tube, cone, exponential, area-linear, stations', () => {
    const sections = [
      { length: '0.2 m', diameter: '20 mm' },
      { length: '0.2 m', diameter: '20 mm', bore: '8 mm' },
      { length: '0.2 m', diameter: { from: '20 mm', to: '30 mm' } },
      { length: '0.2 m', diameter: { from: '20 mm', to: '30 mm' }, bore: '8 mm' },
      { length: '0.2 m', diameter: { from: '20 mm', to: '30 mm', profile: 'exponential' } },
      { length: '0.2 m', diameter: { from: '20 mm', to: '30 mm', profile: 'area-linear' } },
      { length: '0.2 m', area: '4 cm^2 * (1 + s^2)' },
      {
        length: '0.2 m',
        stations: [
          ['0 mm', '20 mm'],
          ['50 mm', '30 mm'],
          ['200 mm', '25 mm'],
        ],
      },
    ]
    const bars = [{ ...EXAMPLE_RIG.bars[0] }, { ...EXAMPLE_RIG.bars[1], sections }]
    const { rig, faults } = readRig(JSON.stringify({ ...EXAMPLE_RIG, bars }))
    expect(faults).toEqual([])
    const disc = (d: number) => (Math.PI / 4) * d * d
    const frustum = (a: number, b: number) => (Math.PI / 12) * (a * a + a * b + b * b)
    const right = [
      disc(0.02),
      disc(0.02) - disc(0.008),
      frustum(0.02, 0.03),
      frustum(0.02, 0.03) - disc(0.008),
      (disc(0.03) - disc(0.02)) / (2 * Math.log(1.5)),
      (disc(0.02) + disc(0.03)) / 2,
      4e-4 * (1 + 1 / 3),
      0.25 * frustum(0.02, 0.03) + 0.75 * frustum(0.03, 0.025),
    ]
    rig!.bars[1].sections.forEach((section, i) => {
      const found = integrateArea(section) / 0.2
      // Between stations the slope of the diameter jumps inside a panel of the rule.
      expect(Math.abs(found / right[i] - 1), `section ${i}`).toBeLessThan(i === 7 ? 1e-11 : PROMISED)
    })
  })
})
