import type {
  InterfaceRatios,
  LineBarSummary,
  RunSummary,
  StepRatios,
  TaperAnswer,
} from '../../contract/result'
import { formatShare } from '../format/formatShare'
import { formatSection } from '../format/formatSection'
import { makeTable, type Table } from './table'

/**
 * Lists the bars of the line.
 *
 * @param bars - SI, from the left
 * @returns place, mass and travel time of each
 */
export function makeBarsTable(bars: LineBarSummary[]): Table {
  return makeTable<LineBarSummary>(
    [
      { heading: 'bar', measures: 'text', value: (bar) => bar.name },
      { heading: 'from', measures: 'length', value: (bar) => bar.from },
      { heading: 'to', measures: 'length', value: (bar) => bar.to },
      { heading: 'length', measures: 'length', value: (bar) => bar.to - bar.from },
      { heading: 'mass', measures: 'mass', value: (bar) => bar.mass },
      { heading: 'travel time', measures: 'time', value: (bar) => bar.travelTime },
    ],
    bars,
  )
}

interface InterfaceRow {
  at: InterfaceRatios
  from: 'left' | 'right'
  ratios: StepRatios
}

/**
 * Lists what a wave becomes at each step, for waves from either side.
 *
 * @param interfaces - from the left
 * @returns a row for each step and side, shares of what arrives
 */
export function makeInterfacesTable(interfaces: InterfaceRatios[]): Table {
  const rows = interfaces.flatMap((at): InterfaceRow[] => [
    { at, from: 'left', ratios: at.fromLeft },
    { at, from: 'right', ratios: at.fromRight },
  ])
  return makeTable<InterfaceRow>(
    [
      { heading: 'step', measures: 'text', value: ({ at }) => at.name },
      { heading: 'at', measures: 'length', value: ({ at }) => at.x },
      { heading: 'Z left', measures: 'impedance', value: ({ at }) => at.leftImpedance },
      { heading: 'Z right', measures: 'impedance', value: ({ at }) => at.rightImpedance },
      { heading: 'wave from', measures: 'text', value: (row) => row.from },
      { heading: 'force reflected', measures: 'ratio', value: ({ ratios }) => ratios.reflectedForce },
      { heading: 'force transmitted', measures: 'ratio', value: ({ ratios }) => ratios.transmittedForce },
      { heading: 'stress reflected', measures: 'ratio', value: ({ ratios }) => ratios.reflectedStress },
      { heading: 'stress transmitted', measures: 'ratio', value: ({ ratios }) => ratios.transmittedStress },
      { heading: 'energy reflected', measures: 'ratio', value: ({ ratios }) => ratios.reflectedEnergy },
      { heading: 'energy transmitted', measures: 'ratio', value: ({ ratios }) => ratios.transmittedEnergy },
    ],
    rows,
  )
}

/**
 * Lists the tapers and runs of small steps with their ratios for short and long pulses.
 *
 * @param tapers - from the left
 * @returns force ratios of a wave from the left
 */
export function makeTapersTable(tapers: TaperAnswer[]): Table {
  return makeTable<TaperAnswer>(
    [
      { heading: 'taper', measures: 'text', value: (taper) => taper.name },
      { heading: 'from', measures: 'length', value: (taper) => taper.from },
      { heading: 'to', measures: 'length', value: (taper) => taper.to },
      { heading: 'travel time', measures: 'time', value: (taper) => taper.travelTime },
      {
        heading: 'short pulse reflected',
        measures: 'ratio',
        value: (taper) => taper.shortPulse.reflectedForce,
      },
      {
        heading: 'short pulse transmitted',
        measures: 'ratio',
        value: (taper) => taper.shortPulse.transmittedForce,
      },
      {
        heading: 'long pulse reflected',
        measures: 'ratio',
        value: (taper) => taper.longPulse.reflectedForce,
      },
      {
        heading: 'long pulse transmitted',
        measures: 'ratio',
        value: (taper) => taper.longPulse.transmittedForce,
      },
    ],
    tapers,
  )
}

/**
 * Lists what the whole number of cells leaves over of each section's travel time.
 *
 * @param rounding - relative errors, in order along the line
 * @returns the share of each section in per cent, positive where it arrives late
 */
export function makeRoundingTable(rounding: RunSummary['travelTimeRounding']): Table {
  return makeTable<RunSummary['travelTimeRounding'][number]>(
    [
      { heading: 'section', measures: 'text', value: ({ bar, section }) => formatSection(bar, section) },
      { heading: 'rounding', measures: 'text', value: ({ error }) => formatShare(error) },
    ],
    rounding,
  )
}
