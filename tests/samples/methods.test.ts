import { describe, expect, it } from 'vitest'
import { sampleNames, solveSample } from './solveSample'

/** Samples whose waves have no jump: the methods agree at the sample's own cell. */
const SMOOTH = ['force-pulse-horn', 'steel-aluminium-rod']
/** Elements cannot come apart, and characteristics do not yield: nothing to compare. */
const ALONE = ['spalling-rod', 'yielding-rod']

const compared = sampleNames.filter((name) => !ALONE.includes(name))
const sharp = compared.filter((name) => !SMOOTH.includes(name))

describe('the samples by both methods', () => {
  it.each(compared)('%s: elements account for all energy and momentum', (name) => {
    const { solution } = solveSample(name, { method: 'elements' })
    expect(solution.method).toBe('elements')
    expect(solution.energy.closure).toBeLessThan(1e-9)
    expect(solution.momentum.closure).toBeLessThan(1e-9)
  })

  it.each(SMOOTH)('%s: the envelopes differ by less than 1 %, its pulse being smooth', (name) => {
    const { comparison } = solveSample(name, { method: 'both' }).solution
    expect(comparison!.envelope).toBeLessThan(0.01)
    for (const { rootMeanSquare } of comparison!.gauges) expect(rootMeanSquare).toBeLessThan(0.01)
    expect(comparison!.verdict).toContain('trust either')
  })

  // Elements ring behind a front that jumps, by a share that no cell takes away; what falls is the time they
  // ring for, and with it the mean difference: as the square root of the cell or faster.
  it.each(sharp)('%s: with sharp fronts the mean difference at the gauges falls with the cell', (name) => {
    const run = (share: number) =>
      solveSample(name, { method: 'both', edit: (text) => halveCell(text, share) }).solution.comparison!
    const [whole, half] = [run(1), run(0.5)]
    expect(whole.gauges.length).toBeGreaterThan(0)
    whole.gauges.forEach(({ rootMeanSquare }, i) => {
      expect(half.gauges[i].rootMeanSquare).toBeLessThan(0.8 * rootMeanSquare)
    })
  })
})

function halveCell(text: string, share: number): string {
  return text.replace(/"cell": "([\d.]+) (\w+)"/, (_all, cell, unit) => `"cell": "${Number(cell) * share} ${unit}"`)
}
