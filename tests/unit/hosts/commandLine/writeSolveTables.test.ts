import { expect, test } from 'vitest'
import { writeSolveTables } from '../../../../src-main/hosts/command-line/writeSolveTables'
import { makeTestResult } from '../../documents/makeTestResult'

test('impacts to failure stand in the tables where a material has a fatigue line', () => {
  const text = writeSolveTables(makeTestResult())
  expect(text).toContain('Fatigue: equal impacts to failure\n  section ')
  expect(text).toMatch(/shaft, section 1 +800\.0 +none +170\.3 +3 +7\.600 × 10⁻¹⁰ +1\.300 × 10⁹\n/)
})

test('without one they are left out', () => {
  expect(writeSolveTables({ ...makeTestResult(), fatigue: [] })).not.toContain('Fatigue')
})
