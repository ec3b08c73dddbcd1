import { fileURLToPath } from 'node:url'
import { startDesktop } from './startDesktop'

startDesktop({
  bundleFolder: fileURLToPath(new URL('../renderer', import.meta.url)),
  preload: fileURLToPath(new URL('../preload/preload.cjs', import.meta.url)),
}).catch((error: Error) => {
  process.stderr.write(`The window cannot be opened: ${error.message}\n`)
  process.exit(1)
})
