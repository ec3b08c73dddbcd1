import { describe, expect, it } from 'vitest'
import { listInterfaces } from '../../../../src-main/engine/answers/listInterfaces'
import { makePlainLine, STEEL } from './makePlainLine'

describe('interfaces of a line', () => {
  it('lists the steps of a bar and every joint, by name and place', () => {
    const line = makePlainLine({
      bars: [
        { name: 'striker', velocity: 5, sections: [{ length: 0.3, diameter: 0.02 }] },
        {
          name: 'shaft',
          sections: [
            { length: 0.5, diameter: 0.02 },
            { length: 0.2, diameter: 0.02 },
            { length: 0.4, diameter: 0.04 },
          ],
        },
      ],
    })
    const [joint, step, ...rest] = listInterfaces(line)
    expect(rest).toEqual([])
    expect(joint).toMatchObject({
      name: 'striker | shaft',
      x: 0.3,
      fromLeft: { reflectedForce: 0, transmittedForce: 1 },
    })
    expect(step.name).toBe('shaft 2 | shaft 3')
    expect(step.x).toBeCloseTo(1, 14)
    // Area 1:4, Johnson (1972) ch. 1: +3/5, 8/5, stress 2/5; the reverse -3/5, 2/5, stress 8/5.
    expect(step.fromLeft.reflectedForce).toBeCloseTo(0.6, 14)
    expect(step.fromLeft.transmittedForce).toBeCloseTo(1.6, 14)
    expect(step.fromLeft.transmittedStress).toBeCloseTo(0.4, 14)
    expect(step.fromRight.reflectedForce).toBeCloseTo(-0.6, 14)
    expect(step.fromRight.transmittedStress).toBeCloseTo(1.6, 14)
    expect(step.leftImpedance).toBeCloseTo(8000 * 5000 * (Math.PI / 4) * 4e-4, 6)
    expect(step.rightImpedance / step.leftImpedance).toBeCloseTo(4, 13)
  })

  it('takes tapers at their faces: flush ends make no entry, a jump at the end does', () => {
    const line = makePlainLine({
      bars: [
        {
          name: 'horn',
          sections: [
            { length: 0.1, diameter: 0.02 },
            { length: 0.1, diameter: [0.02, 0.03] },
            { length: 0.1, diameter: 0.04 },
          ],
        },
      ],
    })
    const found = listInterfaces(line)
    expect(found.map((each) => each.name)).toEqual(['horn 2 | horn 3'])
    expect(found[0].rightImpedance / found[0].leftImpedance).toBeCloseTo(16 / 9, 13)
  })

  it('lists a change of area at matched impedance, since the stress changes there', () => {
    const light = { ...STEEL, name: 'light', density: 4000, modulus: 100e9 }
    const line = makePlainLine({
      bars: [
        {
          sections: [
            { length: 0.1, area: () => 1e-4 },
            { length: 0.1, area: () => 2e-4, material: light },
          ],
        },
      ],
    })
    const [only] = listInterfaces(line)
    expect(only.fromLeft.reflectedForce).toBeCloseTo(0, 14)
    expect(only.fromLeft.transmittedStress).toBeCloseTo(0.5, 14)
  })

  it('says where the ratios are those of a long pulse only', () => {
    const cushion = {
      kind: 'cushion',
      stiffness: 1e8,
      curve: null,
      unloading: null,
      damping: 0,
      mass: 0,
      gap: 0,
      tension: false,
    } as const
    const line = makePlainLine({
      bars: [
        { name: 'a', sections: [{ length: 0.1, diameter: 0.01 }] },
        { name: 'b', sections: [{ length: 0.1, diameter: 0.01 }] },
      ],
      joints: [cushion],
    })
    expect(listInterfaces(line)[0].name).toBe('a | b (cushion, long pulses)')
  })
})
