import { mkdtempSync, readdirSync, readFileSync, realpathSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { EXAMPLE_RIG } from '../../engine/rig/exampleRig'

export interface RigFolder {
  path: string
  /** Absolute path of an entry. */
  at(name: string): string
  /** Writes a rig file, by default the example; returns its path. */
  write(name: string, text?: string): string
  /** Every entry of the folder and below it with its content. */
  look(): Record<string, string>
  remove(): void
}

/** Makes a folder of its own for the rigs and results of a test. */
export function makeRigFolder(): RigFolder {
  const path = mkdtempSync(join(realpathSync(tmpdir()), 'rigs-'))
  const at = (name: string): string => join(path, name)
  return {
    path,
    at,
    write(name, text = JSON.stringify(makeExample())) {
      writeFileSync(at(name), text)
      return at(name)
    },
    look: () =>
      Object.fromEntries(
        readdirSync(path, { recursive: true, withFileTypes: true })
          .filter((entry) => entry.isFile())
          .map((entry) => join(entry.parentPath, entry.name))
          .map((file) => [file.slice(path.length + 1), readFileSync(file, 'latin1')]),
      ),
    remove: () => rmSync(path, { recursive: true, force: true }),
  }
}

/** The example rig, cut coarsely so that a run is short. */
export function makeExample(): typeof EXAMPLE_RIG {
  const rig = structuredClone(EXAMPLE_RIG)
  rig.run.cell = '10 mm'
  return rig
}

/** The example rig with a run of many seconds. */
export function makeLongExample(): typeof EXAMPLE_RIG {
  const rig = structuredClone(EXAMPLE_RIG)
  rig.run.cell = '0.5 mm'
  rig.run.duration = '400 ms'
  return rig
}
