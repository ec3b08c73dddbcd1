import type { FaultList } from '../faultList'
import { faultText } from '../faultText'

const MOTIONS = ['velocity', 'displacement', 'motion']
const FORCES = ['force', 'stress', 'pressure']
/** Kinds that prescribe a motion or a force by themselves. */
const MOTION_KINDS = ['velocity', 'displacement', 'fixed']
const FORCE_KINDS = ['force', 'free']

/**
 * Looks for ends that ask for a motion and a force at once, which no end can give.
 * @param document as read; what such an end asks for too much is taken out of it
 * @param faults gets `both-motion-and-force`
 */
export function checkEndAsks(document: unknown, faults: FaultList): void {
  if (typeof document !== 'object' || document === null) return
  const rig = document as Record<string, unknown>
  for (const key of ['leftEnd', 'rightEnd']) {
    const end = rig[key]
    if (typeof end !== 'object' || end === null || Array.isArray(end)) continue
    const asks = asksOf(end as Record<string, unknown>)
    if (!asks) continue
    faults.add([key], faultText.bothMotionAndForce(asks))
    const kept = asks[0].startsWith('the kind') && typeof (end as { kind?: unknown }).kind === 'string'
    rig[key] = kept ? withoutAsks(end) : undefined
  }
}

/** What an end asks for where that is both; null where it is not. */
function asksOf(end: Record<string, unknown>): string[] | null {
  const kinds = [end.kind].flat().filter((kind): kind is string => typeof kind === 'string')
  const ofKind = (known: string[]) =>
    kinds.filter((kind) => known.includes(kind)).map((kind) => `the kind "${kind}"`)
  const ofKeys = (known: string[]) => known.filter((key) => Object.hasOwn(end, key)).map((key) => `"${key}"`)
  const takesVelocity = kinds.includes('mass')
  const motions = [...ofKind(MOTION_KINDS), ...ofKeys(takesVelocity ? [] : MOTIONS)]
  const forces = [...ofKind(FORCE_KINDS), ...ofKeys(FORCES)]
  if (motions.length === 0 || forces.length === 0) return null
  return [...motions, ...forces].sort(
    (a, b) => Number(b.startsWith('the kind')) - Number(a.startsWith('the kind')),
  )
}

function withoutAsks(end: object): object {
  return Object.fromEntries(Object.entries(end).filter(([key]) => ![...MOTIONS, ...FORCES].includes(key)))
}
