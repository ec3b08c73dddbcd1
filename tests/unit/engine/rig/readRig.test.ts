import { describe, expect, it } from 'vitest'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { EXAMPLE_RIG } from './exampleRig'

describe('readRig', () => {
  it('reads a whole rig into SI', () => {
    const { rig, faults } = readRig(JSON.stringify(EXAMPLE_RIG))
    expect(faults).toEqual([])
    expect(rig?.bars.map((bar) => bar.name)).toEqual(['striker', 'shaft'])
  })
})
