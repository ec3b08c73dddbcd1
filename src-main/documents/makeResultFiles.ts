import type { Result } from '../contract/result'
import { writeReportParts } from './report/writeReport'
import { writeEnvelopeCsv } from './writeEnvelopeCsv'
import { writeGaugesCsv } from './writeGaugesCsv'
import { writeResultJson } from './writeResultJson'
import { writeSectionsCsv } from './writeSectionsCsv'

/** The files of a result folder, and no others. */
export const RESULT_FILE_NAMES = [
  'result.json',
  'envelope.csv',
  'gauges.csv',
  'sections.csv',
  'report.html',
] as const

export type ResultFileName = (typeof RESULT_FILE_NAMES)[number]

/** What each file holds: parts of a text, made when they are written. */
export type ResultFiles = Record<ResultFileName, () => Iterable<string>>

/**
 * Makes the files of a result folder.
 *
 * @param result - SI
 * @param rigText - the rig file as it was read, for the report
 * @returns each file's text, made only when it is asked for
 */
export function makeResultFiles(result: Result, rigText: string): ResultFiles {
  return {
    'result.json': () => writeResultJson(result),
    'envelope.csv': () => writeEnvelopeCsv(result.envelope),
    'gauges.csv': () => writeGaugesCsv(result.gauges),
    'sections.csv': () => writeSectionsCsv(result.sections),
    'report.html': () => writeReportParts(result, rigText),
  }
}
