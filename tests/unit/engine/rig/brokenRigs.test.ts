import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { BROKEN_RIGS } from './brokenRigs'
import { EXAMPLE_RIG } from './exampleRig'

describe('broken rigs', () => {
  const before = Object.getOwnPropertyNames(Object.prototype).sort()
  beforeAll(() => {
    // the parser is made at first use; its time is no rig's
    readRig(JSON.stringify(EXAMPLE_RIG).replace('2 mm', '1 mm + 1 mm'))
  })
  afterAll(() => {
    expect(Object.getOwnPropertyNames(Object.prototype).sort()).toEqual(before)
    expect(({} as { polluted?: unknown }).polluted).toBeUndefined()
    expect(readRig(JSON.stringify(EXAMPLE_RIG)).faults).toEqual([])
  })

  it('are at least 60, each under its own name', () => {
    expect(BROKEN_RIGS.length).toBeGreaterThanOrEqual(60)
    expect(new Set(BROKEN_RIGS.map(({ name }) => name)).size).toBe(BROKEN_RIGS.length)
  })

  it.each(BROKEN_RIGS)('refuses $name', ({ text, code, path, says }) => {
    const { rig, faults } = readRig(text)
    expect(rig).toBeNull()
    expect(faults.map((fault) => `${fault.code} at ${fault.path}`)).toEqual([`${code} at ${path}`])
    expect(faults[0].message).toMatch(says ?? /\w{2}/)
  })
})
