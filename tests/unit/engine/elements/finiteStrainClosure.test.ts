import { describe, expect, it } from 'vitest'
import { listRunCautions } from '../../../../src-main/engine/answers/cautions/listRunCautions'
import { marchElements } from '../march'
import { makeBar, makeRig, makeSection } from '../testRig'

describe('the caution about the closure of a run with elements', () => {
  const impact = (finiteStrain: boolean) => {
    const rig = makeRig(
      [
        makeBar('thrown', [makeSection(0.5, 1e-3)], { uniformVelocity: 20 }),
        makeBar('standing', [makeSection(0.5, 1e-3)]),
      ],
      { duration: 4e-4, timeStep: 5e-6 },
    )
    const { line, record } = marchElements({ ...rig, run: { ...rig.run, method: 'elements', finiteStrain } })
    const say = (closure: number) =>
      listRunCautions(line, { energy: { ...record.energy, closure } }, []).filter(
        (one) => one.code === 'energy-closure',
      )
    return { closure: record.energy.closure, say }
  }

  it('keeps quiet about what finite strain does not close by its nature, and speaks of more', () => {
    const { closure, say } = impact(true)
    expect(closure).toBeGreaterThan(1e-6)
    expect(say(closure)).toEqual([])
    expect(say(2e-3)[0].message).toContain('where 1e-3 and 1e-9 are expected')
  })

  it('holds everything else to 1e-9', () => {
    const { closure, say } = impact(false)
    expect(say(closure)).toEqual([])
    expect(say(2e-9)).toHaveLength(1)
  })
})
