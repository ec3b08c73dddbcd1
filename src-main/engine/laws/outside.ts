import { CompensatedSum } from './compensatedSum'
import type { Beat } from './side'

/**
 * What the surroundings give to the rig at one point: impulse and work, with gravity's share of
 * the momentum they bring. Every force from outside is booked here, step by step.
 */
export class Outside {
  private readonly impulses = new CompensatedSum()
  private readonly works = new CompensatedSum()
  private readonly held = new CompensatedSum()
  private steps = 0

  constructor(private readonly beat: Beat) {}

  /**
   * Books one step.
   *
   * @param k the step
   * @param force force of the surroundings on the rig, positive to the right [N]
   * @param velocity velocity in the falling frame at which it works [m/s]
   */
  add(k: number, force: number, velocity: number): void {
    const { dt, gravity } = this.beat
    const duration = this.beat.duration(k)
    this.impulses.add(duration * force)
    this.works.add(duration * force * (velocity + gravity * dt * k))
    if (gravity !== 0) this.held.add(this.impulses.value)
    this.steps = k + 1
  }

  /** [N s], positive to the right */
  get impulse(): number {
    return this.impulses.value
  }

  /** [J] */
  get work(): number {
    return this.works.value
  }

  /** Sum over the steps before the latest of the impulse given so far [N s]: see `gravityWork`. */
  get earlierImpulses(): number {
    return this.steps === 0 ? 0 : this.held.value - this.impulses.value
  }
}
