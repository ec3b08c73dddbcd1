import { readFileSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { layers } from './layers.mjs'

const START = '<!-- layers: made by `npm run layers`, from tests/checks/layers.mjs -->'
const END = '<!-- /layers -->'
const developers = new URL('../../DEVELOPERS.md', import.meta.url)

/** Draws the table of layers: a storey per line, each layer above all that it may import. */
export function drawLayers() {
  const storeys = []
  for (const layer of layers) {
    const storey = storeyOf(layer.name)
    storeys[storey] = [...(storeys[storey] ?? []), layer]
  }
  const width = Math.max(...layers.map(({ name }) => name.length)) + 2
  const lines = storeys
    .reverse()
    .flatMap((row, index) => [
      ...(index === 0 ? [] : ['  |']),
      ...row.map(({ name, what }) => `  ${name.padEnd(width)}${what}`),
    ])
  const table = layers.map(({ name, may }) => `| \`${name}\` | ${listNames(may)} |`)
  return [
    START,
    '',
    '```text',
    ...lines,
    '```',
    '',
    '| layer | may import |',
    '| --- | --- |',
    ...table,
    '',
    END,
  ].join('\n')
}

/** Finds the diagram that stands in DEVELOPERS.md. */
export function findDiagram() {
  const text = readFileSync(developers, 'utf8')
  return text.slice(text.indexOf(START), text.indexOf(END) + END.length)
}

function listNames(may) {
  const rooms = layers.map(({ name }) => name).filter((name) => name.startsWith('engine/'))
  const all = rooms.every((room) => may.includes(room))
  const names = all ? [...may.filter((name) => !rooms.includes(name)), 'every room of the engine'] : may
  return names.join(', ') || 'nothing'
}

function storeyOf(name) {
  const { may } = layers.find((layer) => layer.name === name)
  return may.length === 0 ? 0 : 1 + Math.max(...may.map(storeyOf))
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  writeFileSync(developers, readFileSync(developers, 'utf8').replace(findDiagram(), drawLayers))
}
