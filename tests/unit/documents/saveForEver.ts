import { RESULT_FILE_NAMES, type ResultFiles } from '../../../src-main/documents/makeResultFiles'
import { saveResultFolder } from '../../../src-main/documents/save/saveResultFolder'

const folder = process.argv[2]

/** Some size, so that a kill has something to cut. */
const BULK = 'x'.repeat(300_000)

for (let version = 0; ; version++) {
  const files = RESULT_FILE_NAMES.map((name) => {
    const start = name === 'result.json' ? '{\n  "format": "barwright-result/1",\n' : ''
    return [name, () => [start, BULK, ` ${version}`]]
  })
  await saveResultFolder(folder, Object.fromEntries(files) as ResultFiles)
}
