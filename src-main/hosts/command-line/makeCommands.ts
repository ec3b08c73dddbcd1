import { Command, InvalidArgumentError, Option } from 'commander'
import { NOTICE } from '../../contract/notice'
import { SOFTWARE } from '../../contract/software'
import { checkCommand } from './checkCommand'
import { studyCommand } from './laterCommands'
import { reportCommand } from './reportCommand'
import { selfcheckCommand } from './selfcheckCommand'
import { serveCommand } from './serveCommand'
import { solveCommand, type SolveOptions } from './solveCommand'
import type { Terminal } from './terminal'
import { wrapText } from './wrapText'

const STATUS = `
Exit status: 0 done; 1 a fault of the program or the disk; 2 the input is refused, every reason on
standard error, one a line, as "path: reason"; 3 selfcheck found a check that fails; 130 stopped.
`

/**
 * Makes the commands of the command line.
 *
 * @param terminal - where they print
 * @param finish - takes the exit status of the command that has run
 * @returns the program, which throws instead of ending the process
 */
export function makeCommands(terminal: Terminal, finish: (status: number) => void): Command {
  const program = new Command('barwright')
    .description('Stress waves and impact in stepped and tapered bars, computed on this machine.')
    .version(`${SOFTWARE.name} ${SOFTWARE.version}`, '--version', 'print the version')
    .helpOption('--help', 'print this help')
    .addHelpText('after', `${STATUS}\n${wrapText(NOTICE, 96)}`)
    .showSuggestionAfterError()
    .exitOverride()
    .configureOutput({
      writeOut: terminal.out,
      writeErr: terminal.err,
      outputError: (text, write) => write(`command line: ${writeOneLine(text)}\n`),
    })
  addSolve(program, terminal, finish)
  program
    .command('check')
    .description('only read it: all faults, or a summary of the line')
    .argument('<rig>', 'the rig file')
    .action((rig: string) => finish(checkCommand(rig, terminal)))
  program
    .command('study')
    .description('run the studies of a rig (not computed yet)')
    .argument('<rig>', 'the rig file')
    .option('--name <name>', 'only the study of this name')
    .option('--out <folder>', 'write the results to a folder')
    .action((rig: string) => finish(studyCommand(rig, terminal)))
  program
    .command('report')
    .description('compute a rig and write its report as one page')
    .argument('<rig>', 'the rig file')
    .requiredOption('--out <file>', 'the page to write, *.html')
    .action(async (rig: string, options: { out: string }) =>
      finish(await reportCommand(rig, options, terminal)),
    )
  program
    .command('selfcheck')
    .description('published results computed again on this machine, each with its source and its error')
    .option('--json', 'every value of every check, in place of the table')
    .action(async (options: { json?: boolean }) => finish(await selfcheckCommand(options, terminal)))
  program
    .command('serve')
    .description("the window's page, on this machine alone")
    .option('--port <port>', 'port to serve on; 0 takes a free one', readPort, 0)
    .action(async ({ port }: { port: number }) => finish(await serveCommand(port, terminal)))
  return program
}

function addSolve(program: Command, terminal: Terminal, finish: (status: number) => void): void {
  program
    .command('solve')
    .description('compute a rig: a short table, or a folder with all results')
    .argument('<rig>', 'the rig file')
    .option('--out <folder>', 'write result.json, the tables as CSV and report.html to a folder')
    .addOption(
      new Option('--method <method>', 'in place of the one in the file').choices([
        'characteristics',
        'elements',
        'both',
      ]),
    )
    .option('--full', 'keep the field at every cell and step')
    .option('--quiet', 'print nothing but errors')
    .action(async (rig: string, options: SolveOptions) => finish(await solveCommand(rig, options, terminal)))
}

function readPort(text: string): number {
  const port = Number(text)
  if (!/^\d{1,5}$/.test(text) || port > 65535) {
    throw new InvalidArgumentError('give a whole number from 0 to 65535; 0 takes a free port.')
  }
  return port
}

/** Commander's own errors run over several lines and start with a word of their own. */
function writeOneLine(text: string): string {
  return text
    .trim()
    .replace(/^error: /, '')
    .replace(/\s*\n\s*/g, ' ')
}
