import { createHash } from 'node:crypto'
import type { Result } from '../../contract/result'
import { markup, Markup } from '../markup'
import { makeReportStyle } from './reportStyle'
import { drawComparisonPart } from './drawComparisonPart'
import { drawFatiguePart } from './drawFatiguePart'
import { drawHead } from './drawHead'
import { drawLinePart } from './drawLinePart'
import { drawProofPart } from './drawProofPart'
import { drawRunParts } from './drawRunParts'
import { drawSpallPart } from './drawSpallPart'
import { drawStressPart } from './drawStressPart'

/**
 * Writes the report of a run as one page that needs no other file, runs no script and loads nothing.
 *
 * @param result - SI; every text in it is escaped
 * @param rigText - the rig file as it was read, set at the end; left out where it is not at hand
 * @returns the text of `report.html`
 */
export function writeReport(result: Result, rigText?: string): string {
  return [...writeReportParts(result, rigText)].join('')
}

/**
 * Writes the report part by part, so that a run can be stopped between them.
 *
 * @param result - SI; every text in it is escaped
 * @param rigText - the rig file as it was read, set at the end; left out where it is not at hand
 * @returns the text of `report.html` in parts
 */
export function* writeReportParts(result: Result, rigText?: string): Generator<string> {
  const style = makeReportStyle()
  const policy = `default-src 'none'; style-src 'sha256-${hash(style)}'; base-uri 'none'; form-action 'none'`
  yield markup`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${new Markup(policy)}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<title>${result.rig.title} - ${result.software.name} report</title>
<style>${new Markup(style)}</style>
</head>
<body>
<main>
`.text
  yield drawHead(result).text
  yield drawStressPart(result).text
  yield drawFatiguePart(result.fatigue).text
  yield drawSpallPart(result).text
  yield drawComparisonPart(result.comparison).text
  yield drawLinePart(result).text
  for (const part of drawRunParts(result)) yield part.text
  yield drawProofPart(result, rigText).text
  yield markup`
</main>
<footer><p class="notice">${result.notice}</p></footer>
</body>
</html>
`.text
}

function hash(text: string): string {
  return createHash('sha256').update(text, 'utf8').digest('base64')
}
