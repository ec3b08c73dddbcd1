import { ESLint } from 'eslint'
import { describe, expect, it } from 'vitest'
import { drawLayers, findDiagram } from './layerDiagram.mjs'
import { layers } from './layers.mjs'

const lint = new ESLint({ cwd: `${import.meta.dirname}/../..` })

async function rulesBroken(path: string, text: string): Promise<string[]> {
  const [report] = await lint.lintText(text, { filePath: path })
  return report.messages.map(({ ruleId }) => ruleId ?? 'none')
}

describe('layers', () => {
  it.each([
    [
      'an engine room to the service',
      'src-main/engine/line/a.ts',
      '../../service/makeService',
      'makeService',
    ],
    ['the line to the records', 'src-main/engine/line/a.ts', '../records/record', 'record'],
    ['the page to the engine', 'src-renderer/app/a.ts', '../../src-main/engine/line/makeLine', 'makeLine'],
    [
      'one window host to the other',
      'src-main/hosts/desktop/a.ts',
      '../browser/startBrowserHost',
      'startBrowserHost',
    ],
  ])('lint refuses an import from %s', async (_what, path, from, name) => {
    const text = `import { ${name} } from '${from}'\nexport const a = ${name}\n`
    expect(await rulesBroken(path, text)).toEqual(['boundaries/dependencies'])
    const typed = `import type { ${name} } from '${from}'\nexport type A = ${name}\n`
    expect(await rulesBroken(path, typed)).toEqual(['boundaries/dependencies'])
  })

  it('lint lets a room import what the table names', async () => {
    const text = "import { NOTICE } from '../../contract/notice'\nexport const a = NOTICE\n"
    expect(await rulesBroken('src-main/engine/line/a.ts', text)).toEqual([])
  })

  it.each([
    ['a clock', 'export const a = Date.now()', 'no-restricted-globals'],
    ['another clock', 'export const a = performance.now()', 'no-restricted-globals'],
    ['chance', 'export const a = Math.random()', 'no-restricted-properties'],
    ['a locale', 'export const a = (1).toLocaleString()', 'no-restricted-properties'],
    ['a locale by Intl', 'export const a = new Intl.NumberFormat()', 'no-restricted-globals'],
    ['Node', "import { a } from 'node:fs'\nexport const b = a", 'no-restricted-imports'],
    ['the process', 'export const a = process.env', 'no-restricted-globals'],
    ['printing', "console.log('a')", 'no-restricted-globals'],
  ])('lint refuses %s in the engine', async (_what, text, rule) => {
    expect(await rulesBroken('src-main/engine/march/a.ts', `${text}\n`)).toEqual([rule])
  })

  it('lint refuses a folder that is not in the table', async () => {
    expect(await rulesBroken('src-main/stray/a.ts', 'export const a = 1\n')).toEqual([
      'boundaries/no-unknown-files',
    ])
  })

  it('names only layers that the table has, each above what it imports', () => {
    layers.forEach(({ name, may }, index) => {
      const below = layers.slice(0, index).map((layer) => layer.name)
      expect(below, name).toEqual(expect.arrayContaining(may))
    })
  })

  it('are drawn in DEVELOPERS.md as the table has them (npm run layers)', () => {
    expect(findDiagram()).toBe(drawLayers())
  })
})
