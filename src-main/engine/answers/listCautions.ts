import type { Caution, SectionPeaks } from '../../contract/result'
import type { Line } from '../line/line'
import type { RunRecord } from '../records/record'
import { listBucklingCautions } from './cautions/listBucklingCautions'
import { listFrontCautions } from './cautions/listFrontCautions'
import { listRunCautions } from './cautions/listRunCautions'
import { listShapeCautions } from './cautions/listShapeCautions'
import { listStrengthCautions } from './cautions/listStrengthCautions'

/**
 * Where this run leaves the theory, its data or its own time: what must be read beside the numbers.
 *
 * One caution per code, with all its places; what concerns strength first, what always holds last.
 *
 * @param line the cut line
 * @param record what the run recorded
 * @param sections the peaks of every section, in order
 * @returns cautions in plain words; at least the one on the user's own values
 */
export function listCautions(line: Line, record: RunRecord, sections: SectionPeaks[]): Caution[] {
  return [
    ...listStrengthCautions(line, sections),
    ...listBucklingCautions(line, record),
    ...listShapeCautions(line, sections),
    ...listFrontCautions(line, record),
    ...listRunCautions(line, record, sections),
  ]
}
