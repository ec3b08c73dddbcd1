import type { Rig } from '../../../../src-main/contract/rig'
import type { Fault } from '../../../../src-main/contract/fault'
import type { ReadRigOptions } from '../../../../src-main/engine/rig/readRig'
import { readRig } from '../../../../src-main/engine/rig/readRig'
import { EXAMPLE_RIG } from './exampleRig'

/** Reads the example rig with some of its top-level parts replaced. */
export function readChanged(
  parts: Record<string, unknown>,
  options?: ReadRigOptions,
): { rig: Rig | null; faults: Fault[] } {
  return readRig(JSON.stringify({ ...EXAMPLE_RIG, ...parts }), options)
}

/** Reads the example rig with some of its parts replaced, which must be without faults. */
export function readGood(parts: Record<string, unknown>, options?: ReadRigOptions): Rig {
  const { rig, faults } = readChanged(parts, options)
  if (rig === null) throw new Error(faults.map((fault) => `${fault.path}: ${fault.message}`).join('\n'))
  return rig
}

/** Reads one bar of the given sections, which must be without faults. */
export function readBar(sections: unknown[], more: Record<string, unknown> = {}): Rig['bars'][0] {
  const bars = [{ name: 'rod', material: 'steel', sections, ...more }]
  return readGood({ bars, joints: [], gauges: [], leftEnd: { kind: 'free' }, rightEnd: { kind: 'free' } })
    .bars[0]
}
