import type { Result } from '../../contract/result'
import { describeGoverning } from '../../documents/describeGoverning'
import { cleanLine } from '../../documents/format/cleanLine'
import { listClosures, listComparison, listRunFacts, listStrikerFacts } from '../../documents/listFacts'
import { makeComparisonTable } from '../../documents/tables/comparisonTable'
import { makeFatigueTable } from '../../documents/tables/fatigueTables'
import { makePulsesTable } from '../../documents/tables/gaugeTables'
import { makePeaksTable } from '../../documents/tables/peaksTable'
import { makeFragmentsTable, makeSpallsTable } from '../../documents/tables/spallTables'
import { writeTextTable } from '../../documents/tables/writeTextTable'
import { wrapText } from './wrapText'
import { writeFacts } from './writeFacts'

const WIDTH = 96
const PULSES_PER_GAUGE = 4

/**
 * Writes a result for the terminal, with what decides first.
 *
 * @param result - SI
 * @returns governing margin, striker, peaks, impacts to failure where known, first pulses at the gauges, spall,
 *   comparison of the methods, closures, cautions and notice
 */
export function writeSolveTables(result: Result): string {
  return [
    writeGoverning(result),
    `Striker\n${writeFacts(listStrikerFacts(result.striker))}`,
    `Peaks and margins of the sections\n${writeTextTable(makePeaksTable(result))}`,
    ...(result.fatigue.length === 0
      ? []
      : [`Fatigue: equal impacts to failure\n${writeTextTable(makeFatigueTable(result.fatigue))}`]),
    result.gauges.length === 0
      ? 'Gauges: none\n'
      : `First pulses at the gauges\n${writeTextTable(makePulsesTable(result.gauges, PULSES_PER_GAUGE))}`,
    ...writeSpall(result),
    ...writeComparison(result),
    `Energy and momentum\n${writeFacts(listClosures(result))}`,
    `The run\n${writeFacts(listRunFacts(result))}`,
    writeCautions(result),
    wrapText(result.notice, WIDTH),
  ].join('\n')
}

/**
 * Writes the few lines that follow a result folder.
 *
 * @param result - SI
 * @param folder - where the result was written
 * @returns governing margin, cautions, the folder and the notice
 */
export function writeSolveSummary(result: Result, folder: string): string {
  return [
    writeGoverning(result),
    writeCautions(result),
    `Result written to ${cleanLine(folder)}\n`,
    wrapText(result.notice, WIDTH),
  ].join('\n')
}

/**
 * Writes the few lines that follow a report.
 *
 * @param result - SI
 * @param file - where the report was written
 * @returns governing margin, the file and the notice
 */
export function writeReportSummary(result: Result, file: string): string {
  return [
    writeGoverning(result),
    `Report written to ${cleanLine(file)}\n`,
    wrapText(result.notice, WIDTH),
  ].join('\n')
}

function writeSpall({ spalls, fragments }: Result): string[] {
  if (spalls.length === 0) return []
  return [
    `Spall\n${writeTextTable(makeSpallsTable(spalls))}`,
    `Pieces at the end of the run\n${writeTextTable(makeFragmentsTable(fragments))}`,
  ]
}

function writeComparison({ comparison }: Result): string[] {
  if (comparison === null) return []
  const { gauges, verdict } = comparison
  const table = gauges.length === 0 ? '' : writeTextTable(makeComparisonTable(gauges))
  return [
    `The two methods compared; all other numbers are those of the characteristics\n` +
      `  ${wrapText(verdict, WIDTH - 2, '  ')}${writeFacts(listComparison(comparison))}${table}`,
  ]
}

function writeGoverning(result: Result): string {
  const { margin, negative, verdict, place } = describeGoverning(result)
  const rule = negative ? `${'!'.repeat(WIDTH)}\n` : ''
  const title = result.rig.title === '' ? '' : `${cleanLine(result.rig.title)}\n\n`
  const where = place === '' ? '' : `  ${wrapText(cleanLine(place), WIDTH - 2, '  ')}`
  return `${title}${rule}Governing margin ${margin}. ${verdict}\n${where}${rule}`
}

function writeCautions({ cautions }: Result): string {
  if (cautions.length === 0) return 'Cautions: none was raised\n'
  const lines = cautions.map(({ where, message }, i) => {
    const text = cleanLine(where === '' ? message : `${where}: ${message}`)
    return `  ${wrapText(`${i + 1}. ${text}`, WIDTH - 2, '     ')}`
  })
  return `Cautions\n${lines.join('')}`
}
