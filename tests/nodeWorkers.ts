import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join, resolve } from 'node:path'
import { pathToFileURL } from 'node:url'
import { build, type Plugin } from 'vite'

const SUFFIX = '?nodeWorker'

/**
 * Builds what is imported as `?nodeWorker` for the tests, as electron-vite does for the program: a thread
 * runs built files, which the test runner's own transformation does not give it.
 */
export function nodeWorkers(): Plugin {
  const built = new Map<string, Promise<string>>()
  let folder: string | null = null

  async function buildWorker(entry: string): Promise<string> {
    folder ??= makeFolder()
    const outDir = mkdtempSync(join(folder, 'built-'))
    await build({
      configFile: false,
      logLevel: 'error',
      build: {
        ssr: entry,
        outDir,
        target: 'node20.19',
        rollupOptions: { output: { entryFileNames: 'worker.mjs' } },
      },
      ssr: { noExternal: true },
    })
    return pathToFileURL(join(outDir, 'worker.mjs')).href
  }

  return {
    name: 'node-workers',
    enforce: 'pre',
    resolveId: (id, importer) =>
      id.endsWith(SUFFIX) && importer ? resolve(dirname(importer), id.replace(SUFFIX, `.ts${SUFFIX}`)) : null,
    async load(id) {
      if (!id.endsWith(SUFFIX)) return null
      const entry = id.slice(0, -SUFFIX.length)
      if (!built.has(entry)) built.set(entry, buildWorker(entry))
      return `import { Worker } from 'node:worker_threads'
        export default (options) => new Worker(new URL(${JSON.stringify(await built.get(entry))}), options)`
    },
  }
}

/** A folder that lasts as long as the process. */
function makeFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), 'barwright-worker-'))
  process.once('exit', () => rmSync(folder, { recursive: true, force: true }))
  return folder
}
