import type { LineDrawing } from '../../../../src-main/contract/lineDrawing'
import type { Wavefront } from '../../../../src-main/contract/result'
import type { Palette } from '../../../plot/usePalette'
import type { Ticks } from '../../../plot/listTicks'
import type { SignMark } from './listSignMarks'

/** The governing point as the field marks it. */
export interface GoverningMark {
  /** [m] [s] */
  x: number
  t: number
  /** Such as `326 MPa`. */
  text: string
  /** True where its margin is negative. */
  over: boolean
}

/** When a joint carried force. */
export interface ContactSpell {
  /** [m] */
  x: number
  /** [s] */
  from: number
  to: number
}

/** All that the field shows over its picture. */
export interface FieldModel {
  palette: Palette
  stale: boolean
  /** Sizes of type [px]. */
  axisSize: number
  bodySize: number
  xTicks: Ticks
  tTicks: Ticks
  /** SI units in one of the rulers' units. */
  xUnit: number
  tUnit: number
  line: LineDrawing | null
  fronts: readonly Wavefront[]
  contacts: readonly ContactSpell[]
  /** Places [m] and times [s] at which bars came apart. */
  spalls: readonly { x: number; time: number }[]
  signs: readonly SignMark[]
  governing: GoverningMark | null
  /** Lines of the key in the lower right corner. */
  key: readonly string[]
}
