import { fileURLToPath } from 'node:url'
import { parseArgs } from 'node:util'
import { runBrowserHost } from './runBrowserHost'

const bundleFolder = fileURLToPath(new URL('../renderer', import.meta.url))

function readPort(): number | null {
  try {
    const { values } = parseArgs({ options: { port: { type: 'string', default: '0' } } })
    const port = Number(values.port)
    return /^\d+$/.test(values.port) && port <= 65535 ? port : null
  } catch {
    return null
  }
}

const port = readPort()
if (port === null) {
  process.stderr.write('Give --port a whole number from 0 to 65535; 0 takes a free port.\n')
  process.exitCode = 2
} else {
  runBrowserHost({ port, bundleFolder }, (line) => process.stdout.write(`${line}\n`)).catch(
    (error: Error) => {
      process.stderr.write(`The page cannot be served: ${error.message}\n`)
      process.exitCode = 1
    },
  )
}
