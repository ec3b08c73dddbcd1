import { NOTICE } from '../../contract/notice'
import { formatNumber } from '../../documents/format/formatNumber'
import { writeTextTable } from '../../documents/tables/writeTextTable'
import type { CheckOutcome } from '../../selfcheck/runSelfcheck'
import { wrapText } from './wrapText'

const WIDTH = 96
/** Digits in which published and computed numbers are compared by eye. */
const DIGITS = 9

/**
 * Writes the published checks for the terminal: a row for each with the value that is farthest off, what fails in
 * full, the sources by number, the count and the notice.
 *
 * @param outcomes - of the checks, in their order; SI
 */
export function writeSelfcheckTables(outcomes: readonly CheckOutcome[]): string {
  const sources = [...new Set(outcomes.map(({ source }) => source))]
  const passed = outcomes.filter((outcome) => outcome.passed).length
  return [
    `Published results computed on this machine. Each row shows the value that is farthest off, of as many\n` +
      `values as it says; its error is relative, its source is listed below.\n`,
    writeTextTable({
      headings: ['check', 'what', 'source', 'values', 'published', 'computed', 'error', 'allowed', 'verdict'],
      numeric: [false, false, true, true, true, true, true, true, false],
      rows: outcomes.map((outcome) => [
        outcome.id,
        outcome.title,
        `[${sources.indexOf(outcome.source) + 1}]`,
        String(outcome.values.length),
        formatDigits(outcome.published),
        formatDigits(outcome.computed),
        formatNumber(outcome.error),
        formatNumber(outcome.tolerance),
        outcome.passed ? 'pass' : 'FAIL',
      ]),
      alarm: outcomes.map((outcome) => !outcome.passed),
    }),
    ...outcomes.filter((outcome) => !outcome.passed).map(writeFailure),
    `Sources\n${sources.map((source, i) => `  ${wrapText(`[${i + 1}] ${source}`, WIDTH - 2, '      ')}`).join('')}`,
    wrapText(NOTICE, WIDTH),
    `${passed} of ${outcomes.length} checks passed on this machine\n`,
  ].join('\n')
}

function writeFailure({ id, tolerance, reason, values }: CheckOutcome): string {
  const wrong = values.filter(({ error }) => !(error <= tolerance))
  const table = writeTextTable({
    headings: ['value', 'published', 'computed', 'error'],
    numeric: [false, true, true, true],
    rows: wrong.map(({ what, published, computed, error }) => [
      what,
      formatDigits(published),
      formatDigits(computed),
      formatNumber(error),
    ]),
    alarm: wrong.map(() => true),
  })
  return `${id} fails: allowed is ${formatNumber(tolerance)}, because ${reason}\n${table}`
}

function formatDigits(value: number): string {
  return String(Number(value.toPrecision(DIGITS))).replace('-', '−')
}
