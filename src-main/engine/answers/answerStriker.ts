import type { Governing, StrikerAnswer } from '../../contract/result'
import type { Rig } from '../../contract/rig'
import type { Line } from '../line/line'
import { isProportional } from './isProportional'

/**
 * The one thing that moves at the start: what pulse it sends and the speed at which the margin is used up.
 *
 *     pulse duration = 2 (travel time of the striker), pulse length = duration x c of the struck bar
 *     safe speed     = speed x (governing margin + 1)
 *
 * The pulse is the main one: a striker of higher impedance than the bar it strikes sends a falling tail
 * after it. The safe speed holds where every stress is proportional to the speed (`isProportional`).
 * Source: de Saint-Venant 1867; Love, Treatise, 4th ed., arts. 281-284 (from memory).
 *
 * @param line the cut line
 * @param governing the smallest margin of the run; null where there is none
 * @returns the answer; null where nothing moves at the start, several things do, or a bar moves unevenly.
 *   The pulse is null for a rigid mass, its length also where no bar stands ahead of the striker.
 */
export function answerStriker(line: Line, governing: Governing | null): StrikerAnswer | null {
  const mover = findMover(line.rig)
  if (mover === null) return null
  const { name, speed, bar } = mover
  const duration = bar === null ? null : 2 * line.bars[bar].travelTime
  const struck = bar === null ? undefined : line.bars[bar + (speed > 0 ? 1 : -1)]
  const ahead = struck && line.spans[speed > 0 ? struck.firstSpan : struck.lastSpan]
  return {
    name,
    speed,
    pulseLength: duration !== null && ahead ? duration * ahead.speed : null,
    pulseDuration: duration,
    safeSpeed: governing !== null && isProportional(line.rig) ? speed * (governing.margin + 1) : null,
  }
}

function findMover(rig: Rig): { name: string; speed: number; bar: number | null } | null {
  if (rig.bars.some((bar) => bar.uniformVelocity === null)) return null
  const movers: { name: string; speed: number; bar: number | null }[] = []
  rig.bars.forEach(({ name, uniformVelocity }, bar) => {
    if (uniformVelocity) movers.push({ name, speed: uniformVelocity, bar })
  })
  for (const [name, end] of [
    ['mass at the left end', rig.leftEnd],
    ['mass at the right end', rig.rightEnd],
  ] as const)
    if (end.kind === 'mass' && end.velocity !== 0) movers.push({ name, speed: end.velocity, bar: null })
  return movers.length === 1 ? movers[0] : null
}
