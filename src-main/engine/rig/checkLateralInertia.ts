import type { Bar, Material, RunSettings, Section } from '../../contract/rig'
import { estimateTimeStep, evaluateSectionSpeed } from './estimateTimeStep'
import type { FaultList } from './faultList'
import { faultText } from './faultText'
import { showLength, showNumber } from './showValue'

/** Cells that a bar needs at least, so that the mass matrix of its elements forgets one end at the other. */
const LEAST_CELLS = 64
/** Decay lengths that a bar needs at least: e^-25 is about 1e-11. */
const LEAST_DECAYS = 25

/**
 * Refuses a run with lateral inertia whose bars the equation or its solution does not fit: Poisson
 * ratio and round sections everywhere, and bars whose two ends do not feel each other within a step.
 *
 *     a force on one end is felt along the bar as exp(-x/l), l = nu sqrt(Ip/A), Ip the polar moment
 *
 * @param run cell or time step
 * @param bars from the left; null for a faulty one
 * @param used the materials of the bars
 * @param faults gets `conflict`, `missing`
 */
export function checkLateralInertia(
  run: Pick<RunSettings, 'cell' | 'timeStep'>,
  bars: readonly (Bar | null)[],
  used: readonly Material[],
  faults: FaultList,
): void {
  for (const { name, poisson } of used) {
    if (poisson === null) faults.add(['materials', name, 'poisson'], faultText.lateralNeedsPoisson())
  }
  bars.forEach((bar, b) => {
    bar?.sections.forEach(({ shape }, s) => {
      if (!shape.round) faults.add(['bars', b, 'sections', s, 'area'], faultText.lateralNeedsRound())
    })
    if (bar === null) return
    const length = bar.sections.reduce((sum, section) => sum + section.length, 0)
    const least = LEAST_DECAYS * Math.max(...bar.sections.map(evaluateDecay))
    if (length < least) faults.add(['bars', b], faultText.lateralNeedsLength(length, least))
  })
  checkCells(run, bars, faults)
}

/** The largest nu sqrt(Ip/A) of a section [m]; Ip/A = (D^2 + d^2)/8 of a round one. */
function evaluateDecay({ material, shape }: Section): number {
  const radius = (s: number) => Math.sqrt((shape.diameter(s) ** 2 + shape.bore(s) ** 2) / 8)
  return Math.abs(material.poisson ?? 0) * Math.max(radius(0), radius(0.5), radius(1))
}

/** Refuses a cell with which the bar of the fewest cells has too few. */
function checkCells(
  run: Pick<RunSettings, 'cell' | 'timeStep'>,
  bars: readonly (Bar | null)[],
  faults: FaultList,
): void {
  const sections = bars.flatMap((bar) => bar?.sections ?? [])
  const timeStep = estimateTimeStep(run, sections)
  if (!Number.isFinite(timeStep)) return
  let worst: { name: string; cells: number } | null = null
  for (const bar of bars) {
    if (bar === null) continue
    const travelTime = bar.sections.reduce((sum, one) => sum + one.length / evaluateSectionSpeed(one), 0)
    const cells = travelTime / timeStep
    if (cells < (worst?.cells ?? LEAST_CELLS)) worst = { name: bar.name, cells }
  }
  if (worst === null) return
  const finer = (value: number) => roundDown((value * worst.cells) / LEAST_CELLS)
  const advice =
    run.cell === null
      ? `a time step of at most ${showNumber(finer(timeStep) * 1e6)} us`
      : `a cell of at most ${showLength(finer(run.cell))}`
  const key = run.cell === null ? 'timeStep' : 'cell'
  faults.add(['run', key], faultText.lateralNeedsCells(worst.name, worst.cells, LEAST_CELLS, advice))
}

/** Rounds down to two digits. */
function roundDown(value: number): number {
  const digit = 10 ** (Math.floor(Math.log10(value)) - 1)
  return Math.floor(value / digit) * digit
}
