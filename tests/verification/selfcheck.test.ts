import { describe, expect, it } from 'vitest'
import { CHECKS } from '../../src-main/selfcheck/checks'
import { runSelfcheck } from '../../src-main/selfcheck/runSelfcheck'

describe('the published checks that every user can run', () => {
  it.each(CHECKS.map((check) => [check.id, check] as const))('%s', (_id, check) => {
    const [{ passed, values, tolerance }] = runSelfcheck([check])
    expect(values.filter(({ error }) => !(error <= tolerance))).toEqual([])
    expect(passed).toBe(true)
  })
})
