import type { Fault } from '../../../src-main/contract/fault'
import type { FieldSpec } from './forms/fieldSpec'

/**
 * Finds the faults that stand under a field: those of its value and, where the value has parts, of these.
 *
 * @param faults - of the rig
 * @param spec - the field
 * @returns its faults
 */
export function findFieldFaults(faults: readonly Fault[], spec: FieldSpec): Fault[] {
  const whole = spec.kind === 'value' || spec.kind === 'number' || spec.kind === 'pairs'
  return faults.filter(({ path }) => path === spec.path || (whole && isBelow(path, spec.path)))
}

/** True where a path leads into what stands at another. */
export function isBelow(path: string, above: string): boolean {
  return path.startsWith(`${above}.`) || path.startsWith(`${above}[`)
}

/**
 * Finds the part that is edited to mend a fault.
 *
 * @param path - of the fault
 * @returns the path of the part
 */
export function findPartOf(path: string): string {
  const part =
    /^bars\[\d+\]\.sections\[\d+\]/.exec(path) ??
    /^(bars|joints|gauges|loads)\[\d+\]/.exec(path) ??
    /^(leftEnd|rightEnd|run|variables)(?=$|[.[])/.exec(path) ??
    /^materials(\.[A-Za-z_][\w-]*|\["(?:[^"\\]|\\.)*"\])?/.exec(path)
  return part?.[0] ?? 'rig'
}
