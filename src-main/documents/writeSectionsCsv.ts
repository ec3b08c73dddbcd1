import type { SectionPeaks, SensePeak } from '../contract/result'
import { writeCsv, type CsvCell } from './writeCsv'

const SENSE_HEADINGS = [
  'peak [Pa]',
  'at [m]',
  'time [s]',
  'kt [1]',
  'local [Pa]',
  'local at [m]',
  'local time [s]',
  'allowable [Pa]',
  'margin [1]',
]

/**
 * Writes the sections' peaks and margins as CSV, a row for each section with both senses.
 *
 * @param sections - SI; sections are counted from 0, as in `result.json`
 * @returns the text of `sections.csv` in parts; an absent factor, allowable or margin is an empty cell
 */
export function writeSectionsCsv(sections: SectionPeaks[]): Generator<string> {
  return writeCsv(
    [
      'bar',
      'section (from 0)',
      'from [m]',
      'to [m]',
      ...SENSE_HEADINGS.map((heading) => `tension ${heading}`),
      ...SENSE_HEADINGS.map((heading) => `compression ${heading}`),
    ],
    sections.length,
    (i) => sectionCells(sections[i]),
  )
}

function sectionCells(section: SectionPeaks): CsvCell[] {
  return [
    section.bar,
    section.section,
    section.from,
    section.to,
    ...peakCells(section.tension),
    ...peakCells(section.compression),
  ]
}

function peakCells(peak: SensePeak): CsvCell[] {
  const { kt, local, localAt, localTime, allowable, margin } = peak
  return [peak.peak, peak.at, peak.time, kt, local, localAt, localTime, allowable, margin]
}
