import type { UnitDimension } from '../../format/units'
import type { ChartTable } from '../charts/chartTable'
import type { FrameSpec } from '../charts/frameSpec'
import type { TraceNote } from './describeWindow'

/** A trace on the sheet. */
export interface TraceItem {
  /** Unlike that of every other trace. */
  key: string
  name: string
  /** Where it is read, such as `shaft 400`. */
  where: string
  /** Place on the line [m]; null for the whole of it. */
  x: number | null
  dimension: UnitDimension
  note: TraceNote
  /** When the first pulse comes, such as `from 117 µs`; empty where that says nothing. */
  arrival: string
  /** Its value at a moment; null where there is none. */
  at(moment: number): number | null
  /** What it shows, in words. */
  summary: string
  table(): ChartTable
  /** Width that it asks for. */
  claim: { wanted: number; least: number }
  chart(width: number): FrameSpec
}
