import { effectScope } from 'vue'
import type { Run } from '../../stores/makeRun'
import { useRun } from '../../stores/useRun'

/**
 * Makes a composable whose state is one for all views of a window. It lives as long as the run store, not as
 * the view that happens to ask first.
 *
 * @param make - sets the state up; called once for each window, inside the setup of the first view that asks
 * @returns the composable
 */
export function shareByRun<T>(make: () => T): () => T {
  const made = new WeakMap<Run, { state: T }>()
  return () => {
    const run = useRun()
    const known = made.get(run)
    if (known) return known.state
    const state = effectScope(true).run(make) as T
    made.set(run, { state })
    return state
  }
}
