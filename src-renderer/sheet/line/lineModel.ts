import type { LineDrawing } from '../../../src-main/contract/lineDrawing'
import type { LineScale } from './makeLineScale'
import type { SectionModel } from './makeLineModel'
import type { Flag } from './placeFlags'

/** Everything that the parts of the line's drawing are drawn from. */
export interface LineModel {
  line: LineDrawing
  scale: LineScale
  sections: SectionModel[]
  flags: Flag[]
  /** Length of the line for a pixel [m]. */
  metresPerPixel: number
}
