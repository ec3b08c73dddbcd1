import type { Stretch } from './findOverlaps'

/**
 * Merges stretches that a picture could not show apart, so that it grows with its width and not with them.
 *
 * @param stretches - ascending
 * @param gap - stretches closer than this become one
 * @returns the merged stretches, ascending
 */
export function mergeStretches(stretches: Stretch[], gap: number): Stretch[] {
  const merged: Stretch[] = []
  for (const { from, to } of stretches) {
    const last = merged[merged.length - 1]
    if (last !== undefined && from - last.to < gap) last.to = Math.max(last.to, to)
    else merged.push({ from, to })
  }
  return merged
}
