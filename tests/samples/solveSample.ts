import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { GaugeTable } from '../../src-main/contract/result'
import type { Rig } from '../../src-main/contract/rig'
import { readRigFile } from '../../src-main/documents/readRigFile'
import { readRig } from '../../src-main/engine/rig/readRig'
import { makeSolve, type Solution } from '../../src-main/engine/solveRig'

export const samplesFolder = fileURLToPath(new URL('../../samples', import.meta.url))

/** Names of all samples: each is a folder of that name with a rig file of that name in it. */
export const sampleNames = readdirSync(samplesFolder, { withFileTypes: true })
  .filter((entry) => entry.isDirectory())
  .map(({ name }) => name)

export interface Sample {
  rig: Rig
  solution: Solution
  readme: string
}

export interface SampleOptions {
  edit?: (text: string) => string
  method?: Rig['run']['method']
}

/**
 * Solves a sample the way every host does, with the records that lie beside it.
 * @param name of the sample's folder
 * @param options edit: changes the text of its rig first; method: in place of its own
 */
export function solveSample(name: string, options: SampleOptions = {}): Sample {
  const { edit = (text: string) => text, method } = options
  const read = readRigFile(join(samplesFolder, name, `${name}.rig.json`))
  if ('faults' in read) throw new Error(JSON.stringify(read.faults))
  const { rig, faults } = readRig(edit(read.file.text), { readRecord: read.file.readRecord, method })
  if (rig === null) throw new Error(JSON.stringify(faults))
  const solve = makeSolve(rig)
  while (solve.step < solve.steps && !solve.broken) solve.advance(solve.steps)
  if (solve.broken) throw new Error(`${name} stopped being finite after step ${solve.step}`)
  return { rig, solution: solve.finish(), readme: readReadme(name) }
}

export function readReadme(name: string): string {
  return readFileSync(join(samplesFolder, name, 'README.md'), 'utf8')
}

/** The values of a gauge at the step nearest to a time [s]. */
export function readGauge(gauge: GaugeTable, time: number) {
  const k = Math.round(time / (gauge.t[1] - gauge.t[0]))
  return {
    t: gauge.t[k],
    stress: gauge.stress[k],
    velocity: gauge.velocity[k],
    rightgoing: gauge.rightgoingForce[k],
    leftgoing: gauge.leftgoingForce[k],
    bridge: gauge.bridge[k],
  }
}

/** Area of a round section [m^2]. */
export function evaluateArea(diameter: number): number {
  return (Math.PI / 4) * diameter ** 2
}
