/**
 * Measures the engine against the plain C references of this folder, side by side in one run: each
 * row is the median of interleaved repeats, given as a ratio; and the window against what it may take.
 * `npm run benchmark [-- name ...]`.
 */
import { execFileSync } from 'node:child_process'
import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'
import { build } from 'vite'
import { listBenches } from './benches.mjs'

const here = fileURLToPath(new URL('.', import.meta.url))
const wanted = process.argv.slice(2)
const out = mkdtempSync(join(tmpdir(), 'barwright-benchmark-'))

try {
  await build({
    configFile: false,
    root: here,
    logLevel: 'error',
    build: {
      outDir: out,
      minify: true,
      target: 'node20',
      lib: { entry: join(here, 'entry.ts'), formats: ['es'], fileName: 'entry' },
    },
  })
  const file = ['entry.mjs', 'entry.js'].map((name) => join(out, name)).find((path) => existsSync(path))
  const references = compileReferences()
  // A module of its own for each row: what V8 has learnt from one rig's shapes must not slow the next.
  const load = (row) => import(`${pathToFileURL(file).href}?row=${row}`)
  const names = listBenches(await load('names'), references).map(({ name }) => name)
  console.log('case'.padEnd(58) + 'ours'.padStart(11) + 'against'.padStart(11) + '   ratio   asked')
  for (let row = 0; row < names.length; row++) {
    if (wanted.length > 0 && !wanted.some((word) => names[row].includes(word))) continue
    const bench = listBenches(await load(row), references)[row]
    const { ours, against } = await measure(bench)
    const ratio = ours / against
    const asked =
      bench.atMost === null ? '' : `${ratio <= bench.atMost ? 'met' : 'MISSED'}, at most ${bench.atMost}`
    console.log(
      bench.name.padEnd(58) +
        show(ours).padStart(11) +
        show(against).padStart(11) +
        ratio.toFixed(3).padStart(8) +
        '   ' +
        asked,
    )
  }
} finally {
  rmSync(out, { recursive: true, force: true })
}

/** Interleaves both sides and takes the median of each; the first rounds only warm up. */
async function measure({ ours, against, warm, repeats }) {
  const times = { ours: [], against: [] }
  for (let round = 0; round < warm + repeats; round++) {
    const one = await ours()
    const other = await against()
    if (round < warm) continue
    times.ours.push(one)
    times.against.push(other)
  }
  return { ours: median(times.ours), against: median(times.against) }
}

function median(values) {
  const sorted = [...values].sort((a, b) => a - b)
  return sorted[sorted.length >> 1]
}

function show(seconds) {
  return seconds >= 1 ? `${seconds.toFixed(2)} s` : `${(seconds * 1000).toFixed(2)} ms`
}

/** Builds each C file; a run prints its seconds first. Null where the machine has no gcc. */
function compileReferences() {
  const compile = (name) => {
    const binary = join(out, name)
    execFileSync('gcc', ['-O3', '-march=native', '-o', binary, join(here, `${name}.c`), '-lm'])
    return (...args) => parseFloat(execFileSync(binary, args.map(String)).toString())
  }
  try {
    return { waves: compile('reference'), elements: compile('elementsReference') }
  } catch (error) {
    console.log(`no C reference: ${error.message.split('\n')[0]}`)
    process.exit(1)
  }
}
