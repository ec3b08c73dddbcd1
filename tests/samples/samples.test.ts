import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { describeCushionedRam } from './cushionedRam'
import { describeDropHammerShaft } from './dropHammerShaft'
import { describeForcePulseHorn } from './forcePulseHorn'
import { describeGasGunStriker } from './gasGunStriker'
import { describeHammerAgainstWall } from './hammerAgainstWall'
import { describePreloadedBarRelease } from './preloadedBarRelease'
import { describeSpallingRod } from './spallingRod'
import { describeSplitBarSpecimen } from './splitBarSpecimen'
import { describeYieldingRod } from './yieldingRod'
import { readReadme, sampleNames, samplesFolder, solveSample } from './solveSample'
import { describeSteelAluminiumRod } from './steelAluminiumRod'
import { describeThreeBarsWithGaps } from './threeBarsWithGaps'

/** Cautions that a sample must not raise: they would say that it is badly set up. */
const BAD_SETUP = [
  'negative-margin',
  'over-yield',
  'large-strain',
  'no-allowable',
  'buckling',
  'steep-taper',
  'travel-time-rounding',
  'energy-closure',
  'short-run',
]

/** Samples that are about going over a limit, with the caution that says so. */
const MEANT: Record<string, string[]> = {
  'spalling-rod': ['negative-margin'],
  'yielding-rod': ['over-yield'],
}

describe('the samples', () => {
  it('are all in the index, and nothing else is', () => {
    const index = readFileSync(join(samplesFolder, 'README.md'), 'utf8')
    const linked = [...index.matchAll(/\]\(([\w-]+)\/README\.md\)/g)].map(([, name]) => name)
    expect(linked.sort()).toEqual([...sampleNames].sort())
    expect(sampleNames.length).toBeGreaterThanOrEqual(7)
  })

  it('hold the one that the demo solves', () => {
    const { demo } = (JSON.parse(readFileSync(join(samplesFolder, '../package.json'), 'utf8')) as Manifest)
      .scripts
    const path = /samples\/\S+\.rig\.json/.exec(demo)?.[0]
    expect(existsSync(join(samplesFolder, '..', path ?? 'none'))).toBe(true)
  })

  it.each(sampleNames)('%s: has a README that gives the equation first and the way to run it', (name) => {
    const readme = readReadme(name)
    const headings = [...readme.matchAll(/^## (.*)$/gm)].map(([, heading]) => heading)
    expect(headings).toEqual([
      'Equation',
      'Scenario',
      'By hand and by the run',
      'What to look at',
      'Run it',
      'What the theory leaves out',
    ])
    expect(readme).toContain(`npx barwright solve samples/${name}/${name}.rig.json`)
  })

  it.each(sampleNames)(
    '%s: accounts for all energy and momentum, is set up well, names its sources',
    (name) => {
      const { rig, solution } = solveSample(name)
      // Rounding only: a few thousand steps add up.
      expect(solution.energy.closure).toBeLessThan(1e-12)
      expect(solution.momentum.closure).toBeLessThan(1e-12)
      const raised = solution.cautions.map(({ code }) => code).filter((code) => BAD_SETUP.includes(code))
      expect(raised).toEqual(MEANT[name] ?? [])
      const { margin } = solution.governing!
      expect(margin < 0).toBe(raised.includes('negative-margin'))
      expect(readReadme(name)).toContain(`${margin < 0 ? '' : '+'}${margin.toFixed(3)}`)
      for (const { material } of rig.bars.flatMap(({ sections }) => sections)) {
        expect(material.source).toMatch(/from memory|table|typical values|data sheet/)
      }
    },
  )
})

interface Manifest {
  scripts: Record<'demo', string>
}

describeDropHammerShaft()
describeGasGunStriker()
describeThreeBarsWithGaps()
describeHammerAgainstWall()
describeSteelAluminiumRod()
describePreloadedBarRelease()
describeForcePulseHorn()
describeCushionedRam()
describeSplitBarSpecimen()
describeSpallingRod()
describeYieldingRod()
