import { fileURLToPath } from 'node:url'
import { makeProcessTerminal } from './makeProcessTerminal'
import { runCommandLine } from './runCommandLine'

const terminal = makeProcessTerminal(fileURLToPath(new URL('../renderer', import.meta.url)))

runCommandLine(process.argv.slice(2), terminal).then((status) => {
  process.exitCode = status
})
