import { makeColourMap } from '../picture/colourMap'

const LIGHT = `--paper: #FBFAF6; --wash: #F3F1EA; --ink: #1A2027; --quiet: #525B65; --rule: #BDBCB3; --grid: #E3E1D8;
--tension: #B45600; --compression: #1E5099;`
const DARK = `--paper: #14191E; --wash: #1B2127; --ink: #E7EAEC; --quiet: #9FAAB4; --rule: #48525C; --grid: #29313A;
--tension: #F5AD53; --compression: #61B2F4;`

/**
 * Makes the style of the report: light, dark where the reader's screen asks for it, always light in print.
 *
 * @returns the text of the report's only style sheet
 */
export function makeReportStyle(): string {
  return `:root { ${LIGHT} color-scheme: light dark; }
${shadeRules('light')}
@media screen and (prefers-color-scheme: dark) { :root { ${DARK} }
${shadeRules('dark')} }
${LAYOUT}`
}

function shadeRules(scheme: 'light' | 'dark'): string {
  return makeColourMap(scheme)
    .map((colour, i) => `.s${i} { fill: ${colour}; background: ${colour}; }`)
    .join('\n')
}

const LAYOUT = `
* { box-sizing: border-box; }
body { margin: 0 auto; padding: 24px 12px; max-width: 1100px; background: var(--paper); color: var(--ink);
  font: 14px/1.45 "IBM Plex Sans Condensed", "Arial Narrow", "Roboto Condensed", system-ui, sans-serif;
  font-variant-numeric: tabular-nums; }
h1 { font-size: 28px; line-height: 1.2; margin: 0 0 4px; overflow-wrap: anywhere; }
h2 { font-size: 18px; margin: 32px 0 8px; border-top: 1px solid var(--rule); padding-top: 8px; break-after: avoid; }
h3 { font-size: 15px; margin: 16px 0 4px; break-after: avoid; overflow-wrap: anywhere; }
p { margin: 4px 0 8px; max-width: 90ch; overflow-wrap: anywhere; }
.notice { border: 2px solid var(--ink); padding: 8px 12px; font-weight: 600; max-width: none; }
.governing { border: 1px solid var(--rule); padding: 12px 16px; margin: 16px 0; break-inside: avoid; }
.governing .margin { font-size: 64px; line-height: 1; font-weight: 600; margin: 0; }
.governing .verdict { font-size: 18px; font-weight: 600; }
.governing.negative, tr.alarm td { background: var(--ink); color: var(--paper); print-color-adjust: exact;
  -webkit-print-color-adjust: exact; }
.governing.negative { border: 4px double var(--paper); outline: 4px solid var(--ink); }
.wide { overflow-x: auto; }
table { border-collapse: collapse; font-size: 13px; }
th, td { padding: 2px 10px 2px 0; text-align: left; vertical-align: bottom; border-bottom: 1px solid var(--grid); }
th { font-weight: 600; color: var(--quiet); border-bottom-color: var(--rule); }
td:first-child { min-width: 14ch; max-width: 30ch; overflow-wrap: anywhere; padding-left: 4px; }
th.number, td.number { text-align: right; } td.number { white-space: nowrap; }
tr { break-inside: avoid; }
dl { display: grid; grid-template-columns: max-content 1fr; gap: 2px 16px; margin: 4px 0 8px; }
dt { color: var(--quiet); } dd { margin: 0; overflow-wrap: anywhere; }
ol.cautions li { margin: 4px 0; overflow-wrap: anywhere; }
pre { background: var(--wash); padding: 12px; font-size: 12px; white-space: pre-wrap; overflow-wrap: anywhere; }
.key { color: var(--quiet); font-size: 12px; }
.picture { display: block; width: 100%; height: auto; break-inside: avoid; }
.sample { width: 36px; height: 8px; }
.swatch { display: inline-block; width: 14px; height: 10px; border: 1px solid var(--rule);
  print-color-adjust: exact; -webkit-print-color-adjust: exact; }
svg text { fill: var(--quiet); font-size: 11px; }
svg .middle { text-anchor: middle; } svg .end { text-anchor: end; }
svg path, svg .frame { fill: none; stroke: var(--ink); stroke-width: 1; }
svg .frame { stroke: var(--rule); } svg .grid { stroke: var(--grid); }
svg .field path { stroke: none; shape-rendering: crispEdges; }
svg .trace { stroke-width: 1.3; stroke-linejoin: round; }
svg .tension { stroke: var(--tension); } svg .compression { stroke: var(--compression); }
svg .dashed { stroke-dasharray: 7 4; } svg .dotted { stroke-dasharray: 1.5 3; }
svg .thin { stroke: var(--quiet); stroke-width: 0.7; }
svg .chain { stroke-dasharray: 12 3 2 3; stroke-width: 0.8; }
svg .limit { stroke-width: 1.1; } svg .overlap { stroke: var(--grid); stroke-width: 1.5; }
svg rect.pulse { fill: var(--quiet); }
@media print { body { padding: 0; max-width: none; font-size: 11px; } table { font-size: 9px; } th, td { padding-right: 6px; }
  .wide { overflow: visible; } h2 { margin-top: 18px; } .governing .margin { font-size: 40px; } @page { margin: 12mm; } }
`
